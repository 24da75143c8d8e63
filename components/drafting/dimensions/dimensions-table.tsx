import { memo, useCallback, useDeferredValue, useMemo, useState, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { type Dimension } from '../../../shared/plan/document';
import { Text } from '../../ui/text';
import { colour, line } from '../../ui/tokens';
import { webStyle } from '../../ui/web-style';
import { type DraftEditor } from '../use-draft-editor';
import { DimensionRow, rowGrid } from './dimension-row';
import { draftPreference, usersOf, usersWords, verdictOver } from './facts';
import { OpenRow } from './open-row';

export interface DimensionsTableProps {
  editor: DraftEditor;
  shown: readonly Dimension[];
  chosen: string | null;
  wide: boolean;
  onChoose: (id: string | null) => void;
  onChange: (dimension: Dimension) => void;
  /** Under the open row where there is no pane beside. */
  below: ReactNode;
}

/** Rows of a chunk; the chunks without the open row are not drawn again while it is typed in. */
const chunkRows = 40;

/** Rows; the chosen one is worked on in place, arrows lead to its neighbours. The others follow a moment behind. */
export function DimensionsTable(props: DimensionsTableProps) {
  const { editor, shown, chosen, onChoose, wide } = props;
  const [byHand, setByHand] = useState(false);
  const choose = useCallback(
    (id: string) => {
      setByHand(true);
      onChoose(id);
    },
    [onChoose],
  );
  const move = (by: 1 | -1) => {
    const next = shown[shown.findIndex((d) => d.id === chosen) + by];
    if (next) choose(next.id);
  };
  const behind = useDeferredValue(editor);
  const rows = useDeferredValue(shown);
  const chunks = useMemo(() => inChunks(rows), [rows]);
  // A long table comes in two goes, so that the page answers at once.
  const most = useDeferredValue(chunks.length, 2);
  const dimension = shown.find((d) => d.id === chosen);
  const home = chunks.findIndex((chunk) => chunk.some((d) => d.id === chosen));
  const open = dimension ? (
    <OpenRow
      key={dimension.id}
      dimension={dimension}
      editor={editor}
      onChange={props.onChange}
      onMove={move}
      onClose={() => onChoose(null)}
      autoFocus={byHand}
      below={props.below}
    />
  ) : null;
  return (
    <View role="table" aria-label="Dimensions" aria-rowcount={shown.length}>
      {wide ? <Head units={editor.document.units} /> : null}
      {chunks.slice(0, Math.max(most, 2, home + 1)).map((chunk, i) => (
        <Chunk
          key={i}
          rows={chunk}
          editor={behind}
          wide={wide}
          onChoose={choose}
          openId={i === home ? chosen : null}
          open={i === home ? open : null}
        />
      ))}
      {home < 0 ? <View role="rowgroup">{open}</View> : null}
    </View>
  );
}

function inChunks(rows: readonly Dimension[]): Dimension[][] {
  const chunks = [];
  for (let i = 0; i < rows.length; i += chunkRows) chunks.push(rows.slice(i, i + chunkRows));
  return chunks;
}

interface ChunkProps extends Pick<ClosedRowProps, 'editor' | 'wide' | 'onChoose'> {
  rows: readonly Dimension[];
  openId: string | null;
  open: ReactNode;
}

const Chunk = memo(function Chunk({ rows, openId, open, ...rest }: ChunkProps) {
  return (
    <View role="rowgroup" style={open ? null : styles.chunk}>
      {rows.map((d) => (d.id === openId ? open : <ClosedRow key={d.id} dimension={d} {...rest} />))}
    </View>
  );
});

const preferences = { mm: draftPreference('mm'), in: draftPreference('in') };

interface ClosedRowProps {
  dimension: Dimension;
  editor: DraftEditor;
  wide: boolean;
  onChoose: (id: string) => void;
}

/** Works out what a row says; the row itself is drawn again only when that changed. */
const ClosedRow = memo(function ClosedRow(props: ClosedRowProps) {
  const { dimension, editor, wide, onChoose } = props;
  const { model, good, document } = editor;
  return (
    <DimensionRow
      dimension={dimension}
      state={model.dimensions.get(dimension.id)}
      good={good.get(dimension.id)}
      verdict={verdictOver(model, dimension.id)}
      users={usersWords(usersOf(model, dimension.id))}
      preference={preferences[document.units]}
      wide={wide}
      onChoose={onChoose}
    />
  );
});

function Head({ units }: { units: 'mm' | 'in' }) {
  const heads = [
    ['Symbol and name'],
    ['Origin'],
    ['Expression'],
    [`Value, ${units}`, 'right'],
    ['Tol.', 'right'],
    ['Worst', 'right'],
    ['Check', 'right'],
  ] as const;
  return (
    <View role="rowgroup">
      <View role="row" style={[rowGrid, styles.head]}>
        {heads.map(([title, align]) => (
          <View key={title} role="columnheader">
            <Text size="small" tone="ink2" align={align}>
              {title}
            </Text>
          </View>
        ))}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  // Chunks out of sight cost nothing; the open row's list of names may hang out of its chunk.
  chunk: webStyle({
    contentVisibility: 'auto',
    containIntrinsicSize: `auto ${chunkRows * 61}px`,
  }),
  head: webStyle({
    paddingLeft: 10,
    paddingRight: 4,
    paddingBottom: 6,
    borderBottomWidth: line.medium,
    borderBottomStyle: 'solid',
    borderBottomColor: colour.ink,
  }),
});

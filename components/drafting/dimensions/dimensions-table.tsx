import { useCallback, useDeferredValue, useState, type ReactNode } from 'react';
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

const firstRows = 60;

/** Rows; the chosen one is worked on in place, arrows lead to its neighbours. */
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
  // A long table comes in two goes, so that the page answers at once.
  const most = useDeferredValue(shown.length, firstRows);
  return (
    <View role="table" aria-label="Dimensions" aria-rowcount={shown.length}>
      {wide ? <Head units={editor.document.units} /> : null}
      <View role="rowgroup">
        {shown
          .slice(0, Math.max(most, firstRows))
          .map((d) =>
            d.id === chosen ? (
              <OpenRow
                key={d.id}
                dimension={d}
                editor={editor}
                onChange={props.onChange}
                onMove={move}
                onClose={() => onChoose(null)}
                autoFocus={byHand}
                below={props.below}
              />
            ) : (
              <ClosedRow key={d.id} dimension={d} editor={editor} wide={wide} onChoose={choose} />
            ),
          )}
      </View>
    </View>
  );
}

const preferences = { mm: draftPreference('mm'), in: draftPreference('in') };

interface ClosedRowProps {
  dimension: Dimension;
  editor: DraftEditor;
  wide: boolean;
  onChoose: (id: string) => void;
}

/** Works out what a row says; the row itself is drawn again only when that changed. */
function ClosedRow({ dimension, editor, wide, onChoose }: ClosedRowProps) {
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
}

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
  head: webStyle({
    paddingLeft: 10,
    paddingRight: 4,
    paddingBottom: 6,
    borderBottomWidth: line.medium,
    borderBottomStyle: 'solid',
    borderBottomColor: colour.ink,
  }),
});

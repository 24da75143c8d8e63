import { memo, useDeferredValue } from 'react';
import { StyleSheet, View } from 'react-native';
import { type Dimension } from '../../../shared/plan/document';
import { type DimensionState } from '../../../shared/plan/model';
import { Button } from '../../ui/button';
import { Figure } from '../../ui/figure';
import { Heading } from '../../ui/heading';
import { Row, Stack } from '../../ui/layout';
import { Text } from '../../ui/text';
import { colour, line } from '../../ui/tokens';
import { webStyle } from '../../ui/web-style';
import { CheckSaid } from '../check-said';
import { type DraftEditor } from '../use-draft-editor';
import { BandDrawing } from './band-drawing';
import { DimensionFields } from './dimension-fields';
import { type DetailProps } from './detail-props';
import { draftPreference, spreadFigure, usersOf, usersWords } from './facts';

/** One dimension whole: what moves it, what feeds it and what it feeds, its checks, its other fields. */
export function Detail(props: DetailProps) {
  const { dimension, editor, onChoose } = props;
  const behind = useDeferredValue(editor);
  return (
    <Stack gap={16}>
      <Told
        dimension={behind.model.dimensions.get(dimension.id)?.dimension ?? dimension}
        editor={behind}
        onChoose={onChoose}
      />
      <DimensionFields {...props} />
    </Stack>
  );
}

type ToldProps = Pick<DetailProps, 'dimension' | 'editor' | 'onChoose'>;

/** What the model says of it, a moment behind the typing. */
const Told = memo(function Told({ dimension: d, editor, onChoose }: ToldProps) {
  const { model } = editor;
  const state = model.dimensions.get(d.id);
  const users = usersOf(model, d.id);
  const feeds = model.feeds(d.id).flatMap((id) => model.dimensions.get(id)?.dimension ?? []);
  return (
    <>
      <Stack gap={4}>
        <Row justify="space-between" align="baseline" gap={12}>
          <Heading level={2} ruled={false}>
            <Text mono>{d.symbol}</Text>
          </Heading>
          <Text size="note" tone="ink2">
            {d.origin}
          </Text>
        </Row>
        <Text size="note" tone="ink2">
          {d.name}, {usersWords(users)}
        </Text>
      </Stack>
      {state ? <Spread state={state} editor={editor} onChoose={onChoose} /> : null}
      <Lineage
        title="What feeds it"
        none="nothing: it stands for itself"
        list={feeds}
        onChoose={onChoose}
      />
      <Lineage
        title="What it feeds"
        none="no other dimension"
        list={users.dimensions}
        onChoose={onChoose}
      />
      <ChecksOver dimension={d} editor={editor} />
    </>
  );
});

/** Worst case and root-sum-square, and each source's share of it. */
function Spread({
  state,
  editor,
  onChoose,
}: {
  state: DimensionState;
  editor: DraftEditor;
  onChoose: (id: string) => void;
}) {
  const preference = draftPreference(editor.document.units);
  const { value } = state;
  if (!value || value.worst < 1e-9) return null;
  const most = value.contributors[0]?.share ?? 0;
  return (
    <>
      <BandDrawing state={state} preference={preference} />
      <View style={styles.boxes}>
        <View style={styles.box}>
          <Text size="small" tone="ink2">
            Worst case
          </Text>
          <Figure figure={spreadFigure(value.worst, state, preference)} weight={700} />
        </View>
        <View style={[styles.box, styles.second]}>
          <Text size="small" tone="ink2">
            Root sum square
          </Text>
          <Figure figure={spreadFigure(value.rss, state, preference)} weight={700} />
        </View>
      </View>
      {value.contributors.length > 1 ? (
        <Stack gap={8}>
          <Heading level={3}>What moves it</Heading>
          {value.contributors.slice(0, 8).map((source) => (
            <Stack key={source.dimensionId} gap={4}>
              <Row justify="space-between" gap={12} align="baseline">
                <Leads symbol={source.symbol} onPress={() => onChoose(source.dimensionId)} />
                <Text size="note" tone="ink2">
                  {Math.round(source.slope * 100) / 100} ×{' '}
                  <Figure figure={spreadFigure(source.tolerance, state, preference)} withoutUnit />
                  {'  '}
                  <Figure
                    figure={{ ...spreadFigure(source.share, state, preference), sign: '' }}
                    weight={700}
                  />
                </Text>
              </Row>
              <View style={styles.bar} aria-hidden>
                <View
                  style={[
                    styles.share,
                    { width: `${most > 0 ? (source.share / most) * 100 : 0}%` },
                  ]}
                />
              </View>
            </Stack>
          ))}
        </Stack>
      ) : null}
    </>
  );
}

function Leads({ symbol, onPress }: { symbol: string; onPress: () => void }) {
  return (
    <Button size="small" kind="quiet" label={`Go to ${symbol}`} onPress={onPress}>
      {symbol}
    </Button>
  );
}

interface LineageProps {
  title: string;
  none: string;
  list: readonly Dimension[];
  onChoose: (id: string) => void;
}

function Lineage({ title, none, list, onChoose }: LineageProps) {
  return (
    <Stack gap={4}>
      <Heading level={3}>{title}</Heading>
      {list.length === 0 ? (
        <Text size="note" tone="ink2">
          {none}
        </Text>
      ) : (
        <Row gap={4} wrap>
          {list.map((other) => (
            <Leads key={other.id} symbol={other.symbol} onPress={() => onChoose(other.id)} />
          ))}
        </Row>
      )}
    </Stack>
  );
}

function ChecksOver({ dimension, editor }: Pick<ToldProps, 'dimension' | 'editor'>) {
  const { model } = editor;
  const states = model.usedBy(dimension.id).checks.flatMap((id) => model.checks.get(id) ?? []);
  if (states.length === 0) return null;
  return (
    <Stack gap={8}>
      <Heading level={3}>Checks</Heading>
      {states.map((state) => (
        <Stack key={state.id} gap={4}>
          <Text size="note" weight={600}>
            {state.check.name}
          </Text>
          <CheckSaid state={state} editor={editor} />
        </Stack>
      ))}
    </Stack>
  );
}

const styles = StyleSheet.create({
  boxes: webStyle({
    display: 'grid',
    gridTemplateColumns: '1fr 1fr',
    borderWidth: line.thin,
    borderStyle: 'solid',
    borderColor: colour.ink,
    backgroundColor: colour.sheet,
  }),
  box: { padding: 10, gap: 4 },
  second: webStyle({
    borderLeftWidth: line.thin,
    borderLeftStyle: 'solid',
    borderLeftColor: colour.ink,
  }),
  bar: { height: 6, backgroundColor: colour.ruleThin },
  share: { height: 6, backgroundColor: colour.ink },
});

import { memo } from 'react';
import { StyleSheet, View } from 'react-native';
import { type DisplayPreference } from '../../../shared/measure';
import { type Dimension } from '../../../shared/plan/document';
import { type DimensionState } from '../../../shared/plan/model';
import { dimensionFigure } from '../../plans/plan-model';
import { Figure } from '../../ui/figure';
import { Row, Stack } from '../../ui/layout';
import { PressArea } from '../../ui/pressable';
import { Text } from '../../ui/text';
import { colour, line } from '../../ui/tokens';
import { VerdictShape, verdictLook, type VerdictKind } from '../../ui/verdict';
import { webStyle } from '../../ui/web-style';
import { spreadFigure } from './facts';

export interface DimensionRowProps {
  dimension: Dimension;
  state: DimensionState | undefined;
  /** The state when it was good last; shown greyed beside a fault. */
  good: DimensionState | undefined;
  verdict: VerdictKind | null;
  users: string;
  preference: DisplayPreference;
  wide: boolean;
  onChoose: (id: string) => void;
}

/** One dimension of the table while it is not worked on. */
export const DimensionRow = memo(function DimensionRow(props: DimensionRowProps) {
  const { dimension: d, wide, onChoose } = props;
  return (
    <View
      role="row"
      style={[styles.row, props.state?.error ? styles.fails : null]}
      onClick={() => onChoose(d.id)}
    >
      {wide ? <WideCells {...props} /> : <NarrowCells {...props} />}
    </View>
  );
});

/** The symbol is the button of the row. */
function Name({ dimension: d, onChoose }: DimensionRowProps) {
  return (
    <View role="rowheader">
      <PressArea
        role="button"
        label={`Work on ${d.symbol}, ${d.name}`}
        onClick={(event) => event.stopPropagation()}
        onPress={() => onChoose(d.id)}
      >
        <Text mono weight={700}>
          {d.symbol}
        </Text>
        <Text size="small" tone="ink2">
          {d.name}
        </Text>
      </PressArea>
    </View>
  );
}

function Expression({ dimension: d, state, users }: DimensionRowProps) {
  return (
    <View role="cell">
      <Text mono size="note" style={styles.expression}>
        {d.expression || 'no figure yet'}
      </Text>
      <Text
        size="small"
        tone={state?.error ? 'failsText' : 'ink2'}
        numberOfLines={state?.error ? undefined : 1}
      >
        {state?.error ? state.error.message : users}
      </Text>
    </View>
  );
}

/** The value as it stands; with a fault the one before it, greyed. */
export function DimensionValue({
  state,
  good,
  preference,
  unit = true,
}: Pick<DimensionRowProps, 'state' | 'good' | 'preference'> & { unit?: boolean }) {
  const figure = dimensionFigure(state, preference);
  const before = figure ? null : dimensionFigure(good, preference);
  if (figure)
    return <Figure figure={figure} weight={700} withoutUnit={!unit && state?.kind === 'length'} />;
  if (before)
    return (
      <Text tone="ink3">
        <Figure figure={before} tone="ink3" withoutUnit={!unit && good?.kind === 'length'} />
      </Text>
    );
  return <Text tone="ink3">–</Text>;
}

function Tolerance({ dimension: d, state, preference }: DimensionRowProps) {
  if (d.tolerance.form === 'none' || !state?.tolerance) return null;
  return (
    <Figure size="note" figure={spreadFigure(state.tolerance, state, preference)} withoutUnit />
  );
}

function Worst({ dimension: d, state, preference }: DimensionRowProps) {
  if (d.origin !== 'derived' || !state?.value || state.value.worst < 1e-9) return null;
  return (
    <Figure size="note" figure={spreadFigure(state.value.worst, state, preference)} withoutUnit />
  );
}

function Shape({ verdict }: { verdict: VerdictKind | null }) {
  return verdict ? <VerdictShape kind={verdict} label={verdictLook[verdict].word} /> : null;
}

function WideCells(props: DimensionRowProps) {
  return (
    <View style={rowGrid}>
      <Name {...props} />
      <View role="cell">
        <Text size="note">{props.dimension.origin}</Text>
      </View>
      <Expression {...props} />
      <View role="cell" style={styles.right}>
        <DimensionValue {...props} unit={false} />
      </View>
      <View role="cell" style={styles.right}>
        <Tolerance {...props} />
      </View>
      <View role="cell" style={styles.right}>
        <Worst {...props} />
      </View>
      <View role="cell" style={styles.shape}>
        <Shape verdict={props.verdict} />
      </View>
    </View>
  );
}

function NarrowCells(props: DimensionRowProps) {
  return (
    <Stack gap={4}>
      <Row justify="space-between" align="flex-start" gap={12}>
        <Name {...props} />
        <View role="cell" style={styles.right}>
          <Text size="lead">
            <DimensionValue {...props} />
          </Text>
          <Row gap={8}>
            <Tolerance {...props} />
            <Worst {...props} />
            <Shape verdict={props.verdict} />
          </Row>
        </View>
      </Row>
      <Expression {...props} />
    </Stack>
  );
}

/** The columns of the table; its head and the row being worked on stand on them as well. */
export const rowGrid = webStyle({
  display: 'grid',
  gridTemplateColumns: 'minmax(110px, 1fr) 60px minmax(170px, 2fr) 76px 76px 76px 40px',
  columnGap: 12,
  alignItems: 'baseline',
});

const styles = StyleSheet.create({
  row: webStyle({
    paddingTop: 8,
    paddingBottom: 8,
    paddingLeft: 10,
    paddingRight: 4,
    borderBottomWidth: line.thin,
    borderBottomStyle: 'solid',
    borderBottomColor: colour.ruleThin,
    cursor: 'pointer',
  }),
  fails: webStyle({ boxShadow: `inset 2.5px 0 0 ${colour.fails}` }),
  expression: webStyle({ overflowWrap: 'anywhere' }),
  right: { alignItems: 'flex-end' },
  shape: { alignItems: 'flex-end', alignSelf: 'flex-start', paddingTop: 4 },
});

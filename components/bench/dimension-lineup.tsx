import { StyleSheet, View } from 'react-native';
import { displayMm } from '../../shared/measure';
import { type Dimension } from '../../shared/plan/document';
import { type PlanValues } from '../plans/plan-model';
import { Figure } from '../ui/figure';
import { Row, Stack } from '../ui/layout';
import { Text } from '../ui/text';
import { colour, line } from '../ui/tokens';
import { Verdict, verdictKind } from '../ui/verdict';
import { judge } from './judge';

/** One dimension of the step: its figure large, tolerance, and the verdict once it is read. */
export function DimensionLineup({
  dimension,
  values,
  taken,
}: {
  dimension: Dimension;
  values: PlanValues;
  taken: boolean;
}) {
  const figure = values.figure(dimension.id);
  const state = values.model.dimensions.get(dimension.id);
  const verdict = judge(values, dimension.id);
  const own = dimension.tolerance.form !== 'none' && state?.tolerance ? state.tolerance : null;
  return (
    <View style={styles.box}>
      <Row justify="space-between" align="flex-end" gap={12} wrap>
        <Stack gap={4} style={{ alignSelf: 'auto', flexShrink: 1 }}>
          <Text size="lead" weight={600}>
            {taken ? `Take: ${dimension.name}` : dimension.name}
          </Text>
          {own ? (
            <Text tone="ink2">
              ±{' '}
              <Figure
                figure={displayMm(own, {
                  ...values.preference,
                  instrument: values.preference.system === 'mm' ? 'calipers' : 'rule',
                  grid: 64,
                })}
              />
            </Text>
          ) : null}
        </Stack>
        {figure ? (
          <Figure figure={figure} size="bench" weight={700} />
        ) : (
          <Text tone="failsText">cannot be worked out</Text>
        )}
      </Row>
      {dimension.where ? <Text tone="ink2">{dimension.where}</Text> : null}
      {verdict && verdict.verdict !== 'needs-a-reading' ? (
        <Said verdict={verdict} values={values} />
      ) : (
        <Verdict
          kind="need"
          word={state?.standIn ? 'the maker’s figure until you read yours' : 'needs a reading'}
        />
      )}
    </View>
  );
}

/** The verdict in words: how much over or under, and what to do. */
export function Said({
  verdict,
  values,
}: {
  verdict: NonNullable<ReturnType<typeof judge>>;
  values: PlanValues;
}) {
  const by =
    verdict.by === 0
      ? null
      : displayMm(Math.abs(verdict.by), { ...values.preference, instrument: 'calipers' });
  return (
    <View role="status">
      <Stack gap={4}>
        <Verdict
          kind={verdictKind(verdict.verdict)}
          word={verdict.by > 0 ? 'over' : verdict.by < 0 ? 'under' : undefined}
        />
        <Text size="lead" weight={600}>
          {by ? (
            <>
              <Figure figure={by} weight={700} /> {verdict.by > 0 ? 'over' : 'under'}:{' '}
              {verdict.advice}
            </>
          ) : (
            verdict.advice
          )}
        </Text>
      </Stack>
    </View>
  );
}

const styles = StyleSheet.create({
  box: { gap: 8, borderTopWidth: line.medium, borderTopColor: colour.ink, paddingTop: 12 },
});

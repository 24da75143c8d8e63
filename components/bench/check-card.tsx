import { StyleSheet, View } from 'react-native';
import { lookResults, trialResults, type Entry } from '../../shared/plan/bench/entry';
import { type BenchState } from '../../shared/plan/bench/fold';
import { type Check } from '../../shared/plan/document';
import { describeCheck } from '../../shared/plan/model';
import { type PlanValues } from '../plans/plan-model';
import { Button } from '../ui/button';
import { Heading } from '../ui/heading';
import { Row, Stack } from '../ui/layout';
import { Text } from '../ui/text';
import { colour, line } from '../ui/tokens';
import { Verdict, verdictKind } from '../ui/verdict';
import { type NewEntry } from './bench-queries';

const trialWords: Record<(typeof trialResults)[number], string> = {
  fits: 'Fits',
  loose: 'Loose',
  "won't go": 'Won’t go',
};
const lookWords: Record<(typeof lookResults)[number], string> = {
  good: 'Good',
  'not-good': 'Not good',
};

export interface CheckCardProps {
  check: Check;
  state: BenchState;
  values: PlanValues;
  add: (entry: NewEntry) => Promise<Entry>;
}

/** A check of the step: what it says of this builder's figures, and the trial or look that answers it. */
export function CheckCard({ check, state, values, add }: CheckCardProps) {
  const verdict = values.model.checks.get(check.id);
  const trial = state.trials.get(check.id);
  const look = state.looks.get(check.id);
  return (
    <View style={styles.box}>
      <Row justify="space-between" gap={12} wrap>
        <Heading level={3} size="lead" ruled={false}>
          {check.name}
        </Heading>
        <Verdict kind={verdictKind(verdict?.verdict ?? 'needs-a-reading')} />
      </Row>
      {verdict ? (
        <Text size="lead">{describeCheck(values.model, verdict, values.preference)}</Text>
      ) : null}
      {check.why ? <Text tone="ink2">{check.why}</Text> : null}
      {check.how ? <Text size="lead">{check.how}</Text> : null}
      {check.answeredBy.includes('trial') ? (
        <Stack gap={8}>
          <Text tone="ink2">Try it:</Text>
          <Row gap={8} wrap>
            {trialResults.map((result) => (
              <Button
                key={result}
                size="bench"
                label={`${check.name}: ${trialWords[result]}`}
                pressed={trial?.result === result}
                onPress={() =>
                  void add({
                    kind: 'trial',
                    elementId: check.id,
                    result,
                    against: '',
                    ...(trial ? { withdraws: trial.id } : {}),
                  })
                }
              >
                {trialWords[result]}
              </Button>
            ))}
          </Row>
        </Stack>
      ) : null}
      {check.answeredBy.includes('look') ? (
        <Stack gap={8}>
          <Text tone="ink2">Look at it:</Text>
          <Row gap={8} wrap>
            {lookResults.map((result) => (
              <Button
                key={result}
                size="bench"
                label={`${check.name}: ${lookWords[result]}`}
                pressed={look?.result === result}
                onPress={() =>
                  void add({
                    kind: 'look',
                    elementId: check.id,
                    result,
                    ...(look ? { withdraws: look.id } : {}),
                  })
                }
              >
                {lookWords[result]}
              </Button>
            ))}
          </Row>
        </Stack>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  box: { gap: 8, borderWidth: line.medium, borderColor: colour.ink, padding: 12 },
});

import { type Check } from '../../shared/plan/document';
import { Row, Rule, Stack } from '../ui/layout';
import { Text } from '../ui/text';
import { Verdict } from '../ui/verdict';
import { verdictKind } from '../ui/verdict';
import { type PlanValues } from './plan-model';

/** The plan's own checks with their verdicts. */
export function CheckList({ checks, values }: { checks: readonly Check[]; values: PlanValues }) {
  return (
    <Stack gap={8}>
      {checks.map((check) => {
        const verdict = values.model.checks.get(check.id)?.verdict ?? 'needs-a-reading';
        return (
          <Stack key={check.id} gap={4}>
            <Row gap={12} align="flex-start" justify="space-between" wrap>
              <Text weight={600}>{check.name}</Text>
              <Verdict kind={verdictKind(verdict)} />
            </Row>
            {check.why ? (
              <Text size="note" tone="ink2">
                {check.why}
              </Text>
            ) : null}
            <Rule />
          </Stack>
        );
      })}
    </Stack>
  );
}

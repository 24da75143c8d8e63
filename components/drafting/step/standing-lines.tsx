import { type PlanDocument } from '../../../shared/plan/document';
import { standingLines } from '../../../shared/plan/standing-lines';
import { Button } from '../../ui/button';
import { Row } from '../../ui/layout';
import { Text } from '../../ui/text';
import { type StepListProps } from './step-lists';

/** The lines that stand in the step by themselves; the creator can take one out, and the check sheet says so. */
export function StandingLines({
  step,
  document,
  onChange,
}: StepListProps & { document: PlanDocument }) {
  return (standingLines(document).get(step.id) ?? []).map((line) => (
    <Row key={line.rule} gap={12} justify="space-between">
      <Text size="note" tone={line.out ? 'ink3' : 'ink2'} style={{ flex: 1 }}>
        {line.text} {line.out ? 'Taken out.' : 'Stands here by itself.'}
      </Text>
      <Button
        size="small"
        kind="quiet"
        label={`${line.out ? 'Put back' : 'Take out'}: ${line.text}`}
        onPress={() =>
          onChange((s) => ({
            ...s,
            withoutLines: line.out
              ? s.withoutLines.filter((rule) => rule !== line.rule)
              : [...s.withoutLines, line.rule],
          }))
        }
      >
        {line.out ? 'Put back' : 'Take out'}
      </Button>
    </Row>
  ));
}

import { type PlanDocument, type Step } from '../../shared/plan/document';
import { standingLines } from '../../shared/plan/standing-lines';
import { Icon } from '../ui/icon';
import { Row } from '../ui/layout';
import { Text } from '../ui/text';

/** What the product itself says where a machine is first used: eyes, ears, dust, nothing loose. */
export function StandingLines({ step, document }: { step: Step; document: PlanDocument }) {
  const lines =
    standingLines(document)
      .get(step.id)
      ?.filter((line) => !line.out) ?? [];
  return lines.map((line) => (
    <Row key={line.rule} gap={8} align="flex-start">
      <Icon name="caution" size={20} />
      <Text size="note" style={{ flex: 1 }}>
        {line.text}
      </Text>
    </Row>
  ));
}

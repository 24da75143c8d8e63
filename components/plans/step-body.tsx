import { type PlanDocument, type Step } from '../../shared/plan/document';
import { Figure } from '../ui/figure';
import { Icon } from '../ui/icon';
import { Row, Stack } from '../ui/layout';
import { Prose } from '../ui/prose';
import { Text } from '../ui/text';
import { type PlanValues } from './plan-model';
import { StandingLines } from './standing-lines';
import { StepPhotos } from './step-photos';
import { referencesOf } from './step-references';

/** What a step says: its text, dimensions, cautions and waits. */
export function StepBody({
  step,
  document,
  values,
  changed,
}: {
  step: Step;
  document: PlanDocument;
  values: PlanValues;
  /** Ids of dimensions that differ from the maker's build. */
  changed?: ReadonlySet<string>;
}) {
  const asked = document.dimensions.filter(
    (d) => step.takes.includes(d.id) || step.holds.includes(d.id),
  );
  return (
    <Stack gap={8}>
      {step.text ? (
        <Prose renderReference={referencesOf(document, values)}>{step.text}</Prose>
      ) : null}
      <StepPhotos step={step} document={document} />
      {asked.length > 0 ? (
        <Row gap={16} wrap align="baseline">
          {asked.map((dimension) => {
            const figure = values.figure(dimension.id);
            return (
              <Text key={dimension.id} size="note" tone="ink2">
                {step.takes.includes(dimension.id) ? 'Take ' : ''}
                {dimension.name}
                {changed?.has(dimension.id) ? ', yours' : ''}{' '}
                {figure ? <Figure figure={figure} tone="ink" weight={600} /> : null}
              </Text>
            );
          })}
        </Row>
      ) : null}
      <StandingLines step={step} document={document} />
      {step.cautions.map((caution) => (
        <Row key={caution.id} gap={8} align="flex-start">
          <Icon name="caution" size={20} />
          <Text size="note" weight={600} style={{ flex: 1 }}>
            {caution.text}
          </Text>
        </Row>
      ))}
      {step.waits.map((wait) => (
        <Row key={wait.id} gap={8} align="center">
          <Icon name="wait" size={20} />
          <Text size="note">
            Wait{' '}
            <Figure
              figure={
                wait.minutes >= 120
                  ? { whole: Math.round(wait.minutes / 60), unit: 'h' }
                  : { whole: wait.minutes, unit: 'min' }
              }
            />{' '}
            {wait.what}
          </Text>
        </Row>
      ))}
    </Stack>
  );
}

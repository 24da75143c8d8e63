import { type Heard, type PlanDocument } from '../../../shared/plan/document';
import { clockTime } from '../../../shared/plan/stick/spoken';
import { Button } from '../../ui/button';
import { Row, Stack } from '../../ui/layout';
import { Text } from '../../ui/text';
import { type StepListProps } from './step-lists';

export interface HeardListProps extends StepListProps {
  document: PlanDocument;
  /** Makes a dimension of a figure heard in the clip. */
  onDimension: (heard: Heard) => void;
}

/** Figures heard in the stretch: make one a dimension, or say how the bench treats it. */
export function HeardList({ step, document, onChange, onDimension }: HeardListProps) {
  const rule = (heard: Heard, ruling: Heard['ruling']) =>
    onChange((s) => ({
      ...s,
      heard: s.heard.map((h) => (h.id === heard.id ? { ...h, ruling } : h)),
    }));
  return (
    <Stack gap={8}>
      {step.heard.map((heard) => {
        const dimension = document.dimensions.find((d) => d.id === heard.dimensionId);
        return (
          <Row key={heard.id} gap={8} wrap>
            <Text size="note">
              {clockTime(heard.at)} “{heard.words}”{dimension ? ` is ${dimension.symbol}` : ''}
            </Text>
            {dimension ? (
              <Button
                size="small"
                label={
                  heard.ruling === 'say' ? `Mute “${heard.words}”` : `Say “${heard.words}” again`
                }
                onPress={() => rule(heard, heard.ruling === 'say' ? 'muted' : 'say')}
              >
                {heard.ruling === 'say' ? 'Mute' : 'Say again'}
              </Button>
            ) : (
              <Button
                size="small"
                label={`Make “${heard.words}” a dimension`}
                onPress={() => onDimension(heard)}
              >
                Make it a dimension
              </Button>
            )}
            <Button
              size="small"
              label={`Drop “${heard.words}”`}
              onPress={() =>
                onChange((s) => ({ ...s, heard: s.heard.filter((h) => h.id !== heard.id) }))
              }
            >
              Drop
            </Button>
          </Row>
        );
      })}
    </Stack>
  );
}

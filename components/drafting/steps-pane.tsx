import { useMemo, useState } from 'react';
import { View } from 'react-native';
import { v7 as uuid } from 'uuid';
import { stepSchema, type Step } from '../../shared/plan/document';
import { clockTime } from '../../shared/plan/stick/spoken';
import { stickOf } from '../plans/plan-stick-input';
import { StoryStick } from '../story-stick/story-stick';
import { toast } from '../ui/announcer';
import { Button } from '../ui/button';
import { Heading } from '../ui/heading';
import { IconButton } from '../ui/icon-button';
import { Row, Rule, Section, Stack } from '../ui/layout';
import { EmptyState } from '../ui/states';
import { Text } from '../ui/text';
import { StepEditor } from './step-editor';
import { type DraftEditor } from './use-draft-editor';

/** The steps on the stick and below each other; order by buttons, by Alt with arrows, by dragging. */
export function StepsPane({ editor: { document, change } }: { editor: DraftEditor }) {
  const [open, setOpen] = useState<string | null>(null);
  const stick = useMemo(() => stickOf(document, {}), [document]);
  const setSteps = (fn: (steps: Step[]) => Step[]) => change((d) => ({ ...d, steps: fn(d.steps) }));
  const replace = (step: Step) =>
    setSteps((steps) => steps.map((s) => (s.id === step.id ? step : s)));
  const move = (id: string, by: number) =>
    setSteps((steps) => {
      const at = steps.findIndex((s) => s.id === id);
      const to = Math.max(0, Math.min(steps.length - 1, at + by));
      const next = steps.filter((s) => s.id !== id);
      next.splice(to, 0, steps[at]!);
      return next;
    });
  const start = (id: string, at: number) =>
    setSteps((steps) =>
      steps.map((s) =>
        s.id === id
          ? {
              ...s,
              stretches: [{ start: at, end: Math.max(at + 0.1, s.stretches[0]?.end ?? at + 10) }],
            }
          : s,
      ),
    );
  const remove = (step: Step) => {
    const before = document.steps;
    setSteps((steps) => steps.filter((s) => s.id !== step.id));
    toast({
      text: `“${step.title}” is out.`,
      action: { label: 'Put it back', onPress: () => change((d) => ({ ...d, steps: before })) },
    });
  };
  const add = () => {
    const step = stepSchema.parse({ id: uuid(), title: '' });
    setSteps((steps) => [...steps, step]);
    setOpen(step.id);
  };
  return (
    <Section>
      <Heading level={2} note={String(document.steps.length)}>
        Steps
      </Heading>
      {document.steps.length > 0 ? (
        <StoryStick
          input={stick}
          label="Story stick of the draft"
          onStep={setOpen}
          onOpen={setOpen}
          selected={open ?? undefined}
          drafting={{ captionStarts: [], onMoveMark: start, onMoveStep: move }}
        />
      ) : (
        <EmptyState title="No steps yet" level={3}>
          Bring the caption file above and they are jotted down, or write the first one.
        </EmptyState>
      )}
      <View role="list" aria-label="Steps">
        {document.steps.map((step, i) => (
          <View key={step.id} role="listitem">
            <Stack gap={12} style={{ paddingVertical: 8 }}>
              <StepLine
                step={step}
                number={i + 1}
                open={open === step.id}
                onMove={(by) => move(step.id, by)}
                onOpen={() => setOpen(open === step.id ? null : step.id)}
              />
              {open === step.id ? (
                <StepEditor
                  step={step}
                  document={document}
                  onChange={replace}
                  onRemove={() => remove(step)}
                />
              ) : null}
            </Stack>
            <Rule />
          </View>
        ))}
      </View>
      <Row>
        <Button icon="add" label="Add a step" onPress={add} />
      </Row>
    </Section>
  );
}

interface StepLineProps {
  step: Step;
  number: number;
  open: boolean;
  onMove: (by: number) => void;
  onOpen: () => void;
}

/** A step while it is closed: number, title, time, order. */
function StepLine({ step, number, open, onMove, onOpen }: StepLineProps) {
  return (
    <Row gap={8} justify="space-between">
      <Text style={{ flex: 1 }} weight={600}>
        {number}. {step.title || 'a new step'}{' '}
        <Text tone="ink2" weight={400}>
          {step.stretches[0] ? clockTime(step.stretches[0].start) : ''}
        </Text>
      </Text>
      <IconButton icon="up" label={`Move step ${number} up`} onPress={() => onMove(-1)} />
      <IconButton icon="down" label={`Move step ${number} down`} onPress={() => onMove(1)} />
      <Button
        size="small"
        label={open ? `Close step ${number}` : `Open step ${number}`}
        expanded={open}
        onPress={onOpen}
      >
        {open ? 'Close' : 'Open'}
      </Button>
    </Row>
  );
}

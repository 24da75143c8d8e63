import { useMemo } from 'react';
import { View } from 'react-native';
import { type Cue } from '../../shared/captions';
import { type Step } from '../../shared/plan/document';
import { clockTime } from '../../shared/plan/stick/spoken';
import { stickOf } from '../plans/plan-stick-input';
import { StoryStick } from '../story-stick/story-stick';
import { Button } from '../ui/button';
import { Heading } from '../ui/heading';
import { IconButton } from '../ui/icon-button';
import { Row, Rule, Section, Stack } from '../ui/layout';
import { EmptyState } from '../ui/states';
import { Text } from '../ui/text';
import { usePhone } from '../ui/use-media';
import { type ClipPlace } from './clip-place';
import { DragHandle, DropPlace } from './drag-order';
import { StepEditor } from './step/step-editor';
import { StepPhotos } from './step-photos';
import { useStepEdits } from './use-step-edits';
import { withDimension } from './with-dimension';
import { type DraftEditor } from './use-draft-editor';

export interface StepsPaneProps {
  editor: DraftEditor;
  place: ClipPlace;
  cues: readonly Cue[];
  /** The step that is open. */
  open: string | null;
  setOpen: (id: string | null) => void;
}

/** The steps on the stick and below each other; order by buttons, by Alt with arrows, by dragging. */
export function StepsPane({ editor, place, cues, open, setOpen }: StepsPaneProps) {
  const { document, change } = editor;
  const stick = useMemo(() => stickOf(document, {}), [document]);
  const edits = useStepEdits(editor, place, open, setOpen);
  const { move, moveTo, mark, start, add } = edits;
  return (
    <Section>
      <Heading level={2} note={String(document.steps.length)}>
        Steps
      </Heading>
      {document.steps.length > 0 ? (
        <StoryStick
          input={stick}
          label="Story stick of the draft"
          onStep={(id) => {
            setOpen(id);
            const at = document.steps.find((s) => s.id === id)?.stretches[0]?.start;
            if (at !== undefined) place.goTo(at);
          }}
          onOpen={setOpen}
          selected={open ?? undefined}
          now={place.now}
          onSeek={place.goTo}
          drafting={{
            captionStarts: cues.map((cue) => cue.start),
            onMoveMark: start,
            onMoveStep: move,
            onMarkIn: () => mark('start'),
            onMarkOut: () => mark('end'),
            onNewStep: add,
          }}
        />
      ) : (
        <EmptyState title="No steps yet" level={3}>
          Bring the caption file above and they are jotted down, or write the first one.
        </EmptyState>
      )}
      <View role="list" aria-label="Steps">
        {document.steps.map((step, i) => (
          <View key={step.id} role="listitem">
            <DropPlace onDrop={(id) => moveTo(id, i)} onMove={(by) => move(step.id, by)}>
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
                    now={place.now}
                    onMark={mark}
                    onChange={(fn) => edits.change(step.id, fn)}
                    onDimension={(heard) => change((d) => withDimension(d, step.id, heard))}
                    photos={<StepPhotos step={step} editor={editor} />}
                    onRemove={() => edits.remove(step)}
                  />
                ) : null}
              </Stack>
            </DropPlace>
            <Rule />
          </View>
        ))}
      </View>
      <Row>
        <Button icon="add" label={`Add a step at ${clockTime(place.now)}`} onPress={add} />
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
  const phone = usePhone();
  return (
    <Row gap={8} justify="space-between">
      <DragHandle id={step.id} label={`Drag step ${number}`} />
      <Text style={{ flex: 1 }} weight={600}>
        {number}. {step.title || 'a new step'}{' '}
        <Text tone="ink2" weight={400}>
          {step.stretches[0] ? clockTime(step.stretches[0].start) : ''}
        </Text>
      </Text>
      {phone && !open ? null : (
        <>
          <IconButton icon="up" label={`Move step ${number} up`} onPress={() => onMove(-1)} />
          <IconButton icon="down" label={`Move step ${number} down`} onPress={() => onMove(1)} />
        </>
      )}
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

import { type ReactNode } from 'react';
import { limits } from '../../../shared/api/limits';
import { type Heard, type PlanDocument, type Step } from '../../../shared/plan/document';
import { Button } from '../../ui/button';
import { Checkbox } from '../../ui/checkbox';
import { Fold } from '../../ui/fold';
import { Row, Stack } from '../../ui/layout';
import { Select } from '../../ui/select';
import { LimitedField } from '../fields/limited-field';
import { ListEditor } from '../fields/list-editor';
import { NumberField } from '../number-field';
import { actionFields } from './action-fields';
import { HeardList } from './heard-list';
import { StandingLines } from './standing-lines';
import { StepCautions, StepWaits } from './step-lists';
import { Stretch } from './stretch';
import { AfterSteps, Figures, PartsAndTools } from './ties';
import { Words } from './words';

export interface StepEditorProps {
  step: Step;
  document: PlanDocument;
  /** Where the clip is, seconds. */
  now: number;
  /** Sets the step's in or out to where the clip is. */
  onMark: (which: 'start' | 'end', stepId: string) => void;
  /** Changes the step as it stands when the change is made. */
  onChange: (change: (step: Step) => Step) => void;
  /** Makes a dimension of a figure heard in the clip. */
  onDimension: (heard: Heard) => void;
  /** The step's photos, with their own upload. */
  photos: ReactNode;
  onRemove: () => void;
}

const count = (n: number) => (n > 0 ? String(n) : undefined);

/** One step's fields: the words and the stretch first, the rest in parts that open. */
export function StepEditor(props: StepEditorProps) {
  const { step, document, onChange } = props;
  return (
    <Stack gap={12} style={{ maxWidth: 640 }}>
      <LimitedField
        label="Title, as an order"
        value={step.title}
        most={limits.title}
        onChange={(title) => onChange((s) => ({ ...s, title }))}
      />
      <Words {...props} />
      <Stretch {...props} />
      <Stack gap={4}>
        <Fold title="Cautions" note={count(step.cautions.length)} open>
          <StandingLines {...props} />
          <StepCautions {...props} />
        </Fold>
        <Fold title="What is done" note={count(step.actions.length)}>
          <ListEditor
            level={3}
            untitled
            title="Cuts, guards, fastenings"
            fields={actionFields(document)}
            items={step.actions}
            onChange={(fn) => onChange((s) => ({ ...s, actions: fn(s.actions) }))}
          />
        </Fold>
        <Fold title="Parts and tools" note={count(step.parts.length + step.toolIds.length)}>
          <PartsAndTools {...props} />
        </Fold>
        <Fold
          title="Dimensions and checks"
          note={count(step.takes.length + step.holds.length + step.checks.length)}
        >
          <Figures {...props} />
        </Fold>
        <Fold title="Time and order" note={timeNote(step)}>
          <TimeAndOrder {...props} />
        </Fold>
        <Fold title="Photos" note={count(step.photoIds.length)} open>
          {props.photos}
        </Fold>
        {step.heard.length > 0 ? (
          <Fold title="Heard in the clip" note={count(step.heard.length)} open>
            <HeardList {...props} />
          </Fold>
        ) : null}
      </Stack>
      <Row>
        <Button kind="danger" size="small" label="Take the step out" onPress={props.onRemove} />
      </Row>
    </Stack>
  );
}

function timeNote(step: Step): string | undefined {
  const waits = step.waits.reduce((sum, w) => sum + w.minutes, 0);
  return (
    [
      step.handsOn > 0 ? `${step.handsOn} min` : '',
      waits > 0 ? `${waits} min waiting` : '',
      step.people > 1 ? `${step.people} people` : '',
    ]
      .filter(Boolean)
      .join(', ') || undefined
  );
}

const phases = [
  { value: 'build', label: 'work on the build' },
  { value: 'demo', label: 'shown, not done' },
  { value: 'aside', label: 'an aside' },
] as const;

function TimeAndOrder(props: StepEditorProps) {
  const { step, onChange } = props;
  const set = (part: Partial<Step>) => onChange((s) => ({ ...s, ...part }));
  return (
    <>
      <NumberField
        label="Hands on, minutes"
        value={step.handsOn}
        onChange={(handsOn) => set({ handsOn })}
      />
      <NumberField
        label="People it takes"
        wholeFrom={1}
        value={step.people}
        onChange={(people) => set({ people: Math.min(20, people) })}
      />
      <Select
        label="This step is"
        options={phases}
        value={step.phase}
        onChange={(phase) => set({ phase })}
      />
      <Checkbox
        label="It loads a joint that was glued before"
        value={step.loadsJoint}
        onChange={(loadsJoint) => set({ loadsJoint })}
      />
      <AfterSteps {...props} />
      <StepWaits {...props} />
    </>
  );
}

import {
  cautionSchema,
  waitSchema,
  type Caution,
  type Step,
  type Wait,
} from '../../../shared/plan/document';
import { clockTime } from '../../../shared/plan/stick/spoken';
import { ListEditor } from '../fields/list-editor';
import { type ListFields } from '../fields/list-field';
import { amount, choice, flag, text } from '../fields/makers';
import { readClock } from './clock';

export interface StepListProps {
  step: Step;
  /** Changes the step as it stands when the change is made. */
  onChange: (change: (step: Step) => Step) => void;
}

const cautionFields: ListFields<Caution> = {
  make: (id) => cautionSchema.parse({ id, text: '' }),
  name: (c) => (c.level === 'danger' && c.text ? `Danger. ${c.text}` : c.text),
  fields: [
    text('text', 'What can hurt, and what to do'),
    {
      key: 'level',
      label: 'Weight',
      options: [
        { value: 'care', label: 'take care' },
        { value: 'danger', label: 'danger' },
      ],
      get: (c) => c.level,
      set: (c, level) => ({ ...c, level: level === 'danger' ? 'danger' : 'care' }),
    },
    {
      key: 'at',
      label: 'Said in the clip at',
      mono: true,
      lazy: true,
      get: (c) => (c.at === undefined ? '' : clockTime(c.at)),
      set: (c, value) => ({ ...c, at: readClock(value) ?? undefined }),
      fault: (value) =>
        value.trim() === '' || readClock(value) !== null
          ? undefined
          : 'A time is minutes and seconds, as 1:28.',
    },
  ],
};

/** The cautions of a step, each by itself: a line put in or taken out moves no other. */
export function StepCautions({ step, onChange }: StepListProps) {
  return (
    <ListEditor
      level={3}
      untitled
      title="Cautions"
      fields={cautionFields}
      items={step.cautions}
      onChange={(fn) => onChange((s) => ({ ...s, cautions: fn(s.cautions) }))}
    />
  );
}

const waitWords: Record<Wait['kind'], string> = {
  clamp: 'in clamps',
  cure: 'until glue has cured',
  dry: 'to dry',
  other: 'a wait',
};

const waitFields: ListFields<Wait> = {
  make: (id) => waitSchema.parse({ id, minutes: 30, kind: 'clamp' }),
  name: (w) => `${w.minutes} min, ${w.what || waitWords[w.kind]}`,
  fields: [
    {
      ...amount<Wait, 'minutes'>('minutes', 'Minutes', 60 * 24 * 60),
      set: (w, value) => ({ ...w, minutes: Number(value.replace(',', '.')) || 0 }),
    },
    choice('kind', 'Kind', ['clamp', 'cure', 'dry', 'other']),
    text('what', 'In words'),
    flag('nextMayStart', 'The next step may start before it is over'),
  ],
};

/** The waits of a step. */
export function StepWaits({ step, onChange }: StepListProps) {
  return (
    <ListEditor
      level={3}
      title="Waits"
      fields={waitFields}
      items={step.waits}
      onChange={(fn) => onChange((s) => ({ ...s, waits: fn(s.waits) }))}
    />
  );
}

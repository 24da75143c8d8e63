import { v7 as uuid } from 'uuid';
import { limits } from '../../shared/api/limits';
import { type Step, type Wait } from '../../shared/plan/document';
import { Button } from '../ui/button';
import { Checkbox } from '../ui/checkbox';
import { Row, Stack } from '../ui/layout';
import { Select } from '../ui/select';
import { TextField } from '../ui/text-field';
import { NumberField } from './number-field';

const kinds = [
  { value: 'clamp', label: 'in clamps' },
  { value: 'cure', label: 'until glue has cured' },
  { value: 'dry', label: 'to dry' },
  { value: 'other', label: 'something else' },
] as const;

/** The waits of a step. */
export function StepWaits({ step, onChange }: { step: Step; onChange: (step: Step) => void }) {
  const put = (next: Wait) =>
    onChange({ ...step, waits: step.waits.map((w) => (w.id === next.id ? next : w)) });
  const add = () =>
    onChange({
      ...step,
      waits: [
        ...step.waits,
        { id: uuid(), minutes: 30, what: '', nextMayStart: false, kind: 'clamp' },
      ],
    });
  return (
    <Stack gap={12}>
      {step.waits.map((wait, i) => (
        <Stack key={wait.id} gap={8}>
          <NumberField
            label={`Wait ${i + 1}, minutes`}
            value={wait.minutes}
            onChange={(minutes) => put({ ...wait, minutes })}
          />
          <Select
            label={`Wait ${i + 1} is`}
            options={kinds}
            value={wait.kind}
            onChange={(kind) => put({ ...wait, kind })}
          />
          <TextField
            label={`Wait ${i + 1} in words`}
            value={wait.what}
            onChange={(what) => put({ ...wait, what: what.slice(0, limits.name) })}
          />
          <Checkbox
            label="The next step may start before it is over"
            value={wait.nextMayStart}
            onChange={(nextMayStart) => put({ ...wait, nextMayStart })}
          />
          <Row>
            <Button
              size="small"
              label={`Take wait ${i + 1} out`}
              onPress={() =>
                onChange({ ...step, waits: step.waits.filter((w) => w.id !== wait.id) })
              }
            />
          </Row>
        </Stack>
      ))}
      <Row>
        <Button size="small" icon="add" label="Add a wait" onPress={add} />
      </Row>
    </Stack>
  );
}

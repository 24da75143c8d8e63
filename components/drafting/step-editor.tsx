import { useState } from 'react';
import { v7 as uuid } from 'uuid';
import { limits } from '../../shared/api/limits';
import { type PlanDocument, type Step } from '../../shared/plan/document';
import { clockTime } from '../../shared/plan/stick/spoken';
import { Button } from '../ui/button';
import { Checkbox } from '../ui/checkbox';
import { Row, Stack } from '../ui/layout';
import { Select } from '../ui/select';
import { Text } from '../ui/text';
import { TextArea, TextField } from '../ui/text-field';

/** Seconds of `1:28`, `88` or `1:02:03.5`; null when it is no time. */
export function readClock(text: string): number | null {
  if (!/^\d+(?::\d{1,2}){0,2}(?:\.\d+)?$/.test(text.trim())) return null;
  return text
    .trim()
    .split(':')
    .reduce((sum, part) => sum * 60 + Number(part), 0);
}

export interface StepEditorProps {
  step: Step;
  document: PlanDocument;
  onChange: (step: Step) => void;
  onRemove: () => void;
}

/** One step's fields. */
export function StepEditor({ step, document, onChange, onRemove }: StepEditorProps) {
  const set = (part: Partial<Step>) => onChange({ ...step, ...part });
  const wait = step.waits[0];
  return (
    <Stack gap={12} style={{ maxWidth: 640 }}>
      <TextField
        label="Title, as an order"
        value={step.title}
        onChange={(title) => set({ title: title.slice(0, limits.title) })}
      />
      <TextArea
        label="What to do"
        value={step.text}
        onChange={(text) => set({ text: text.slice(0, limits.stepText) })}
        limit={limits.stepText}
        help="Markdown. {{dim:…}} and {{part:…}} are put in by the buttons below."
      />
      <Row gap={8} wrap>
        {document.dimensions.map((d) => (
          <Button
            key={d.id}
            size="small"
            label={`Put ${d.symbol} into the text`}
            onPress={() => set({ text: `${step.text} {{dim:${d.id}}}`.trim() })}
          >
            {d.symbol}
          </Button>
        ))}
      </Row>
      <Stretch step={step} onChange={onChange} />
      <TextField
        label="Hands on, minutes"
        inputMode="decimal"
        value={String(step.handsOn)}
        onChange={(text) => set({ handsOn: Math.max(0, Number(text) || 0) })}
      />
      <TextArea
        label="Cautions, one a line"
        value={step.cautions.map((c) => c.text).join('\n')}
        onChange={(text) =>
          set({
            cautions:
              text === ''
                ? []
                : text.split('\n').map((line, i) => ({
                    ...(step.cautions[i] ?? { id: uuid(), level: 'care' as const }),
                    text: line,
                  })),
          })
        }
      />
      <TextField
        label="Wait afterwards, minutes"
        inputMode="decimal"
        value={wait ? String(wait.minutes) : ''}
        onChange={(text) =>
          set({
            waits:
              Number(text) > 0
                ? [
                    {
                      ...(wait ?? {
                        id: uuid(),
                        what: '',
                        nextMayStart: false,
                        kind: 'other' as const,
                      }),
                      minutes: Number(text),
                    },
                  ]
                : [],
          })
        }
      />
      <MadeHere step={step} document={document} set={set} />
      {step.heard.length > 0 ? (
        <Text tone="ink2">
          Heard in the clip: {step.heard.map((h) => `“${h.words}”`).join(', ')}
        </Text>
      ) : null}
      <Row>
        <Button kind="danger" size="small" label="Take the step out" onPress={onRemove} />
      </Row>
    </Stack>
  );
}

interface MadeHereProps {
  step: Step;
  document: PlanDocument;
  set: (part: Partial<Step>) => void;
}

/** What the step does to parts, and the dimensions taken or held in it. */
function MadeHere({ step, document, set }: MadeHereProps) {
  const toggle = (list: 'takes' | 'holds', id: string, on: boolean) =>
    set({ [list]: on ? [...step[list], id] : step[list].filter((x) => x !== id) });
  return (
    <>
      {document.parts.map((part) => (
        <Select
          key={part.id}
          label={`Part ${part.mark}, ${part.name}`}
          options={['not here', 'roughed', 'sized', 'shaped', 'used'].map((value) => ({
            value,
            label: value,
          }))}
          value={step.parts.find((p) => p.partId === part.id)?.to ?? 'not here'}
          onChange={(to) =>
            set({
              parts: [
                ...step.parts.filter((p) => p.partId !== part.id),
                ...(to === 'not here'
                  ? []
                  : [{ partId: part.id, to: to as Step['parts'][number]['to'] }]),
              ],
            })
          }
        />
      ))}
      {document.dimensions.map((d) => {
        const list = d.origin === 'taken' ? 'takes' : 'holds';
        return (
          <Checkbox
            key={d.id}
            label={`${d.origin === 'taken' ? 'Take' : 'Hold'} ${d.name} here`}
            value={step[list].includes(d.id)}
            onChange={(on) => toggle(list, d.id, on)}
          />
        );
      })}
    </>
  );
}

function Stretch({ step, onChange }: Pick<StepEditorProps, 'step' | 'onChange'>) {
  const stretch = step.stretches[0];
  const [from, setFrom] = useState(stretch ? clockTime(stretch.start) : '');
  const [to, setTo] = useState(stretch ? clockTime(stretch.end) : '');
  const keep = (a: string, b: string) => {
    const start = readClock(a);
    const end = readClock(b);
    if (start !== null && end !== null && end > start)
      onChange({ ...step, stretches: [{ start, end }] });
  };
  const fault = (text: string) =>
    text === '' || readClock(text) !== null ? undefined : 'A time is minutes and seconds, as 1:28.';
  return (
    <Row gap={12} wrap align="flex-start">
      <TextField
        label="In"
        mono
        value={from}
        error={fault(from)}
        onChange={(text) => {
          setFrom(text);
          keep(text, to);
        }}
      />
      <TextField
        label="Out"
        mono
        value={to}
        error={fault(to)}
        onChange={(text) => {
          setTo(text);
          keep(from, text);
        }}
      />
    </Row>
  );
}

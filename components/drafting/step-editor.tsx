import { useState, type ReactNode } from 'react';
import { v7 as uuid } from 'uuid';
import { NumberField } from './number-field';
import { StepWaits } from './step-waits';
import { limits } from '../../shared/api/limits';
import { type Heard, type PlanDocument, type Step } from '../../shared/plan/document';
import { looseNames, shownText, storedText } from '../../shared/plan/references';
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
  /** Where the clip is, seconds. */
  now: number;
  /** Sets the step's in or out to where the clip is. */
  onMark: (which: 'start' | 'end', stepId: string) => void;
  onChange: (step: Step) => void;
  /** Makes a dimension of a figure heard in the clip. */
  onDimension: (heard: Heard) => void;
  /** The step's photos, with their own upload. */
  photos: ReactNode;
  onRemove: () => void;
}

/** One step's fields. */
export function StepEditor(props: StepEditorProps) {
  const { step, document, onChange, onRemove } = props;
  const set = (part: Partial<Step>) => onChange({ ...step, ...part });
  return (
    <Stack gap={12} style={{ maxWidth: 640 }}>
      <TextField
        label="Title, as an order"
        value={step.title}
        onChange={(title) => set({ title: title.slice(0, limits.title) })}
      />
      <Words {...props} />
      <Stretch
        key={`${step.stretches[0]?.start ?? ''}-${step.stretches[0]?.end ?? ''}`}
        {...props}
      />
      <NumberField
        label="Hands on, minutes"
        value={step.handsOn}
        onChange={(handsOn) => set({ handsOn })}
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
      <StepWaits step={step} onChange={onChange} />
      {props.photos}
      <MadeHere step={step} document={document} set={set} />
      <HeardList {...props} />
      <Row>
        <Button kind="danger" size="small" label="Take the step out" onPress={onRemove} />
      </Row>
    </Stack>
  );
}

/** The text, with references shown by symbol and mark, and buttons that put them in. */
function Words({ step, document, onChange }: StepEditorProps) {
  const text = shownText(step.text, document);
  const loose = looseNames(storedText(text, document));
  const put = (words: string) =>
    onChange({ ...step, text: storedText(words, document).slice(0, limits.stepText) });
  return (
    <>
      <TextArea
        label="What to do"
        value={text}
        onChange={put}
        limit={limits.stepText}
        help="Markdown. Figures and parts go in by the buttons below, so that they follow the plan."
        error={loose.length > 0 ? `Nothing is called ${loose.join(', ')}.` : undefined}
      />
      <Row gap={8} wrap>
        {document.dimensions.map((d) => (
          <Button
            key={d.id}
            size="small"
            label={`Put ${d.symbol} into the text`}
            onPress={() => put(`${text} {{${d.symbol}}}`.trim())}
          >
            {d.symbol}
          </Button>
        ))}
        {document.parts.map((part) => (
          <Button
            key={part.id}
            size="small"
            label={`Put part ${part.mark} into the text`}
            onPress={() => put(`${text} {{part ${part.mark}}}`.trim())}
          >
            {part.mark}
          </Button>
        ))}
      </Row>
    </>
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

/** Figures heard in the stretch: make one a dimension, or say how the bench treats it. */
function HeardList({ step, document, onChange, onDimension }: StepEditorProps) {
  if (step.heard.length === 0) return null;
  const rule = (heard: Heard, ruling: Heard['ruling']) =>
    onChange({ ...step, heard: step.heard.map((h) => (h.id === heard.id ? { ...h, ruling } : h)) });
  return (
    <Stack gap={8}>
      <Text weight={600}>Heard in the clip</Text>
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
                onChange({ ...step, heard: step.heard.filter((h) => h.id !== heard.id) })
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

function Stretch({ step, now, onMark, onChange }: StepEditorProps) {
  const stretch = step.stretches[0];
  const [from, setFrom] = useState(stretch ? clockTime(stretch.start) : '');
  const [to, setTo] = useState(stretch ? clockTime(stretch.end) : '');
  const keep = (a: string, b: string) => {
    const start = readClock(a);
    const end = readClock(b);
    if (start !== null && end !== null && end > start)
      onChange({ ...step, stretches: [{ start, end }, ...step.stretches.slice(1)] });
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
      <Button
        size="small"
        icon="markin"
        label={`In at ${clockTime(now)}`}
        onPress={() => onMark('start', step.id)}
      />
      <Button
        size="small"
        icon="markout"
        label={`Out at ${clockTime(now)}`}
        onPress={() => onMark('end', step.id)}
      />
    </Row>
  );
}

import { useMemo, useState } from 'react';
import { View } from 'react-native';
import { type BenchCopy } from '../../shared/api/bench';
import { type BenchState } from '../../shared/plan/bench/fold';
import { type Step } from '../../shared/plan/document';
import { type PlanValues } from '../plans/plan-model';
import { StandingLines } from '../plans/standing-lines';
import { StepPhotos } from '../plans/step-photos';
import { referencesOf } from '../plans/step-references';
import { KeptFiles } from '../service-worker/kept-files';
import { Button } from '../ui/button';
import { Heading } from '../ui/heading';
import { Icon } from '../ui/icon';
import { Row, Stack } from '../ui/layout';
import { Prose } from '../ui/prose';
import { Text } from '../ui/text';
import { TextArea } from '../ui/text-field';
import { type NewEntry } from './bench-queries';
import { CheckCard } from './check-card';
import { BenchClip } from './bench-clip';
import { BenchWays } from './bench-ways';
import { ClipSays } from './clip-says';
import { DimensionLineup } from './dimension-lineup';
import { WaitTimer } from './wait-timer';
import { type Entry } from '../../shared/plan/bench/entry';

export interface BenchStepProps {
  step: Step;
  copy: BenchCopy;
  state: BenchState;
  values: PlanValues;
  add: (entry: NewEntry) => Promise<Entry>;
  now: number;
  /** Whether the screen stays on; see `useAwake`. */
  awake: boolean | null;
}

/** One step: clip over its stretch, what the clip says otherwise, the action, its figures, cautions, waits, notes. */
export function BenchStep(props: BenchStepProps) {
  const { step, copy, state, values, add } = props;
  const asked = copy.document.dimensions.filter(
    (d) => step.takes.includes(d.id) || step.holds.includes(d.id),
  );
  const references = useMemo(() => referencesOf(copy.document, values), [copy.document, values]);
  return (
    <Stack gap={16}>
      <BenchClip key={`clip-${step.id}`} step={step} document={copy.document} />
      <ClipSays step={step} values={values} />
      <StandingLines step={step} document={copy.document} />
      {step.cautions.map((caution) => (
        <Row key={caution.id} gap={12} align="flex-start">
          <Icon name="caution" size={28} />
          <Text size="lead" weight={600} style={{ flex: 1 }}>
            {caution.text}
          </Text>
        </Row>
      ))}
      <Heading level={2} size="heading" ruled={false}>
        {step.title}
      </Heading>
      {step.text ? (
        <Prose size="lead" renderReference={references}>
          {step.text}
        </Prose>
      ) : null}
      <StepPhotos step={step} document={copy.document} />
      {asked.map((dimension) => (
        <DimensionLineup
          key={dimension.id}
          dimension={dimension}
          values={values}
          taken={step.takes.includes(dimension.id)}
        />
      ))}
      {copy.document.checks
        .filter((check) => step.checks.includes(check.id))
        .map((check) => (
          <CheckCard key={check.id} check={check} state={state} values={values} add={add} />
        ))}
      {step.waits.map((wait) => (
        <WaitTimer
          key={wait.id}
          wait={wait}
          started={state.waits.get(wait.id)}
          now={props.now}
          add={add}
        />
      ))}
      {state.ticks.has(step.id) ? <Undo {...props} /> : null}
      <BenchWays awake={props.awake} />
      <Notes key={`notes-${step.id}`} {...props} />
      <KeptFiles copy={copy} />
    </Stack>
  );
}

/** Takes the tick of a step back. */
function Undo({ step, copy, add }: BenchStepProps) {
  const tick = [...copy.entries]
    .reverse()
    .find((e) => e.entry.kind === 'tick' && e.entry.elementId === step.id);
  if (!tick) return null;
  return (
    <Row>
      <Button
        size="bench"
        icon="undo"
        label="Not done after all"
        onPress={() => void add({ kind: 'withdraw', elementId: step.id, withdraws: tick.entry.id })}
      />
    </Row>
  );
}

function Notes({ step, state, add }: BenchStepProps) {
  const [text, setText] = useState('');
  const notes = state.notes.get(step.id) ?? [];
  const keep = async () => {
    const words = text.trim();
    if (words === '') return;
    setText('');
    try {
      await add({ kind: 'note', elementId: step.id, text: words });
    } catch (error) {
      setText(words);
      throw error;
    }
  };
  return (
    <View>
      <Stack gap={12}>
        <Heading level={3}>Notes</Heading>
        {notes.map((note) => (
          <Text key={note.id} size="lead">
            {note.text}
          </Text>
        ))}
        <TextArea label="A note for yourself" value={text} onChange={setText} />
        <Row>
          <Button size="bench" label="Keep the note" onPress={() => void keep()} />
        </Row>
      </Stack>
    </View>
  );
}

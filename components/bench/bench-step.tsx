import { useMemo, useState } from 'react';
import { View } from 'react-native';
import { type BenchCopy } from '../../shared/api/bench';
import { type BenchState } from '../../shared/plan/bench/fold';
import { type Step } from '../../shared/plan/document';
import { ClipPlayer } from '../plans/clip-player';
import { type PlanValues } from '../plans/plan-model';
import { StandingLines } from '../plans/standing-lines';
import { StepPhotos } from '../plans/step-photos';
import { referencesOf } from '../plans/step-references';
import { KeptFiles } from '../service-worker/kept-files';
import { Button } from '../ui/button';
import { Heading } from '../ui/heading';
import { Icon } from '../ui/icon';
import { useMe } from '../data/me-queries';
import { usePreferences } from '../data/preferences';
import { Row, Stack } from '../ui/layout';
import { SegmentedControl } from '../ui/radio-group';
import { Prose } from '../ui/prose';
import { Text } from '../ui/text';
import { TextArea } from '../ui/text-field';
import { type NewEntry } from './bench-queries';
import { CheckCard } from './check-card';
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
}

/** One step: clip over its stretch, what the clip says otherwise, the action, its figures, cautions, waits, notes. */
export function BenchStep(props: BenchStepProps) {
  const { step, copy, state, values, add } = props;
  const stretch = step.stretches[0];
  const asked = copy.document.dimensions.filter(
    (d) => step.takes.includes(d.id) || step.holds.includes(d.id),
  );
  const references = useMemo(() => referencesOf(copy.document, values), [copy.document, values]);
  return (
    <Stack gap={16}>
      {stretch ? (
        <ClipPlayer
          key={`clip-${step.id}`}
          clip={copy.document.clip}
          stretch={stretch}
          label={`Clip of step: ${step.title}`}
          cover={copy.document.cover}
        />
      ) : null}
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
      <Units />
      <Notes key={`notes-${step.id}`} {...props} />
      <KeptFiles copy={copy} />
    </Stack>
  );
}

/** The units, switched where the work is. */
function Units() {
  const { me } = useMe();
  const [{ units }, change] = usePreferences(me !== null);
  return (
    <SegmentedControl
      label="Figures in"
      options={[
        { value: 'mm', label: 'millimetres' },
        { value: 'in', label: 'inches' },
      ]}
      value={units}
      onChange={(next) => change({ units: next })}
    />
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
    if (text.trim() === '') return;
    await add({ kind: 'note', elementId: step.id, text: text.trim() });
    setText('');
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

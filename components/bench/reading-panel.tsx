import { useState } from 'react';
import { View } from 'react-native';
import { type BenchCopy } from '../../shared/api/bench';
import { type Entry } from '../../shared/plan/bench/entry';
import { type BenchState } from '../../shared/plan/bench/fold';
import { instruments, type Dimension, type InstrumentName } from '../../shared/plan/document';
import { displayMm, toExact } from '../../shared/measure';
import { describeCoarse } from '../../shared/plan/model';
import { type PlanValues } from '../plans/plan-model';
import { Button } from '../ui/button';
import { Figure } from '../ui/figure';
import { Form } from '../ui/form';
import { Heading } from '../ui/heading';
import { Row, Stack } from '../ui/layout';
import { Select } from '../ui/select';
import { Tag } from '../ui/tag';
import { Text } from '../ui/text';
import { NumberFigureField } from '../ui/text-field';
import { type NewEntry } from './bench-queries';
import { Said } from './dimension-lineup';
import { judge } from './judge';
import { Keypad } from './keypad';

export interface ReadingPanelProps {
  copy: BenchCopy;
  state: BenchState;
  values: PlanValues;
  dimensionIds: readonly string[];
  add: (entry: NewEntry) => Promise<Entry>;
  onDone: () => void;
}

/** Takes readings of the step's dimensions, one after the other. */
export function ReadingPanel({
  copy,
  state,
  values,
  dimensionIds,
  add,
  onDone,
}: ReadingPanelProps) {
  const dimensions = dimensionIds.flatMap(
    (id) => copy.document.dimensions.find((d) => d.id === id) ?? [],
  );
  const unread = dimensions.find((d) => !state.readings.has(d.id));
  const [chosen, setChosen] = useState<string | null>(null);
  const dimension = dimensions.find((d) => d.id === chosen) ?? unread ?? dimensions[0];
  if (!dimension) return null;
  return (
    <Stack gap={16}>
      <Heading level={2} size="heading" ruled={false}>
        Reading: {dimension.name.toLowerCase()}
      </Heading>
      {dimensions.length > 1 ? (
        <Row gap={8} wrap>
          {dimensions.map((d) => (
            <Tag
              key={d.id}
              label={d.name}
              kind={d.id === dimension.id ? 'on' : 'plain'}
              onPress={() => setChosen(d.id)}
            />
          ))}
        </Row>
      ) : null}
      <OneReading
        key={dimension.id}
        dimension={dimension}
        state={state}
        values={values}
        add={add}
        choose={setChosen}
        onDone={onDone}
      />
    </Stack>
  );
}

interface OneReadingProps extends Pick<ReadingPanelProps, 'state' | 'values' | 'add' | 'onDone'> {
  dimension: Dimension;
  choose: (id: string) => void;
}

/** One dimension: the figure typed or keyed in, the instrument, what was read before, the verdict. */
function OneReading({ dimension, state, values, add, choose, onDone }: OneReadingProps) {
  const [text, setText] = useState('');
  const [fault, setFault] = useState<string | undefined>();
  const [instrument, setInstrument] = useState<InstrumentName>(dimension.instrument);
  const readings = state.readings.get(dimension.id) ?? [];
  const wanted = values.figure(dimension.id);
  const verdict = judge(values, dimension.id);
  const unit = values.preference.system;
  const coarse = verdict?.judged
    ? describeCoarse(verdict.judged, { ...values.preference, instrument: 'calipers' })
    : '';
  const spread = values.model.dimensions.get(dimension.id)?.readings?.spread ?? null;
  const take = async () => {
    const read = toExact(text, unit);
    if (!read.ok) {
      setFault(`${read.message} ${read.cure ?? ''}`.trim());
      return;
    }
    setFault(undefined);
    choose(dimension.id);
    await add({
      kind: 'reading',
      form: 'figure',
      elementId: dimension.id,
      value: read.value,
      instrument,
      place: readings.length > 0 ? `place ${readings.length + 1}` : '',
    });
    setText('');
  };
  return (
    <Stack gap={16}>
      {wanted && dimension.origin !== 'taken' ? (
        <Text size="lead">
          Wanted <Figure figure={wanted} weight={700} />
        </Text>
      ) : null}
      {dimension.where ? <Text tone="ink2">{dimension.where}</Text> : null}
      <Form label={`Reading of ${dimension.name}`} onSubmit={() => void take()}>
        <NumberFigureField
          label="What you read"
          value={text}
          onChange={setText}
          unit={unit}
          error={fault}
          help={unit === 'in' ? 'As 2 3/4, 2-3/4 or 2.75' : 'As 17.6'}
          autoFocus
        />
        <Keypad unit={unit} value={text} onChange={setText} />
        <Select
          label="With"
          options={instruments.map((value) => ({ value, label: value.replace('-', ' ') }))}
          value={instrument}
          onChange={setInstrument}
        />
        <Row gap={12} wrap>
          <Button size="bench" kind="primary" label="Take reading" submit />
          <Button size="bench" label="Done reading" onPress={onDone} />
        </Row>
      </Form>
      {readings.length > 0 && verdict ? <Said verdict={verdict} values={values} /> : null}
      {coarse ? <Text size="lead">{coarse}</Text> : null}
      {readings.length > 1 && spread !== null ? (
        <Text size="lead">
          Spread over {readings.length} places:{' '}
          <Figure
            figure={displayMm(spread, { ...values.preference, instrument: 'calipers' })}
            weight={600}
          />
          . The{' '}
          {dimension.counts === 'mean'
            ? 'mean'
            : dimension.counts === 'min'
              ? 'smallest'
              : 'largest'}{' '}
          counts.
        </Text>
      ) : null}
      <ReadingList dimension={dimension} readings={readings} add={add} />
    </Stack>
  );
}

interface ReadingListProps extends Pick<ReadingPanelProps, 'add'> {
  dimension: Dimension;
  readings: readonly { id: string; value: { text: string }; instrument: InstrumentName }[];
}

/** What was read so far; each can be taken back. */
function ReadingList({ dimension, readings, add }: ReadingListProps) {
  return (
    <>
      {readings.map((reading, i) => (
        <Row key={reading.id} gap={12} justify="space-between" wrap>
          <Text size="lead">
            {i + 1}. <Figure figure={reading.value.text} weight={600} />{' '}
            {reading.instrument.replace('-', ' ')}
          </Text>
          <View>
            <Button
              label={`Take reading ${i + 1} back`}
              size="bench"
              onPress={() =>
                void add({ kind: 'withdraw', elementId: dimension.id, withdraws: reading.id })
              }
            >
              Take it back
            </Button>
          </View>
        </Row>
      ))}
    </>
  );
}

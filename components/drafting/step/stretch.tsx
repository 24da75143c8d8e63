import { useState } from 'react';
import { View } from 'react-native';
import { type Step } from '../../../shared/plan/document';
import { clockTime } from '../../../shared/plan/stick/spoken';
import { Button } from '../../ui/button';
import { Row, Stack } from '../../ui/layout';
import { TextField } from '../../ui/text-field';
import { webStyle } from '../../ui/web-style';
import { readClock } from './clock';

export interface StretchProps {
  step: Step;
  /** Where the clip is, seconds. */
  now: number;
  /** Sets the step's in or out to where the clip is. */
  onMark: (which: 'start' | 'end', stepId: string) => void;
  onChange: (change: (step: Step) => Step) => void;
}

/** What is wrong with an in or an out as typed; both as text. */
export function stretchFaults(from: string, to: string): { from?: string; to?: string } {
  const no = 'A time is minutes and seconds, as 1:28.';
  const start = readClock(from);
  const end = readClock(to);
  if (from !== '' && start === null) return { from: no };
  if (to !== '' && end === null) return { to: no };
  if (start !== null && end !== null && end <= start)
    return { to: 'The out lies before the in. The stretch before stays until it lies behind it.' };
  return {};
}

/** In and out of a step in the clip: typed, or set to where the clip is. */
export function Stretch({ step, now, onMark, onChange }: StretchProps) {
  const stretch = step.stretches[0];
  const shown = (at: number | undefined) => (at === undefined ? '' : clockTime(at));
  const [seen, setSeen] = useState(stretch);
  const [from, setFrom] = useState(shown(stretch?.start));
  const [to, setTo] = useState(shown(stretch?.end));
  // A mark moved elsewhere is shown; what is being typed is left as it is.
  if (seen !== stretch) {
    setSeen(stretch);
    if (readClock(from) !== stretch?.start) setFrom(shown(stretch?.start));
    if (readClock(to) !== stretch?.end) setTo(shown(stretch?.end));
  }
  const faults = stretchFaults(from, to);
  const keep = (a: string, b: string) => {
    // An end nobody typed in keeps its fractions of a second.
    const start = stretch && a === shown(stretch.start) ? stretch.start : readClock(a);
    const end = stretch && b === shown(stretch.end) ? stretch.end : readClock(b);
    if (start === null || end === null || end <= start) return;
    const next = { start, end };
    setSeen(next);
    onChange((s) => ({ ...s, stretches: [next, ...s.stretches.slice(1)] }));
  };
  return (
    <Stack gap={8}>
      <View style={ends}>
        <TextField
          label="In"
          mono
          value={from}
          error={faults.from}
          onChange={(text) => {
            setFrom(text);
            keep(text, to);
          }}
        />
        <TextField
          label="Out"
          mono
          value={to}
          error={faults.to}
          onChange={(text) => {
            setTo(text);
            keep(from, text);
          }}
        />
      </View>
      <Row gap={8} wrap>
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
    </Stack>
  );
}

const ends = webStyle({
  display: 'grid',
  gridTemplateColumns: 'repeat(2, minmax(0, 180px))',
  columnGap: 12,
  alignItems: 'start',
});

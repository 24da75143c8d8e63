import { type BenchCopy } from '../../shared/api/bench';
import { keepFiles, leaveOut, openKept, type KeptState } from '../data/kept-files';
import { Button } from '../ui/button';
import { Heading } from '../ui/heading';
import { Row, Section } from '../ui/layout';
import { Progress } from '../ui/progress';
import { Text } from '../ui/text';
import { sizeWords } from './size-words';
import { useKept, usePromise } from './use-kept';

function wordsOf(state: KeptState): string {
  switch (state.at) {
    case 'measuring':
      return 'Measuring the pictures and the clip.';
    case 'nothing':
      return 'Text and figures are kept on this device.';
    case 'unmeasured':
      return 'Text and figures are kept here. The pictures and the clip follow when the signal is back.';
    case 'offered':
      return `The pictures and the clip take ${sizeWords(state.bytes)}. Keep them here, and they show with no signal.`;
    case 'keeping':
      return `Keeping ${sizeWords(state.bytes)} of pictures and clip.`;
    case 'kept':
      return `Text, figures, pictures and clip are kept on this device: ${sizeWords(state.bytes)}.`;
    case 'left-out':
      return 'Text and figures are kept here. The pictures and the clip are left out and need a signal.';
    case 'stopped':
      return 'Keeping the pictures and the clip broke off. What came whole is kept. Go on when the signal is better.';
    case 'no-room':
      return `The pictures and the clip take ${sizeWords(state.bytes)}; this browser has ${
        state.room === null ? 'no room for them' : `${sizeWords(state.room)} left`
      }. Text, figures and your entries are kept. Leave them out, or remove another copy’s.`;
  }
}

/** What of a bench copy is on this device, how much it is, and ways to keep it or take it away. */
export function KeptFiles({ copy }: { copy: BenchCopy }) {
  const state = useKept(copy);
  const promised = usePromise();
  const keep = () => void keepFiles(copy.id);
  const drop = () => void leaveOut(copy.id);
  const again = () => void openKept(copy.id, copy.document);
  return (
    <Section>
      <Heading level={2} size="lead">
        On this device
      </Heading>
      <Text tone="ink2">{wordsOf(state)}</Text>
      {state.at === 'keeping' ? (
        <Progress label="Keeping pictures and clip" value={state.done / state.bytes} />
      ) : null}
      <Row gap={12} wrap>
        {state.at === 'offered' || state.at === 'left-out' ? (
          <Button size="bench" label={`Keep ${sizeWords(state.bytes)}`} onPress={keep} />
        ) : null}
        {state.at === 'stopped' || state.at === 'no-room' ? (
          <Button size="bench" label="Go on keeping" onPress={again} />
        ) : null}
        {state.at === 'offered' || state.at === 'keeping' || state.at === 'no-room' ? (
          <Button size="bench" label="Leave them out" onPress={drop} />
        ) : null}
        {state.at === 'kept' ? (
          <Button size="bench" label="Remove pictures and clip" onPress={drop} />
        ) : null}
      </Row>
      {promised === false ? (
        <Text tone="ink2" size="note">
          The browser does not promise to hold on to this: short of room, it may clear it. What was
          sent is safe.
        </Text>
      ) : null}
    </Section>
  );
}

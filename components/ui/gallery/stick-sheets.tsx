import { useState } from 'react';
import { View } from 'react-native';
import { type StickInput } from '../../../shared/plan/stick/types';
import { BenchStick } from '../../story-stick/bench-stick';
import { BlankStick } from '../../story-stick/blank-stick';
import { PlanStick } from '../../story-stick/plan-stick';
import { StoryStick } from '../../story-stick/story-stick';
import { withMark } from '../../story-stick/use-stick-pointer';
import { Row } from '../layout';
import { Text } from '../text';
import { Sheet } from './sample';
import { hundredSteps, nineSteps, openSteps, sixtySteps, threeSteps } from './stick-samples.data';

export function SticksSheet({ theme }: { theme: string }) {
  const [at, setAt] = useState('s4');
  const [draft, setDraft] = useState<StickInput>(nineSteps);
  const [now, setNow] = useState(212);
  return (
    <Sheet title="Story stick" note="nine, sixty, a hundred, three steps">
      <StoryStick
        input={nineSteps}
        label={`Nine steps, ${theme}`}
        now={204}
        selected={at}
        onStep={setAt}
      />
      <StoryStick input={sixtySteps} label={`Sixty steps, ${theme}`} now={240} />
      <StoryStick
        input={hundredSteps}
        label={`A hundred steps, ${theme}`}
        selected="s64"
        onStep={() => undefined}
      />
      <Row gap={16} wrap>
        <StoryStick input={threeSteps} label={`Three steps, ${theme}`} now={80} width={300} />
        <StoryStick input={openSteps} label={`Nothing begun, ${theme}`} width={200} />
      </Row>
      <BlankStick />
      <Text size="small" tone="ink2">
        Drafting: drag a mark, nudge it with the arrow keys.
      </Text>
      <StoryStick
        input={draft}
        label={`Drafting stick, ${theme}`}
        now={now}
        onSeek={setNow}
        drafting={{
          captionStarts: [60, 130, 170, 260, 350],
          onMoveMark: (id, start) => setDraft(withMark(draft, id, start)),
        }}
      />
    </Sheet>
  );
}

export function TallSticksSheet({ theme }: { theme: string }) {
  const [at, setAt] = useState('s4');
  return (
    <Sheet title="At the bench and on a plan page" note="bench column 52">
      <Row gap={24} align="flex-start" wrap>
        <View style={{ height: 600 }}>
          <BenchStick
            input={nineSteps}
            label={`Bench stick, ${theme}`}
            now={205}
            selected={at}
            onStep={setAt}
            height={600}
          />
        </View>
        <View style={{ height: 600 }}>
          <BenchStick
            input={sixtySteps}
            label={`Dense bench stick, ${theme}`}
            now={240}
            onStep={() => undefined}
            height={600}
          />
        </View>
        <View style={{ flexGrow: 1, flexShrink: 1, flexBasis: 280, minWidth: 0 }}>
          <PlanStick
            steps={nineSteps.steps}
            label={`Steps, ${theme}`}
            renderBody={(s) => (
              <Text size="note" tone="ink2">
                {s.waits.length ? 'Wait 45 min in clamps' : 'Base width 12 in'}
              </Text>
            )}
          />
        </View>
      </Row>
    </Sheet>
  );
}

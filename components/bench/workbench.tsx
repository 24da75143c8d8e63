import { useEffect, useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { type BenchCopy } from '../../shared/api/bench';
import { type BenchState } from '../../shared/plan/bench/fold';
import { type PlanDocument } from '../../shared/plan/document';
import { spokenStep } from '../../shared/plan/spoken-step';
import { usePreferences } from '../data/preferences';
import { usePlanValues } from '../plans/plan-model';
import { PageHead } from '../shell/page-head';
import { BenchStick } from '../story-stick/bench-stick';
import { toast } from '../ui/announcer';
import { speakFigure } from '../ui/figure-words';
import { webStyle } from '../ui/web-style';
import { useAddEntry, useBenchState } from './bench-queries';
import { BenchFoot } from './bench-foot';
import { BenchStep } from './bench-step';
import { TopLine } from './bench-top-line';
import { ReadAloud } from './read-aloud';
import { ReadingPanel } from './reading-panel';
import { runningWaits, RunningWaits } from './running-waits';
import { LockButton, SleeveLock } from './sleeve-lock';
import { useAwake } from './use-awake';
import { useBenchStick } from './use-bench-stick';
import { useClock } from './use-clock';
import { useStepKeys } from './use-step-keys';

/** Which step is on show, and whether a reading of it is taken. */
function usePlace(document: PlanDocument, state: BenchState) {
  const { steps } = document;
  const firstOpen = steps.findIndex((s) => !state.ticks.has(s.id));
  const [at, setAt] = useState(() => Math.max(0, firstOpen));
  const [reading, setReading] = useState(false);
  const go = (to: number) => {
    setReading(false);
    setAt(Math.max(0, Math.min(steps.length - 1, to)));
  };
  useStepKeys({ next: () => go(at + 1), back: () => go(at - 1), off: reading });
  useEffect(() => {
    window.document.getElementById('bench-step')?.scrollTo?.({ top: 0 });
  }, [at]);
  const goTo = (id: string) => go(steps.findIndex((s) => s.id === id));
  return { at, step: steps[Math.min(at, steps.length - 1)], go, goTo, reading, setReading };
}

/** One step at a time on the story stick. */
export function Workbench({ copy, personId }: { copy: BenchCopy; personId: string }) {
  const { document } = copy;
  const state = useBenchState(copy);
  const add = useAddEntry(copy, personId);
  const values = usePlanValues(document, state);
  const now = useClock([...state.waits.values()].some((wait) => !wait.ended) ? 1000 : null);
  const { at, step, go, goTo, reading, setReading } = usePlace(document, state);
  const awake = useAwake();
  const [locked, setLocked] = useState(false);
  const [{ hand }] = usePreferences();
  const left = hand === 'left';
  const stick = useBenchStick(copy, state, values, step?.id, now);
  if (!step) return <PageHead title={copy.title} back="/bench" />;
  const done = async () => {
    if (!state.ticks.has(step.id)) await add({ kind: 'tick', elementId: step.id });
    if (at + 1 < document.steps.length) go(at + 1);
    else toast({ text: 'That was the last step.' });
  };
  const say = (id: string) => {
    const figure = values.figure(id);
    return figure && speakFigure(figure);
  };
  const asked = [...new Set([...step.takes, ...step.holds])];
  const each = { copy, state, values, add };
  return (
    <View style={styles.frame}>
      <PageHead
        title={`Step ${at + 1} of ${document.steps.length}, ${copy.title}`}
        heading={false}
        bar={false}
      />
      <TopLine at={at} count={document.steps.length} copyId={copy.id}>
        <ReadAloud key={step.id} sentences={() => spokenStep(step, document, say)} />
      </TopLine>
      <View style={[styles.middle, left && styles.turned]}>
        <View style={styles.stick}>
          <BenchStick
            input={stick}
            label="Story stick, your bench copy"
            selected={step.id}
            onStep={goTo}
          />
          <LockButton onLock={() => setLocked(true)} />
        </View>
        <View style={styles.step} nativeID="bench-step">
          <RunningWaits
            waits={runningWaits(document, state, now)}
            stepId={step.id}
            add={add}
            onStep={goTo}
          />
          {reading ? (
            <ReadingPanel {...each} dimensionIds={asked} onDone={() => setReading(false)} />
          ) : (
            <BenchStep {...each} step={step} now={now} awake={awake} />
          )}
        </View>
      </View>
      <BenchFoot
        reading={reading}
        asks={asked.length > 0}
        ticked={state.ticks.has(step.id)}
        left={left}
        onBack={() => (reading ? setReading(false) : go(at - 1))}
        onRead={() => setReading(true)}
        onNext={() => void done()}
      />
      {locked ? <SleeveLock onUnlock={() => setLocked(false)} /> : null}
    </View>
  );
}

const styles = StyleSheet.create({
  frame: webStyle({
    height: '100dvh',
    display: 'flex',
    flexDirection: 'column',
    maxWidth: 960,
    marginLeft: 'auto',
    marginRight: 'auto',
    width: '100%',
  }),
  middle: webStyle({ flex: '1 1 0px', minHeight: 0, display: 'flex', flexDirection: 'row' }),
  turned: { flexDirection: 'row-reverse' },
  stick: webStyle({ flex: '0 0 56px', width: 56, display: 'flex', flexDirection: 'column' }),
  step: webStyle({ flex: '1 1 0px', minWidth: 0, overflowY: 'auto', padding: '16px' }),
});

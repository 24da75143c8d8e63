import { useEffect, useMemo, useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { useRouter } from 'expo-router';
import { type BenchCopy } from '../../shared/api/bench';
import { useOnline, useOutbox } from '../data/outbox-hooks';
import { usePlanValues, type PlanValues } from '../plans/plan-model';
import { type BenchState } from '../../shared/plan/bench/fold';
import { stickOf } from '../plans/plan-stick-input';
import { PageHead } from '../shell/page-head';
import { ThemeButton } from '../shell/theme-choice';
import { BenchStick } from '../story-stick/bench-stick';
import { toast } from '../ui/announcer';
import { Button } from '../ui/button';
import { Heading } from '../ui/heading';
import { IconButton } from '../ui/icon-button';
import { Row } from '../ui/layout';
import { Text } from '../ui/text';
import { colour, line } from '../ui/tokens';
import { verdictKind } from '../ui/verdict';
import { webStyle } from '../ui/web-style';
import { useAddEntry, useBenchState } from './bench-queries';
import { BenchStep } from './bench-step';
import { judge } from './judge';
import { ReadingPanel } from './reading-panel';
import { useAwake } from './use-awake';
import { useStepKeys } from './use-step-keys';
import { useClock } from './use-clock';

/** Says in a line how things stand with the signal. */
function useSignalLine(copyId: string): string {
  const online = useOnline();
  const jobs = useOutbox(copyId);
  const waiting = jobs.filter((j) => j.state === 'waiting').length;
  const refused = jobs.length - waiting;
  if (refused > 0) return `${refused} not taken; see Bench`;
  if (!online)
    return waiting > 0
      ? `No signal. ${waiting} kept on this device`
      : 'No signal. Kept on this device';
  return waiting > 0 ? `Sending ${waiting}` : 'All sent';
}

/** One step at a time on the story stick. */
export function Workbench({ copy, personId }: { copy: BenchCopy; personId: string }) {
  const { document } = copy;
  const state = useBenchState(copy);
  const add = useAddEntry(copy, personId);
  const values = usePlanValues(document, state);
  const now = useClock(1000);
  const firstOpen = document.steps.findIndex((s) => !state.ticks.has(s.id));
  const [at, setAt] = useState(() => Math.max(0, firstOpen));
  const [reading, setReading] = useState(false);
  const signal = useSignalLine(copy.id);
  useAwake();
  const step = document.steps[Math.min(at, document.steps.length - 1)];
  const stick = useBenchStick(copy, state, values, step?.id, now);
  const go = (to: number) => {
    setReading(false);
    setAt(Math.max(0, Math.min(document.steps.length - 1, to)));
  };
  useStepKeys({ next: () => go(at + 1), back: () => go(at - 1), off: reading });
  useEffect(() => {
    window.document.getElementById('bench-step')?.scrollTo?.({ top: 0 });
  }, [at]);
  if (!step) return <PageHead title={copy.title} back="/bench" />;
  const done = async () => {
    if (!state.ticks.has(step.id)) await add({ kind: 'tick', elementId: step.id });
    if (at + 1 < document.steps.length) go(at + 1);
    else toast({ text: 'That was the last step.' });
  };
  const asked = [...new Set([...step.takes, ...step.holds])];
  return (
    <View style={styles.frame}>
      <PageHead
        title={`Step ${at + 1} of ${document.steps.length}, ${copy.title}`}
        heading={false}
        bar={false}
      />
      <TopLine at={at} count={document.steps.length} signal={signal} />
      <View style={styles.middle}>
        <View style={styles.stick}>
          <BenchStick
            input={stick}
            label="Story stick, your bench copy"
            selected={step.id}
            onStep={(id) => go(document.steps.findIndex((s) => s.id === id))}
          />
        </View>
        <View style={styles.step} nativeID="bench-step">
          {reading ? (
            <ReadingPanel
              copy={copy}
              state={state}
              values={values}
              dimensionIds={asked}
              add={add}
              onDone={() => setReading(false)}
            />
          ) : (
            <BenchStep step={step} copy={copy} state={state} values={values} add={add} now={now} />
          )}
        </View>
      </View>
      <Row gap={12} align="stretch" style={styles.foot}>
        <IconButton
          size="bench"
          icon="back"
          label="Back"
          onPress={() => (reading ? setReading(false) : go(at - 1))}
        />
        {asked.length > 0 && !reading ? (
          <Button size="bench" icon="calipers" label="Reading" onPress={() => setReading(true)} />
        ) : null}
        {reading ? null : (
          <View style={styles.next}>
            <Button
              size="bench"
              kind="primary"
              wide
              label={state.ticks.has(step.id) ? 'Next step' : 'Done, next step'}
              iconAfter="next"
              onPress={() => void done()}
            >
              Next
            </Button>
          </View>
        )}
      </Row>
    </View>
  );
}

/** The stick with what is done, read and running. */
function useBenchStick(
  copy: BenchCopy,
  state: BenchState,
  values: PlanValues,
  currentId: string | undefined,
  now: number,
) {
  const { document } = copy;
  return useMemo(
    () =>
      stickOf(
        document,
        {},
        {
          ticks: state.ticks,
          currentId,
          waits: new Map(
            [...state.waits].map(([id, wait]) => [id, { left: leftOf(document, id, wait, now) }]),
          ),
          verdict: (id) => verdictKind(judge(values, id)?.verdict ?? 'needs-a-reading'),
        },
        values.model,
      ),
    [document, state, currentId, values, now],
  );
}

function TopLine({ at, count, signal }: { at: number; count: number; signal: string }) {
  const router = useRouter();
  return (
    <Row gap={8} justify="space-between" style={styles.bar}>
      <IconButton
        kind="bare"
        size="bench"
        icon="close"
        label="Leave the bench"
        onPress={() => router.push('/bench')}
      />
      <View style={styles.words}>
        <Heading level={1} size="lead">
          Step {at + 1} of {count}
        </Heading>
        <Text size="note" tone="ink2">
          {signal}
        </Text>
      </View>
      <ThemeButton size="bench" />
    </Row>
  );
}

/** Seconds left of a running wait; null when it is over or ended. */
function leftOf(
  document: BenchCopy['document'],
  waitId: string,
  wait: { startedAt: string; ended: boolean },
  now: number,
): number | null {
  if (wait.ended) return null;
  const minutes = document.steps.flatMap((s) => s.waits).find((w) => w.id === waitId)?.minutes ?? 0;
  const left = Date.parse(wait.startedAt) / 1000 + minutes * 60 - now / 1000;
  return left > 0 ? left : null;
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
  bar: {
    borderBottomWidth: line.medium,
    borderBottomColor: colour.ink,
    paddingHorizontal: 8,
    minHeight: 64,
  },
  words: { flex: 1, minWidth: 0 },
  middle: webStyle({ flex: '1 1 0px', minHeight: 0, display: 'flex', flexDirection: 'row' }),
  stick: webStyle({ flex: '0 0 52px', width: 52, display: 'flex', flexDirection: 'column' }),
  step: webStyle({ flex: '1 1 0px', minWidth: 0, overflowY: 'auto', padding: '16px' }),
  foot: { borderTopWidth: line.medium, borderTopColor: colour.ink, padding: 12 },
  next: { flex: 1 },
});

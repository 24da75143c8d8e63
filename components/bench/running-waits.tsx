import { useEffect, useRef } from 'react';
import { type PlanDocument, type Wait } from '../../shared/plan/document';
import { type BenchState } from '../../shared/plan/bench/fold';
import { type Entry } from '../../shared/plan/bench/entry';
import { Button } from '../ui/button';
import { Icon } from '../ui/icon';
import { Row, Stack } from '../ui/layout';
import { Text } from '../ui/text';
import { Figure } from '../ui/figure';
import { ring } from './bell';
import { type NewEntry } from './bench-queries';
import { timeLeft } from './wait-timer';

/** A wait that was started and not ended. */
export interface RunningWait {
  wait: Wait;
  stepId: string;
  /** From 1. */
  step: number;
  /** Seconds; below 0 it is over. */
  left: number;
}

/** All waits that run, the one that is over first first. */
export function runningWaits(
  document: PlanDocument,
  state: BenchState,
  now: number,
): RunningWait[] {
  const running = document.steps.flatMap((step, i) =>
    step.waits.flatMap((wait) => {
      const started = state.waits.get(wait.id);
      if (!started || started.ended) return [];
      const left = wait.minutes * 60 - (now - Date.parse(started.startedAt)) / 1000;
      return [{ wait, stepId: step.id, step: i + 1, left }];
    }),
  );
  return running.sort((a, b) => a.left - b.left);
}

const nameOf = ({ wait, step }: RunningWait) => `${wait.what || 'Wait'}, step ${step}`;

/** Rings once for every wait that is over: when it happens, or at the next opening. */
function useRinging(waits: readonly RunningWait[]): void {
  const rung = useRef(new Set<string>());
  useEffect(() => {
    for (const running of waits) {
      const { id } = running.wait;
      if (running.left > 0) rung.current.delete(id);
      else if (!rung.current.has(id)) {
        rung.current.add(id);
        ring(`The wait is over: ${nameOf(running)}`, `wait-${id}`);
      }
    }
  }, [waits]);
}

export interface RunningWaitsProps {
  waits: readonly RunningWait[];
  /** The step on show; its own waits show with it. */
  stepId: string;
  add: (entry: NewEntry) => Promise<Entry>;
  onStep: (stepId: string) => void;
}

/** Timers of other steps, over whichever step is on show; several run side by side. */
export function RunningWaits({ waits, stepId, add, onStep }: RunningWaitsProps) {
  useRinging(waits);
  return waits
    .filter((running) => running.left <= 0 || running.stepId !== stepId)
    .map((running) => (
      <Row key={running.wait.id} gap={12} justify="space-between" wrap>
        <Row gap={12} align="center">
          <Icon name="wait" size={26} />
          {running.left > 0 ? (
            <Stack gap={4} style={{ alignSelf: 'auto' }}>
              <Figure figure={{ decimal: timeLeft(running.left) }} size="lead" weight={700} />
              <Text tone="ink2">{nameOf(running)}</Text>
            </Stack>
          ) : (
            <Text size="lead" weight={700} role="alert">
              The wait is over: {nameOf(running)}
            </Text>
          )}
        </Row>
        {running.left > 0 ? (
          <Button
            size="bench"
            label={`To step ${running.step}`}
            onPress={() => onStep(running.stepId)}
          />
        ) : (
          <Button
            size="bench"
            label={`Over: ${nameOf(running)}`}
            onPress={() => void add({ kind: 'wait-end', elementId: running.wait.id })}
          >
            Over
          </Button>
        )}
      </Row>
    ));
}

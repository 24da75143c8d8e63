import { useMemo } from 'react';
import { type BenchCopy } from '../../shared/api/bench';
import { type BenchState } from '../../shared/plan/bench/fold';
import { stickOf } from '../plans/plan-stick-input';
import { type PlanValues } from '../plans/plan-model';
import { verdictKind } from '../ui/verdict';
import { judge } from './judge';

/** The stick with what is done, read and running. */
export function useBenchStick(
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

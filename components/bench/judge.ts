import { type PlanValues } from '../plans/plan-model';

export interface Judgement {
  verdict: 'holds' | 'fails' | 'needs-a-reading';
  /** mm over (positive) or under (negative) the band; 0 inside. */
  by: number;
  /** What to do, by the dimension's sense. */
  advice: string;
}

/** What over and under mean for each sense. */
const advice = {
  outside: {
    over: 'one more pass',
    under: 'cannot be put back: make it again, or let its partner suit it',
  },
  inside: {
    over: 'cannot be put back: its partner can be made to suit',
    under: 'open it up a little',
  },
  place: { over: 'move it before it is fixed', under: 'move it before it is fixed' },
  setting: { over: 'set it again', under: 'set it again' },
  form: { over: 'true it up', under: '' },
} as const;

/** Judges what was read of a dimension against its band: a figure is judged as read. */
export function judge(values: PlanValues, dimensionId: string): Judgement | null {
  const state = values.model.dimensions.get(dimensionId);
  if (!state) return null;
  if (!state.readings) return { verdict: 'needs-a-reading', by: 0, advice: '' };
  if (state.dimension.origin === 'taken')
    return { verdict: 'holds', by: 0, advice: 'Taken. The plan follows it.' };
  const read = state.readings.value.toNumber();
  const { sense } = state.dimension;
  const band = sense === 'form' && state.value ? { low: 0, high: state.value.x } : state.band;
  if (!band)
    return { verdict: 'holds', by: 0, advice: 'Kept. The plan gives no tolerance for it.' };
  const slack = 1e-6;
  if (read > band.high + slack)
    return { verdict: 'fails', by: read - band.high, advice: advice[sense].over };
  if (read < band.low - slack)
    return { verdict: 'fails', by: read - band.low, advice: advice[sense].under };
  return { verdict: 'holds', by: 0, advice: 'Inside the tolerance.' };
}

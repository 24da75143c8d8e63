import { judgeReading, type ReadingJudgement } from '../../shared/plan/model';
import { type PlanValues } from '../plans/plan-model';

export interface Judgement {
  verdict: 'holds' | 'fails' | 'needs-a-reading';
  /** mm over (positive) or under (negative) the band; 0 inside. */
  by: number;
  /** What to do, by the dimension's sense. */
  advice: string;
  /** The model's own judgement of what was read; null while nothing is. */
  judged: ReadingJudgement | null;
}

/** What each cure says, by sense where it matters. */
function words({ cure, sense }: ReadingJudgement): string {
  if (cure === 'move') return 'move it while it is not fixed';
  if (cure === 'set') return 'set it again';
  if (cure === 'work')
    return sense === 'inside'
      ? 'open it up a little'
      : sense === 'form'
        ? 'true it up'
        : 'one more pass';
  return sense === 'inside'
    ? 'cannot be put back; what goes in can be made to suit'
    : 'cannot be put back; what it meets can be made to suit';
}

/** Judges what was read of a dimension against its band: a figure is judged as read. */
export function judge(values: PlanValues, dimensionId: string): Judgement | null {
  const state = values.model.dimensions.get(dimensionId);
  if (!state) return null;
  if (!state.readings) return { verdict: 'needs-a-reading', by: 0, advice: '', judged: null };
  const judged = judgeReading(state, state.readings.value, state.readings.instrument);
  const taken = state.dimension.origin === 'taken';
  if (taken) return { verdict: 'holds', by: 0, advice: 'Taken. The plan follows it.', judged };
  if (judged.verdict === 'no-band')
    return { verdict: 'holds', by: 0, advice: 'Kept. The plan gives no tolerance for it.', judged };
  if (judged.verdict === 'inside')
    return { verdict: 'holds', by: 0, advice: 'Inside the tolerance.', judged };
  const by = judged.verdict === 'over' ? judged.amount : -judged.amount;
  return { verdict: 'fails', by, advice: words(judged), judged };
}

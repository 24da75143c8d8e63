import { type PlanDocument } from '../../shared/plan/document';
import { handsOnTimes } from '../../shared/plan/stick/hands-on';
import { type StickInput, type StickStep, type StickVerdict } from '../../shared/plan/stick/types';
import { type PlanModel } from '../../shared/plan/model';

/** What a bench copy adds to the stick. */
export interface StickProgress {
  ticks: ReadonlySet<string>;
  currentId?: string | undefined;
  waits: ReadonlyMap<string, { left: number | null }>;
  /** Verdict of a dimension held in a step. */
  verdict: (dimensionId: string) => StickVerdict;
}

/** Places in a stretch for `count` things, spread evenly. */
const spread = (start: number, end: number, i: number, count: number) =>
  start + ((i + 1) * (end - start)) / (count + 1);

/** The stick of a plan: along its clip, or along the hands-on time where there is none. */
export function stickOf(
  document: PlanDocument,
  talk: Readonly<Record<string, number>>,
  progress?: StickProgress,
  model?: PlanModel,
): StickInput {
  const clip = document.clip.source === 'none' ? null : document.clip;
  const timed = clip !== null && document.steps.every((s) => s.stretches.length > 0);
  const hands = handsOnTimes(document.steps.map((s) => s.handsOn));
  const steps = document.steps.map((step, i): StickStep => {
    const stretch = step.stretches[0];
    const start = timed && stretch ? stretch.start : (hands.stretches[i]?.start ?? 0);
    const end = timed && stretch ? stretch.end : (hands.stretches[i]?.end ?? start + 1);
    const asked = [...new Set([...step.takes, ...step.holds])];
    const count = talk[step.id] ?? 0;
    const failing = model
      ? step.checks.some((id) => model.checks.get(id)?.verdict === 'fails')
      : false;
    return {
      id: step.id,
      number: i + 1,
      title: step.title,
      start,
      end,
      state: progress?.ticks.has(step.id)
        ? 'done'
        : progress?.currentId === step.id
          ? 'current'
          : 'open',
      failing,
      verdicts: asked.map((id, n) => ({
        at: spread(start, end, n, asked.length),
        verdict: progress?.verdict(id) ?? 'need',
      })),
      waits: step.waits.map((wait) => {
        const left = progress?.waits.get(wait.id)?.left ?? null;
        return { at: end, ...(left !== null && left > 0 ? { running: true, left } : {}) };
      }),
      talk: count > 0 ? [{ at: (start + end) / 2, count }] : [],
    };
  });
  return { duration: timed ? clip.duration : hands.duration || 1, steps };
}

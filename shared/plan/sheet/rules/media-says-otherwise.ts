import { type PlanModel } from '../../model';
import { type Finding, type Rule } from '../rule';

/** Speech is no finer than this, mm: half of 1/64 in. */
const heardTo = 0.2;

/** Does a dimension rest on something every builder measures? Then the clip may well differ. */
function measured(model: PlanModel, id: string): boolean {
  const open = [id];
  const seen = new Set<string>();
  while (open.length > 0) {
    const at = open.pop()!;
    if (seen.has(at)) continue;
    seen.add(at);
    if (model.dimensions.get(at)?.dimension.origin === 'taken') return true;
    open.push(...model.feeds(at));
  }
  return false;
}

const exact = (text: string): number => {
  const [top, bottom] = text.split('/').map(Number);
  return (top ?? NaN) / (bottom ?? 1);
};

/**
 * The clip says a figure that the plan has since changed. Figures that rest on what each builder measures differ by nature;
 * the step says so while the clip shows.
 */
export const mediaSaysOtherwise: Rule = {
  id: 'media/says-otherwise',
  level: 'must',
  source:
    'plan model §3: a figure heard in the clip and the plan’s own agree, or the creator has ruled',
  run: ({ document, model }) =>
    document.steps.flatMap((step, i) =>
      step.heard.flatMap((heard): Finding[] => {
        if (heard.ruling !== 'say' || !heard.value || !heard.dimensionId) return [];
        const state = model().dimensions.get(heard.dimensionId);
        if (!state?.value || state.kind !== 'length' || measured(model(), heard.dimensionId))
          return [];
        const off = Math.abs(exact(heard.value.mm) - state.value.x);
        if (!(off > Math.max(heardTo, state.tolerance ?? 0))) return [];
        const { name, expression } = state.dimension;
        return [
          {
            place: { in: 'steps', elementId: step.id },
            message: `In step ${i + 1} the clip says ${heard.value.text}; ${name} is ${expression}.`,
            cure: 'Correct the dimension, mute the words, or mark the figure as right on your machine only.',
            mends: (['muted', 'right-on-mine'] as const).map((ruling) => ({
              do: 'ruling',
              stepId: step.id,
              heardId: heard.id,
              ruling,
            })),
          },
        ];
      }),
    ),
};

import { type PlanDocument, type Step } from '../../document';
import { scheduleOf } from '../../schedule';
import { type Finding, type Rule } from '../rule';

/** Minutes a joint of a step is not to be loaded for: its own waits, and what the label of its glue says. */
function jointWait(document: PlanDocument, step: Step): number {
  const waits = step.waits.filter((w) => w.kind === 'clamp' || w.kind === 'cure');
  const labels = step.actions.flatMap((action) => {
    const id = action.do === 'glue' ? action.consumableId : undefined;
    const glue = document.consumables.find((c) => c.id === id);
    return glue ? [glue.clamp ?? 0, glue.cure ?? 0] : [];
  });
  return Math.max(0, ...waits.map((w) => w.minutes), ...labels);
}

/** Walks the longest chain: a step that loads a joint comes after every wait that is still open. */
export const timeCure: Rule = {
  id: 'time/cure',
  level: 'must',
  source:
    'glue labels: a joint is not loaded before its clamp time, or its cure where given, is over',
  run: ({ document }) => {
    const slots = scheduleOf(document);
    return slots.flatMap(({ step, start }, i): Finding[] => {
      if (!step.loadsJoint) return [];
      const open = slots
        .slice(0, i)
        .map((slot, n) => ({ number: n + 1, until: slot.end + jointWait(document, slot.step) }))
        .filter(({ until }) => until > start + 1e-9)
        .sort((a, b) => b.until - a.until)[0];
      if (!open) return [];
      return [
        {
          place: { in: 'steps', elementId: step.id },
          message: `Step ${i + 1} loads a joint while the wait of step ${open.number} still has ${Math.ceil(open.until - start)} min to run.`,
          cure: `Let step ${open.number} hold the next one up, name it under “after”, or move step ${i + 1} back.`,
        },
      ];
    });
  },
};

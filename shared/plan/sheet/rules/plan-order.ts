import { type Finding, type Rule } from '../rule';

/** What must be done before a step stands before it. */
export const planOrder: Rule = {
  id: 'plan/order',
  level: 'must',
  source: 'plan model §6: what must be done before comes before',
  run: ({ document }) => {
    const at = new Map(document.steps.map((s, i) => [s.id, i]));
    return document.steps.flatMap((step, i): Finding[] => {
      const late = step.after.find((id) => (at.get(id) ?? -1) >= i);
      if (late === undefined) return [];
      const other = (at.get(late) ?? 0) + 1;
      return [
        {
          place: { in: 'steps', elementId: step.id },
          message:
            other === i + 1
              ? `Step ${i + 1} is to come after itself.`
              : `Step ${i + 1} needs step ${other} done, which comes later.`,
          cure: other === i + 1 ? 'Take it out of “after”.' : `Move it behind step ${other}.`,
        },
      ];
    });
  },
};

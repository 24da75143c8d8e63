import { type Finding, type Rule } from '../rule';

export const partsMade: Rule = {
  id: 'parts/made',
  level: 'must',
  source: 'plan model: a part is sized exactly once and ends in the piece',
  run: ({ document }) =>
    document.parts.flatMap((part): Finding[] => {
      const place = { in: 'parts' as const, elementId: part.id };
      const sizedIn = document.steps.filter((s) =>
        s.parts.some((p) => p.partId === part.id && p.to === 'sized'),
      );
      if (sizedIn.length === 0) {
        return [
          {
            place,
            message: `Part ${part.mark}, ${part.name}, is not cut to size in any step.`,
            cure: 'Mark the step in which it is sized.',
          },
        ];
      }
      const alternatives = document.flow
        .filter((f) => f.kind === 'alternatives')
        .flatMap((f) => f.groups.map((g) => new Set(g.stepIds)));
      const exclusive = sizedIn.every((s) => alternatives.some((g) => g.has(s.id)));
      if (sizedIn.length > 1 && !exclusive) {
        return [
          {
            place,
            message: `Part ${part.mark}, ${part.name}, is cut to size in ${sizedIn.length} steps.`,
            cure: 'Leave it sized in one of them; call the others roughed or shaped.',
          },
        ];
      }
      return [];
    }),
};

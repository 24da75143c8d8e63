import { type Finding, type Rule } from '../rule';

export const dimsUntaken: Rule = {
  id: 'dims/untaken',
  level: 'must',
  source: 'plan model §7: a taken dimension is measured before the first step that needs it',
  run: ({ document, model }) => {
    const worked = model();
    const needs = (stepIndex: number): Set<string> => {
      const step = document.steps[stepIndex]!;
      const direct = [
        ...step.holds,
        ...[...step.text.matchAll(/\{\{dim:([0-9a-f-]+)\}\}/g)].map((m) => m[1]!),
      ];
      const all = new Set<string>();
      const open = [...direct];
      while (open.length > 0) {
        const id = open.pop()!;
        if (all.has(id)) continue;
        all.add(id);
        open.push(...worked.feeds(id));
      }
      return all;
    };
    const taken = document.dimensions.filter((d) => d.origin === 'taken');
    const needed = document.steps.map((_, i) => needs(i));
    return taken.flatMap((dimension): Finding[] => {
      const measured = document.steps.findIndex((s) => s.takes.includes(dimension.id));
      const first = needed.findIndex((ids) => ids.has(dimension.id));
      const place = { in: 'dimensions' as const, elementId: dimension.id };
      if (measured < 0) {
        return [
          {
            place,
            message: `${dimension.name} is taken by each builder, but no step measures it.`,
            cure: 'Name it under “take” in the step that measures it.',
          },
        ];
      }
      if (first < 0 || measured <= first) return [];
      return [
        {
          place,
          message: `${dimension.name} is measured in step ${measured + 1}, but step ${first + 1} needs it.`,
          cure: `Measure it in step ${first + 1} or before.`,
        },
      ];
    });
  },
};

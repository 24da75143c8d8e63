import { type Rule } from '../rule';

export const dimsUnused: Rule = {
  id: 'dims/unused',
  level: 'note',
  source: 'plan model §7: every dimension is used somewhere',
  run: ({ document, model }) => {
    const worked = model();
    const texts = document.steps.map((s) => s.text).join('\n');
    const named = JSON.stringify([
      document.size,
      document.stock,
      document.hardware,
      document.parts,
      document.steps.map((s) => s.actions),
    ]);
    return document.dimensions.flatMap((d) => {
      const used = worked.usedBy(d.id);
      const inSteps =
        document.steps.some((s) => s.takes.includes(d.id) || s.holds.includes(d.id)) ||
        texts.includes(d.id);
      const elsewhere =
        used.dimensions.length + used.checks.length + used.parts.length > 0 ||
        new RegExp(`\\b${d.symbol}\\b`).test(named);
      return inSteps || elsewhere || d.symbol === ''
        ? []
        : [
            {
              place: { in: 'dimensions' as const, elementId: d.id },
              message: `Nothing uses ${d.name}.`,
              cure: 'Use it, or take it out.',
            },
          ];
    });
  },
};

import { type PlanDocument } from '../../document';
import { type Rule } from '../rule';

/** Every word that stands in an expression outside dimensions and checks: the symbols used there. */
function wordsIn(document: PlanDocument): ReadonlySet<string> {
  const { size, stock, hardware, parts } = document;
  const text = JSON.stringify([size, stock, hardware, parts, document.steps.map((s) => s.actions)]);
  return new Set(text.match(/[A-Za-z][A-Za-z0-9_]*/g) ?? []);
}

/** Ids of dimensions that steps take, hold or refer to. */
function namedInSteps(document: PlanDocument): ReadonlySet<string> {
  const ids = document.steps.flatMap((s) => [
    ...s.takes,
    ...s.holds,
    ...[...s.text.matchAll(/\{\{dim:([0-9a-f-]+)\}\}/g)].map((m) => m[1]!),
  ]);
  return new Set(ids);
}

export const dimsUnused: Rule = {
  id: 'dims/unused',
  level: 'note',
  source: 'plan model §7: every dimension is used somewhere',
  run: ({ document, model }) => {
    const worked = model();
    const words = wordsIn(document);
    const inSteps = namedInSteps(document);
    const fed = new Set(document.dimensions.flatMap((d) => worked.feeds(d.id)));
    const inChecks = new Set(
      document.checks.flatMap((c) => c.expression.match(/[A-Za-z][A-Za-z0-9_]*/g) ?? []),
    );
    return document.dimensions.flatMap((d) =>
      d.symbol === '' ||
      inSteps.has(d.id) ||
      fed.has(d.id) ||
      words.has(d.symbol) ||
      inChecks.has(d.symbol)
        ? []
        : [
            {
              place: { in: 'dimensions' as const, elementId: d.id },
              message: `Nothing uses ${d.name}.`,
              cure: 'Use it, or take it out.',
            },
          ],
    );
  },
};

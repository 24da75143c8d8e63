import { v7 as uuid } from 'uuid';
import { limits } from '../../shared/api/limits';
import { dimensionSchema, type Heard, type PlanDocument } from '../../shared/plan/document';

/** A symbol nobody has yet, from the words around a figure. */
export function freeSymbol(document: PlanDocument, base: string): string {
  const taken = new Set(document.dimensions.map((d) => d.symbol));
  for (let n = 1; ; n += 1) {
    const symbol = `${base}${n}`;
    if (!taken.has(symbol)) return symbol;
  }
}

/**
 * The plan with a dimension made of a figure that was heard; the same figure heard elsewhere is linked to
 * it as well, and its step holds it.
 */
export function withDimension(document: PlanDocument, stepId: string, heard: Heard): PlanDocument {
  if (!heard.value) return document;
  const symbol = freeSymbol(document, 'heard_');
  const dimension = dimensionSchema.parse({
    id: uuid(),
    name: heard.words.slice(0, limits.name),
    symbol,
    origin: 'given',
    expression: heard.value.text,
    at: heard.at,
  });
  const same = heard.value.mm;
  return {
    ...document,
    dimensions: [...document.dimensions, dimension],
    steps: document.steps.map((step) => {
      const linked = step.heard.map((h) =>
        !h.dimensionId && h.value?.mm === same ? { ...h, dimensionId: dimension.id } : h,
      );
      const holds = step.id === stepId ? [...step.holds, dimension.id] : step.holds;
      return { ...step, heard: linked, holds };
    }),
  };
}

import { v7 as uuid } from 'uuid';
import { limits } from '../../shared/api/limits';
import {
  dimensionSchema,
  type Dimension,
  type Heard,
  type PlanDocument,
} from '../../shared/plan/document';
import { renameSymbol } from '../../shared/plan/rename';

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

/** The plan with one more given dimension, its figure still to come. */
export function withNewDimension(document: PlanDocument, symbol?: string): PlanDocument {
  const dimension = dimensionSchema.parse({
    id: uuid(),
    name: symbol ?? `Dimension ${document.dimensions.length + 1}`,
    symbol: symbol ?? freeSymbol(document, 'd'),
    origin: 'given',
    expression: '',
  });
  return { ...document, dimensions: [...document.dimensions, dimension] };
}

/** The plan with one dimension changed; a changed symbol is changed in every expression that uses it. */
export function replacedDimension(document: PlanDocument, next: Dimension): PlanDocument {
  const before = document.dimensions.find((d) => d.id === next.id);
  const dimensions = document.dimensions.map((d) => (d.id === next.id ? next : d));
  if (!before || before.symbol === next.symbol) return { ...document, dimensions };
  return renameSymbol(document, before.symbol, next.symbol);
}

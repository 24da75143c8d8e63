import { type Part } from '../document';
import { type PlanModel, type SizeState } from '../model';
import { type ComputedFigure, type FigureChange } from './types';

const slack = 1e-6;

const near = (a: number | null, b: number | null) =>
  a === b || (a !== null && b !== null && Math.abs(a - b) <= slack);

/** Two figures are the same within the slack of all derived values, their bands too. */
export const sameFigure = (a: ComputedFigure | null, b: ComputedFigure | null): boolean =>
  a === null || b === null ? a === b : near(a.x, b.x) && near(a.low, b.low) && near(a.high, b.high);

const ofSize = ({ value }: SizeState): ComputedFigure =>
  value ? { x: value.x, low: value.low, high: value.high } : { x: null, low: null, high: null };

/** A dimension's value and band. */
export function dimensionFigures(model: PlanModel, id: string): Map<string, ComputedFigure> {
  const state = model.dimensions.get(id);
  if (!state) return new Map();
  const { value, band } = state;
  return new Map([
    [
      'value',
      {
        x: value?.x ?? null,
        low: band?.low ?? value?.x ?? null,
        high: band?.high ?? value?.x ?? null,
      },
    ],
  ]);
}

/** A part's sizes, and where and how large its features are. */
export function partFigures(model: PlanModel, part: Part | undefined): Map<string, ComputedFigure> {
  const state = part && model.parts.get(part.id);
  if (!state) return new Map();
  const figures = new Map([
    ['length', ofSize(state.length)],
    ['width', ofSize(state.width)],
    ['thickness', ofSize(state.thickness)],
  ]);
  for (const feature of part.features)
    for (const field of ['x', 'y', 'width', 'length', 'depth'] as const)
      if (feature[field].trim() !== '')
        figures.set(`features/${feature.id}/${field}`, ofSize(model.evaluate(feature[field])));
  return figures;
}

/** The figures that moved between two sets, in the order of the later one. */
export function movedFigures(
  before: ReadonlyMap<string, ComputedFigure>,
  after: ReadonlyMap<string, ComputedFigure>,
): FigureChange[] {
  return [...new Set([...after.keys(), ...before.keys()])]
    .map((of) => ({ of, before: before.get(of) ?? null, after: after.get(of) ?? null }))
    .filter((f) => !sameFigure(f.before, f.after));
}

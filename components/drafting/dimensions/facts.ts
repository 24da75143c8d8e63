import { displayMm, displayValue, type DisplayPreference } from '../../../shared/measure';
import { type Dimension, type PlanDocument, type Step } from '../../../shared/plan/document';
import { type DimensionState, type PlanModel } from '../../../shared/plan/model';
import { type FigureParts } from '../../ui/figure';
import { type VerdictKind, verdictKind } from '../../ui/verdict';

/** Figures of a draft are in the plan's own units, to the finest mark. */
export const draftPreference = (units: PlanDocument['units']): DisplayPreference => ({
  system: units,
  instrument: 'tape',
  grid: 64,
});

/** A ± of a dimension, as fine as callipers read. */
export function spreadFigure(
  x: number,
  state: DimensionState,
  pref: DisplayPreference,
): FigureParts {
  if (state.kind !== 'length') return { ...displayValue(x, state.kind, pref), sign: '±' };
  return { ...displayMm(x, { ...pref, instrument: 'calipers' }), sign: '±' };
}

/** Who uses a dimension, by the names the maker knows. */
export interface Users {
  dimensions: Dimension[];
  checks: string[];
  parts: string[];
  /** Numbers of the steps that name, take or hold it. */
  steps: number[];
}

export function usersOf(model: PlanModel, id: string): Users {
  const { document } = model;
  const { dimensions, checks, parts } = model.usedBy(id);
  return {
    dimensions: dimensions.flatMap((user) => model.dimensions.get(user)?.dimension ?? []),
    checks: checks.flatMap((user) => model.checks.get(user)?.check.name ?? []),
    parts: parts.flatMap((user) => document.parts.find((p) => p.id === user)?.mark ?? []),
    steps: stepsBy(document.steps).get(id) ?? [],
  };
}

const indexes = new WeakMap<readonly Step[], ReadonlyMap<string, number[]>>();

/** Numbers of the steps by the dimensions they name, take or hold; worked out once for a list of steps. */
function stepsBy(steps: readonly Step[]): ReadonlyMap<string, number[]> {
  const known = indexes.get(steps);
  if (known) return known;
  const index = new Map<string, number[]>();
  steps.forEach((step, i) => {
    const named = [...step.text.matchAll(/\{\{dim:([0-9a-f-]{36})\}\}/g)].flatMap(
      (m) => m[1] ?? [],
    );
    for (const id of new Set([...step.takes, ...step.holds, ...named]))
      index.set(id, [...(index.get(id) ?? []), i + 1]);
  });
  indexes.set(steps, index);
  return index;
}

const some = (names: readonly string[], most = 3) =>
  names.length > most
    ? `${names.slice(0, most).join(', ')} and ${names.length - most} more`
    : names.join(', ');

/** `used by inner_w, part D, steps 11, 12 and 1 check`; says so when nothing does. */
export function usersWords(users: Users): string {
  const said = [
    users.dimensions.length > 0 ? some(users.dimensions.map((d) => d.symbol)) : '',
    users.parts.length > 0 ? `part${users.parts.length > 1 ? 's' : ''} ${some(users.parts)}` : '',
    users.steps.length > 0
      ? `step${users.steps.length > 1 ? 's' : ''} ${some(users.steps.map(String))}`
      : '',
    users.checks.length > 0
      ? `${users.checks.length} check${users.checks.length > 1 ? 's' : ''}`
      : '',
  ].filter(Boolean);
  if (said.length === 0) return 'used by nothing yet';
  return `used by ${said.join('; ')}`;
}

const order: VerdictKind[] = ['holds', 'need', 'close', 'risk', 'fails'];

/** The most serious verdict over a dimension: its own fault first, then the checks that use it. */
export function verdictOver(model: PlanModel, id: string): VerdictKind | null {
  const state = model.dimensions.get(id);
  if (!state || state.error) return 'fails';
  const kinds = model.usedBy(id).checks.map((id): VerdictKind => {
    const check = model.checks.get(id);
    return !check || check.error ? 'fails' : verdictKind(check.verdict);
  });
  if (kinds.length === 0) return state.standIn ? 'need' : null;
  return kinds.reduce((worst, kind) => (order.indexOf(kind) > order.indexOf(worst) ? kind : worst));
}

/** The figures that were good last, for what is being typed. Gives the same map while nothing new is good. */
export function lastGood(
  known: ReadonlyMap<string, DimensionState>,
  model: PlanModel,
): ReadonlyMap<string, DimensionState> {
  const next = new Map(known);
  for (const [id, state] of model.dimensions) if (state.value) next.set(id, state);
  return next;
}

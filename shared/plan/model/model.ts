import { type Dimension, type Kind, type PlanDocument } from '../document';
import { evaluateCheck } from './check';
import { type CompiledModel, compileModel } from './compiled';
import { evaluateDimension, loopResult } from './dimension';
import { type Result } from './entry';
import { type Graph } from './graph';
import { affectedBy, evaluationOrder } from './order';
import { evaluatePart, evaluateText } from './part';
import {
  type CheckState,
  type DimensionState,
  type ModelReadings,
  type PartState,
  type SizeState,
} from './types';

/** A plan worked out. Immutable: `update` gives the next one and keeps what did not change. */
export interface PlanModel {
  readonly document: PlanDocument;
  readonly readings: ModelReadings | null;
  readonly dimensions: ReadonlyMap<string, DimensionState>;
  readonly checks: ReadonlyMap<string, CheckState>;
  readonly parts: ReadonlyMap<string, PartState>;
  readonly symbols: ReadonlyMap<string, Dimension>;
  /** Any other expression of the plan (feature, stock size, kerf); remembered. Kind `length` by default. */
  evaluate: (text: string, kind?: Kind) => SizeState;
  /** Dimension ids a dimension's expression needs, and what needs it. */
  feeds: (id: string) => readonly string[];
  usedBy: (id: string) => { dimensions: string[]; checks: string[]; parts: string[] };
  /**
   * The next model. Only what changed (by object identity) and what depends on it is worked out again. Leave
   * the readings out to keep them.
   */
  update: (document: PlanDocument, readings?: ModelReadings | null) => PlanModel;
}

interface Worked {
  compiled: CompiledModel;
  readings: ModelReadings | null;
  results: ReadonlyMap<string, Result>;
  dimensions: ReadonlyMap<string, DimensionState>;
  checks: ReadonlyMap<string, CheckState>;
  parts: ReadonlyMap<string, PartState>;
}

/** Ids whose own readings are not the same list as before. */
function changedReadings(worked: Worked | null, given: ModelReadings | null, id: string): boolean {
  if (!worked || worked.readings === given) return false;
  if (worked.readings?.uncertainties !== given?.uncertainties) return true;
  const [a, b] = [worked.readings?.readings.get(id), given?.readings.get(id)];
  return a !== b && (a?.length !== b?.length || !a?.every((reading, i) => reading === b?.[i]));
}

function workDimensions(compiled: CompiledModel, given: ModelReadings | null, old: Worked | null) {
  const { entries, dependents, symbols } = compiled;
  const changed: string[] = [];
  for (const [id, entry] of entries)
    if (old?.compiled.entries.get(id) !== entry || changedReadings(old, given, id))
      changed.push(id);
  const affected = affectedBy(dependents, changed);
  const results = new Map<string, Result>();
  const graph: Graph = { symbols, entries, results };
  if (old)
    for (const id of entries.keys()) {
      const result = affected.has(id) ? undefined : old.results.get(id);
      if (result) results.set(id, result);
    }
  const { ids, loops } = evaluationOrder(entries, dependents, affected);
  const name = (id: string) => entries.get(id)?.dimension.symbol ?? id;
  for (const id of ids) {
    const entry = entries.get(id);
    if (!entry) continue;
    const loop = loops.get(id);
    results.set(
      id,
      loop ? loopResult(entry, loop.map(name)) : evaluateDimension(graph, entry, given),
    );
  }
  return { graph, affected, results };
}

function work(compiled: CompiledModel, given: ModelReadings | null, old: Worked | null): Worked {
  const { graph, affected, results } = workDimensions(compiled, given, old);
  const stale = (inputs: readonly string[]) => inputs.some((id) => affected.has(id));
  const dimensions = new Map<string, DimensionState>();
  for (const id of compiled.entries.keys()) {
    const state = results.get(id)?.state;
    if (state) dimensions.set(id, state);
  }
  const parts = new Map<string, PartState>();
  for (const [id, entry] of compiled.parts) {
    const known =
      old?.compiled.parts.get(id) === entry && !stale(entry.inputs) && old.parts.get(id);
    parts.set(id, known || evaluatePart(graph, entry));
  }
  const sameHands =
    old?.readings === given ||
    (old?.readings?.trials === given?.trials &&
      old?.readings?.looks === given?.looks &&
      Boolean(old?.readings) === Boolean(given));
  const checks = new Map<string, CheckState>();
  for (const [id, entry] of compiled.checks) {
    const known =
      old?.compiled.checks.get(id) === entry &&
      sameHands &&
      !stale(entry.inputs) &&
      old.checks.get(id);
    checks.set(id, known || evaluateCheck(graph, entry, given));
  }
  return { compiled, readings: given, results, dimensions, checks, parts };
}

type Users = ReadonlyMap<string, readonly string[]>;

/** Who needs each dimension, in the order of the plan. */
function usersBy(all: ReadonlyMap<string, { inputs: readonly string[] }>): Users {
  const users = new Map<string, string[]>();
  for (const [user, { inputs }] of all)
    for (const id of new Set(inputs)) {
      const list = users.get(id);
      if (list) list.push(user);
      else users.set(id, [user]);
    }
  return users;
}

function present(worked: Worked): PlanModel {
  const { compiled, readings, results, dimensions, checks, parts } = worked;
  const { document, symbols, entries, scope, dependents } = compiled;
  const texts = new Map<string, SizeState>();
  const graph: Graph = { symbols, entries, results };
  let users: { checks: Users; parts: Users } | null = null;
  return {
    document,
    readings,
    dimensions,
    checks,
    parts,
    symbols,
    evaluate: (text, kind = 'length') => {
      const key = `${kind} ${text}`;
      const known = texts.get(key) ?? evaluateText(graph, text, kind, scope);
      texts.set(key, known);
      return known;
    },
    feeds: (id) => entries.get(id)?.inputs ?? [],
    usedBy: (id) => {
      users ??= { checks: usersBy(compiled.checks), parts: usersBy(compiled.parts) };
      return {
        dimensions: [...(dependents.get(id) ?? [])],
        checks: [...(users.checks.get(id) ?? [])],
        parts: [...(users.parts.get(id) ?? [])],
      };
    },
    update: (next, given = readings) => present(work(compileModel(next, compiled), given, worked)),
  };
}

/**
 * Works out a plan: every dimension's value, band, worst case, root-sum-square and contributors; every check's
 * verdict; every part's sizes. Give readings, even empty ones, for the bench; leave them out at design.
 */
export function createModel(
  document: PlanDocument,
  readings: ModelReadings | null = null,
): PlanModel {
  return present(work(compileModel(document), readings, null));
}

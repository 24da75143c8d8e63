import { type KindScope } from '../../measure';
import { type Dimension, type PlanDocument } from '../document';
import { checkKind, compileCheck } from './compile';
import { type CheckEntry } from './check';
import { compileEntry, type Entry, inputsOf, mentionsOf, scopeOf, symbolTable } from './entry';
import { compilePart, type PartEntry } from './part';
import { dependentsOf } from './order';

/** A plan's expressions read and checked against its symbols; nothing evaluated yet. */
export interface CompiledModel {
  document: PlanDocument;
  symbols: ReadonlyMap<string, Dimension>;
  scope: KindScope;
  entries: ReadonlyMap<string, Entry>;
  dependents: ReadonlyMap<string, readonly string[]>;
  checks: ReadonlyMap<string, CheckEntry>;
  parts: ReadonlyMap<string, PartEntry>;
}

/** Symbols whose meaning is another than before: added, gone, or of another kind or owner. */
function changedSymbols(
  before: ReadonlyMap<string, Dimension>,
  after: ReadonlyMap<string, Dimension>,
): Set<string> {
  const changed = new Set<string>();
  for (const [symbol, d] of after) {
    const old = before.get(symbol);
    if (old !== d && (old?.id !== d.id || old.kind !== d.kind)) changed.add(symbol);
  }
  for (const symbol of before.keys()) if (!after.has(symbol)) changed.add(symbol);
  return changed;
}

const touches = (mentions: ReadonlySet<string>, changed: ReadonlySet<string>): boolean => {
  if (changed.size === 0) return false;
  for (const symbol of mentions) if (changed.has(symbol)) return true;
  return false;
};

/**
 * Compiles a plan. With an earlier result, what did not change (the same objects, no symbol it mentions
 * changed) is taken over as it is.
 */
export function compileModel(document: PlanDocument, before?: CompiledModel): CompiledModel {
  const old = before?.document.units === document.units ? before : undefined;
  const same = old?.document.dimensions === document.dimensions;
  const symbols = same && old ? old.symbols : symbolTable(document);
  const changed = same || !old ? new Set<string>() : changedSymbols(old.symbols, symbols);
  const scope = same && old ? old.scope : scopeOf(symbols, document.units);
  const keep = (mentions: ReadonlySet<string>) => !touches(mentions, changed);

  const entries = new Map<string, Entry>();
  let rewired = !old || old.entries.size !== document.dimensions.length;
  for (const dimension of document.dimensions) {
    const known = old?.entries.get(dimension.id);
    const kept =
      known?.dimension === dimension && keep(known.mentions) && !changed.has(dimension.symbol);
    const entry = kept ? known : compileEntry(dimension, symbols, scope);
    rewired ||= entry !== known && entry.inputs.join() !== known?.inputs.join();
    entries.set(dimension.id, entry);
  }
  const stock = new Map(document.stock.map((s) => [s.id, s]));
  const parts = new Map<string, PartEntry>();
  for (const part of document.parts) {
    const known = old?.parts.get(part.id);
    const from = part.stockId === undefined ? undefined : stock.get(part.stockId);
    const kept = known?.part === part && known.stock === from && keep(known.mentions);
    parts.set(part.id, kept ? known : compilePart(part, from, symbols, scope));
  }
  const checks = new Map<string, CheckEntry>();
  for (const check of document.checks) {
    const known = old?.checks.get(check.id);
    if (known?.check === check && keep(known.mentions)) {
      checks.set(check.id, known);
      continue;
    }
    const compiled = compileCheck(check.expression, scope);
    const inputs = inputsOf([compiled], symbols);
    checks.set(check.id, {
      check,
      compiled,
      inputs,
      mentions: mentionsOf([compiled]),
      kind: checkKind(compiled, scope),
    });
  }
  const dependents = rewired || !old ? dependentsOf(entries) : old.dependents;
  return { document, symbols, scope, entries, dependents, checks, parts };
}

import { type Entry } from './entry';

/** Dimensions in an order to evaluate, and the loops among them, each spelled out by id. */
export interface Order {
  /** Evaluate in this order; members of a loop come where the loop was broken. */
  ids: string[];
  /** For each member of a loop, the ids around it, starting and ending with that member. */
  loops: ReadonlyMap<string, readonly string[]>;
}

/** A loop among what is left, found by walking along inputs; no recursion. */
function findLoop(
  entries: ReadonlyMap<string, Entry>,
  left: ReadonlyMap<string, number>,
  from: string,
): string[] {
  const path: string[] = [];
  const place = new Map<string, number>();
  let id = from;
  for (;;) {
    const seen = place.get(id);
    if (seen !== undefined) return path.slice(seen);
    place.set(id, path.length);
    path.push(id);
    const next = entries.get(id)?.inputs.find((input) => left.has(input));
    if (next === undefined) return path;
    id = next;
  }
}

/**
 * Puts dimensions in order, inputs first (Kahn's algorithm); those outside `ids` count as done.
 * Each loop is taken out whole when nothing else can go on.
 */
export function evaluationOrder(
  entries: ReadonlyMap<string, Entry>,
  dependents: ReadonlyMap<string, readonly string[]>,
  ids: ReadonlySet<string>,
): Order {
  const left = new Map<string, number>();
  for (const id of ids)
    left.set(id, (entries.get(id)?.inputs ?? []).filter((input) => ids.has(input)).length);
  const ordered: string[] = [];
  const loops = new Map<string, readonly string[]>();
  const ready = [...ids].filter((id) => left.get(id) === 0);
  const finish = (id: string) => {
    left.delete(id);
    ordered.push(id);
    for (const dependent of dependents.get(id) ?? []) {
      const count = left.get(dependent);
      if (count === undefined) continue;
      left.set(dependent, count - 1);
      if (count === 1) ready.push(dependent);
    }
  };
  for (;;) {
    for (let id = ready.pop(); id !== undefined; id = ready.pop()) if (left.has(id)) finish(id);
    const [stuck] = left.keys();
    if (stuck === undefined) return { ids: ordered, loops };
    const loop = findLoop(entries, left, stuck);
    loop.forEach((id, i) => loops.set(id, [...loop.slice(i), ...loop.slice(0, i + 1)]));
    for (const id of loop) finish(id);
  }
}

/** Everything that needs any of `changed`, directly or not, and `changed` itself. */
export function affectedBy(
  dependents: ReadonlyMap<string, readonly string[]>,
  changed: Iterable<string>,
): Set<string> {
  const affected = new Set(changed);
  for (const id of affected)
    for (const dependent of dependents.get(id) ?? []) affected.add(dependent);
  return affected;
}

/** Who needs whom. */
export function dependentsOf(entries: ReadonlyMap<string, Entry>): Map<string, string[]> {
  const dependents = new Map<string, string[]>();
  for (const [id, { inputs }] of entries)
    for (const input of inputs) {
      const list = dependents.get(input);
      if (list) list.push(id);
      else dependents.set(input, [id]);
    }
  return dependents;
}

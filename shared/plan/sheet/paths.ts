import { type PlanDocument, type Step } from '../document';

/** Least and most of a thing over all ways through the plan. */
export interface PathCount {
  least: number;
  most: number;
}

type Counts = Map<string, number>;

/**
 * Counts things over all ways through the plan: of alternatives one group is taken, a repeated stretch counts once. `of` gives
 * what a step has, each with its number; what no step has is not in the result.
 */
export function overPaths(
  document: PlanDocument,
  of: (step: Step) => Iterable<readonly [id: string, n: number]>,
): ReadonlyMap<string, PathCount> {
  const total = new Map<string, PathCount>();
  const add = (id: string, least: number, most: number) => {
    const known = total.get(id) ?? { least: 0, most: 0 };
    total.set(id, { least: known.least + least, most: known.most + most });
  };
  const steps = new Map(document.steps.map((s) => [s.id, s]));
  for (const flow of document.flow) {
    if (flow.kind !== 'alternatives') continue;
    const groups = flow.groups.map((group) => {
      const counts: Counts = new Map();
      for (const id of group.stepIds) {
        const step = steps.get(id);
        // A step belongs to one group; it is not met again.
        steps.delete(id);
        for (const [thing, n] of step ? of(step) : [])
          counts.set(thing, (counts.get(thing) ?? 0) + n);
      }
      return counts;
    });
    for (const thing of new Set(groups.flatMap((counts) => [...counts.keys()]))) {
      const each = groups.map((counts) => counts.get(thing) ?? 0);
      add(thing, Math.min(...each), Math.max(...each));
    }
  }
  for (const step of steps.values()) for (const [thing, n] of of(step)) add(thing, n, n);
  return total;
}

import { type Forest } from './forest';
import { type Problem } from './problem';
import { type Plan } from './saw';

/** Sheets as they were at one moment: a tree in preorder, kinds as 2 × kind + turned, inner nodes as -1 or -2 and a count. */
export interface Snapshot {
  bins: number[];
  heights: number[];
  trees: Int32Array[];
  out: Int32Array;
  missing: number;
  cost: number;
}

function encode(forest: Forest, node: number, into: number[]): void {
  const kind = forest.whatOf(node);
  if (kind >= 0) {
    into.push(2 * kind + (forest.turnedOf(node) ? 1 : 0));
    return;
  }
  const at = into.push(kind, 0) - 1;
  let count = 0;
  for (let c = forest.firstOf(node); c >= 0; c = forest.nextOf(c)) {
    encode(forest, c, into);
    count++;
  }
  into[at] = count;
}

/** The tree of one sheet; empty for none. */
export function treeOf(forest: Forest, s: number): Int32Array {
  const into: number[] = [];
  const root = forest.rootOf(s);
  if (root >= 0) encode(forest, root, into);
  return Int32Array.from(into);
}

/** A tree in the job's own units; parts of a kind are dealt out by `deal`. */
export function planOf(
  problem: Problem,
  kerf: number,
  tree: Int32Array,
  deal: (kind: number) => { item: number; turn: boolean },
): Plan {
  let at = 0;
  const real = (units: number) => units * problem.unit - kerf;
  const read = (): Plan => {
    const code = tree[at++]!;
    if (code >= 0) {
      const [kind, turned] = [code >> 1, (code & 1) === 1];
      const { item, turn } = deal(kind);
      const [w, h] = [real(problem.w[kind]!), real(problem.h[kind]!)];
      return { w: turned ? h : w, h: turned ? w : h, item, rotated: turned !== turn };
    }
    const axis = code === -1 ? 'x' : 'y';
    const children: Plan[] = [];
    for (let count = tree[at++]!; count > 0; count--) children.push(read());
    const sum = (size: (child: Plan) => number) =>
      children.reduce((total, child) => total + size(child) + kerf, -kerf);
    const most = (size: (child: Plan) => number) => Math.max(...children.map(size));
    const w = axis === 'x' ? sum((c) => c.w) : most((c) => c.w);
    const h = axis === 'y' ? sum((c) => c.h) : most((c) => c.h);
    return { w, h, axis, children };
  };
  return read();
}

/** Deals out the items of each kind, one after the other. */
export function dealer(problem: Problem): (kind: number) => { item: number; turn: boolean } {
  const place = new Int32Array(problem.kinds);
  const given = new Int32Array(problem.kinds);
  return (kind) => {
    const members = problem.members[kind]!;
    while (given[kind]! >= members[place[kind]!]!.qty) {
      place[kind]!++;
      given[kind] = 0;
    }
    given[kind]!++;
    return members[place[kind]!]!;
  };
}

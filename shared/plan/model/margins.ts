import { type CheckNode, type Node } from '../../measure';

/** A check as margins that must not fall below zero; `strict` ones not to zero either. */
export interface Margins {
  nodes: Node[];
  strict: boolean;
  /** For a fit: outer less inner. */
  gap: Node | null;
}

const minus = (a: Node, b: Node): Node => ({ t: 'bin', op: '-', a, b, at: a.at });
const plus = (a: Node, b: Node): Node => ({ t: 'bin', op: '+', a, b, at: a.at });

/** Turns a comparison into room left on each side. */
export function marginsOf({ op, args }: CheckNode): Margins {
  const [a, b, c, d] = args as [Node, Node, Node, Node];
  switch (op) {
    case '<':
    case '<=':
      return { nodes: [minus(b, a)], strict: op === '<', gap: null };
    case '>':
    case '>=':
      return { nodes: [minus(a, b)], strict: op === '>', gap: null };
    case '=':
      return { nodes: [minus(c, minus(a, b)), plus(c, minus(a, b))], strict: false, gap: null };
    case 'between':
      return { nodes: [minus(a, b), minus(c, a)], strict: false, gap: null };
    case 'fit': {
      const gap = minus(b, a);
      return { nodes: [minus(gap, c), minus(d, gap)], strict: false, gap };
    }
  }
}

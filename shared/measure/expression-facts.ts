import { type Node } from './expression-node';

/** What an expression asks for, and whether it bends. */
export interface ExpressionFacts {
  /** Symbols in order of their first use, each once per way it is asked for. */
  inputs: { symbol: string; made: boolean }[];
  /** Not a straight line in its inputs. */
  curved: boolean;
}

const children = (node: Node): Node[] =>
  node.t === 'bin'
    ? [node.a, node.b]
    : node.t === 'neg'
      ? [node.a]
      : node.t === 'call'
        ? node.args
        : [];

/** Symbols of a tree and whether any operation on them is not linear. */
export function factsOf(...roots: Node[]): ExpressionFacts {
  const inputs = new Map<string, { symbol: string; made: boolean }>();
  let curved = false;
  const visit = (node: Node, made: boolean): boolean => {
    if (node.t === 'sym') {
      inputs.set(`${made ? '!' : ''}${node.name}`, { symbol: node.name, made });
      return true;
    }
    const asks = node.t === 'call' && node.name === 'made';
    const varies = children(node).map((child) => visit(child, asks));
    if (node.t === 'bin') {
      if (node.op === '*') curved ||= varies.every(Boolean);
      if (node.op === '/') curved ||= varies[1] ?? false;
      if (node.op === '^') curved ||= varies.some(Boolean);
    }
    if (node.t === 'call' && !asks) curved ||= varies.some(Boolean);
    return varies.some(Boolean);
  };
  for (const root of roots) visit(root, false);
  return { inputs: [...inputs.values()], curved };
}

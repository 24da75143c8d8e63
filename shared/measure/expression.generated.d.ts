import { type CheckNode, type Node, type ParserOptions } from './expression-node';

export function parse(
  text: string,
  options: ParserOptions & { startRule: 'Expression' },
): Node;
export function parse(text: string, options: ParserOptions & { startRule: 'Check' }): CheckNode;

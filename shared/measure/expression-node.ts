import { type Rational } from './rational';
import { type Powers } from './kinds';

/** An expression as a tree; `at` counts columns from 0. */
export type Node =
  | { t: 'num'; value: Rational; text: string; at: number }
  | { t: 'qty'; value: Rational; powers: Powers; text: string; at: number }
  | { t: 'sym'; name: string; at: number }
  | { t: 'neg'; a: Node; at: number }
  | { t: 'bin'; op: '+' | '-' | '*' | '/' | '^'; a: Node; b: Node; at: number }
  | { t: 'call'; name: string; args: Node[]; at: number };

/** A check's comparison over expressions. */
export interface CheckNode {
  t: 'check';
  op: '<' | '<=' | '>' | '>=' | '=' | 'between' | 'fit';
  args: Node[];
  at: number;
}

/** What the generated parser asks for literals. */
export interface ParserOptions {
  length: (text: string, at: number) => Node;
  measured: (figure: string, unit: string, at: number) => Node;
  plain: (text: string, at: number) => Node;
}

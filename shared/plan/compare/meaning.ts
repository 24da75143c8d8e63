import { parseCheck, type CheckNode, type Node } from '../../measure';
import { type Kind, type PlanDocument } from '../document';
import { compileField } from '../model/compile';
import { scopeOf, symbolTable } from '../model/entry';
import { expressionKeys } from '../rename';

/** Gives each value of a document a text that two documents share exactly when they mean the same by it. */
export interface Meaning {
  /** An expression: symbols by id, figures by their exact size, spaces and spelling aside. */
  expression: (text: string, kind: Kind) => string;
  check: (text: string) => string;
  /** Any value of the document; strings under the names of expressions are read as such. */
  value: (value: unknown, field: string, kind?: Kind) => string;
}

/** Lists that lie in an order: layers of a lamination, sizes on sale (the first counts), stretches of the clip. */
const inOrder: ReadonlySet<string> = new Set([
  'layers',
  'sizes',
  'stretches',
  'groups',
  'from',
  'to',
]);

function nodeText(node: Node | CheckNode, idOf: (symbol: string) => string): string {
  switch (node.t) {
    case 'num':
      return `#${node.value.toString()}`;
    case 'qty':
      return `${node.value.toString()}[${JSON.stringify(node.powers)}]`;
    case 'sym':
      return idOf(node.name);
    case 'neg':
      return `(-${nodeText(node.a, idOf)})`;
    case 'bin':
      return `(${nodeText(node.a, idOf)}${node.op}${nodeText(node.b, idOf)})`;
    case 'call':
      return `${node.name}(${node.args.map((a) => nodeText(a, idOf)).join(',')})`;
    case 'check':
      return `${node.op}(${node.args.map((a) => nodeText(a, idOf)).join(',')})`;
  }
}

/** How a document's values are read for comparing. Empty and broken expressions are compared as typed. */
export function meaningOf(document: PlanDocument): Meaning {
  const symbols = symbolTable(document);
  const scope = scopeOf(symbols, document.units);
  const idOf = (symbol: string) => symbols.get(symbol)?.id ?? `?${symbol}`;
  const expression = (text: string, kind: Kind): string => {
    if (text.trim() === '') return '';
    const compiled = compileField(text, kind, scope);
    return compiled.ok ? nodeText(compiled.node, idOf) : `typed ${text.trim()}`;
  };
  const check = (text: string): string => {
    const read = parseCheck(text);
    return read.ok ? nodeText(read.node, idOf) : `typed ${text.trim()}`;
  };
  const value = (given: unknown, field: string, kind: Kind = 'length'): string => {
    if (typeof given === 'string')
      return expressionKeys.has(field) ? expression(given, kind) : given;
    if (Array.isArray(given)) {
      const texts = given.map((v) => value(v, '', kind));
      return `[${(inOrder.has(field) ? texts : texts.sort()).join('\u0001')}]`;
    }
    if (typeof given === 'number' || typeof given === 'boolean') return String(given);
    if (given === null || typeof given !== 'object') return '';
    return Object.entries(given)
      .filter(([, v]) => v !== undefined)
      .sort(([a], [b]) => (a < b ? -1 : 1))
      .map(([k, v]) => `${k}=${value(v, k, kind)}`)
      .join('\u0002');
  };
  return { expression, check, value };
}

import { type PlanDocument } from './document';

/** Fields of the document that hold an expression, by name. */
export const expressionKeys: ReadonlySet<string> = new Set([
  'expression',
  'by',
  'plus',
  'minus',
  'low',
  'high',
  'over',
  'length',
  'width',
  'height',
  'thickness',
  'allowance',
  'x',
  'y',
  'depth',
  'kerf',
  'diameter',
  'atLeast',
  'depthPerPass',
  'bitDiameter',
  'throughThickness',
  'intoThickness',
  'pilot',
  'clearance',
  'clearOfCut',
]);

/** Renames a symbol in one expression; other words that only contain it stay. */
export const renamedIn = (expression: string, from: string, to: string): string =>
  expression.replace(new RegExp(`(?<![A-Za-z0-9_])${from}(?![A-Za-z0-9_])`, 'g'), to);

function walk(value: unknown, key: string, from: string, to: string): unknown {
  if (typeof value === 'string')
    return expressionKeys.has(key) ? renamedIn(value, from, to) : value;
  if (Array.isArray(value)) return value.map((item) => walk(item, key, from, to));
  if (value === null || typeof value !== 'object') return value;
  return Object.fromEntries(Object.entries(value).map(([k, v]) => [k, walk(v, k, from, to)]));
}

/**
 * The plan with a dimension's symbol changed and every expression that uses it rewritten. Texts refer by id
 * and need nothing. The new symbol must be free; the caller checks.
 */
export function renameSymbol(document: PlanDocument, from: string, to: string): PlanDocument {
  if (from === to || from === '') return document;
  const renamed = walk(document, '', from, to) as PlanDocument;
  return {
    ...renamed,
    dimensions: renamed.dimensions.map((d) => (d.symbol === from ? { ...d, symbol: to } : d)),
  };
}

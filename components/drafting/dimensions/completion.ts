import { functionNames } from '../../../shared/measure';
import { type Dimension } from '../../../shared/plan/document';

export interface Completion {
  /** What takes the place of the word at the caret. */
  insert: string;
  label: string;
  /** Beside the label: the dimension's name, or what the function does. */
  note: string;
}

export interface Completions {
  /** The word they would replace, `[from, to)`. */
  from: number;
  to: number;
  options: Completion[];
}

const functionNotes: Record<string, string> = {
  made: 'as it was made: the reading when there is one',
  min: 'the smallest',
  max: 'the largest',
  abs: 'without its sign',
  sqrt: 'square root',
  hypot: 'diagonal of two lengths',
  round: 'to the nearest',
  floor: 'down',
  ceil: 'up',
};

const none = (at: number): Completions => ({ from: at, to: at, options: [] });

/** How well a dimension answers to a word: its symbol begins so, has it inside, a word of its name begins so. */
function rank(d: Pick<Dimension, 'symbol' | 'name'>, word: string): number {
  const symbol = d.symbol.toLowerCase();
  if (symbol.startsWith(word)) return 0;
  if (symbol.split('_').some((part) => part.startsWith(word))) return 1;
  const name = d.name.toLowerCase().split(/[^a-z0-9]+/);
  if (name.some((part) => part.startsWith(word))) return 2;
  return symbol.includes(word) ? 3 : 9;
}

/**
 * What may stand at the caret: dimensions by symbol or by a word of their name, then functions. Nothing in the
 * middle of a word, after a figure (a unit stands there), or when the word is complete already.
 */
export function completionsAt(
  text: string,
  caret: number,
  dimensions: readonly Pick<Dimension, 'symbol' | 'name'>[],
  most = 8,
): Completions {
  const before = text.slice(0, caret);
  const word = /[A-Za-z_][A-Za-z0-9_]*$/.exec(before)?.[0] ?? '';
  const from = caret - word.length;
  if (word === '' || /^[A-Za-z0-9_]/.test(text.slice(caret))) return none(caret);
  if (/[\d.]\s*$/.test(before.slice(0, from))) return none(caret);
  const wanted = word.toLowerCase();
  const found = dimensions
    .map((d, order) => ({ d, order, rank: rank(d, wanted) }))
    .filter((x) => x.rank < 9)
    .sort((a, b) => a.rank - b.rank || a.order - b.order);
  if (found[0]?.d.symbol === word) return none(caret);
  const functions = functionNames
    .filter((name) => name.startsWith(wanted) && name !== wanted)
    .map((name) => ({ insert: `${name}(`, label: `${name}( )`, note: functionNotes[name] ?? '' }));
  const options = [
    ...found.map(({ d }) => ({ insert: d.symbol, label: d.symbol, note: d.name })),
    ...functions,
  ].slice(0, most);
  return { from, to: caret, options };
}

/** The word a fault stands under, `[from, to)`: a name or figure whole, else one character. */
export function faultSpan(text: string, at: number): [number, number] {
  const from = Math.max(0, Math.min(at, text.length));
  const word = /^(?:[A-Za-z_][A-Za-z0-9_]*|\d[\d./]*)/.exec(text.slice(from))?.[0];
  return [from, from + (word?.length ?? 1)];
}

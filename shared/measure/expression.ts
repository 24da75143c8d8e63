import { type ExpressionFault, FaultError, fail, nearest } from './expression-fault';
import { type CheckNode, type Node, type ParserOptions } from './expression-node';
import { parse } from './expression.generated';
import { kindPowers, plain, powersOf } from './kinds';
import { parseLength } from './length';
import { unitFacts } from './units.data';

/** An expression is at most this long and this deeply nested; the parser never sees more. */
export const expressionLimits = { characters: 2000, depth: 60 } as const;

export type Read<T> = { ok: true; node: T } | { ok: false; fault: ExpressionFault };

/** Names that no symbol may have. */
export const functionNames = [
  ...['min', 'max', 'abs', 'sqrt', 'sin', 'cos', 'tan', 'asin', 'acos', 'atan2', 'hypot'],
  ...['round', 'floor', 'ceil', 'made'],
];
export const reservedWords: ReadonlySet<string> = new Set([
  ...functionNames,
  ...['between', 'fit', 'within'],
  ...[...unitFacts.keys()].filter((unit) => /^[A-Za-z]/.test(unit)),
]);

const length = kindPowers('length');

function figure(text: string, at: number) {
  const read = parseLength(text, { unit: 'mm' });
  if (!read.ok) fail(at + read.at, 'literal', read.message, read.cure);
  return read.value.mm;
}

const options: ParserOptions = {
  length: (text, at) => ({ t: 'qty', value: figure(text, at), powers: length, text, at }),
  measured: (text, unit, at) => {
    const fact = unitFacts.get(unit);
    if (!fact) return fail(at, 'unknown-unit', `${unit} is no unit.`, 'Use another unit.');
    const powers = fact.of === 'count' ? plain : powersOf(fact.of, fact.power);
    const value = figure(text, at).times(fact.factor);
    return { t: 'qty', value, powers, text: `${text} ${unit}`, at };
  },
  plain: (text, at) => ({ t: 'num', value: figure(text, at), text, at }),
};

function guard(text: string): void {
  const { characters, depth } = expressionLimits;
  if (text.length > characters)
    fail(
      characters,
      'too-long',
      `An expression has at most ${characters} characters; this has ${text.length}.`,
      'Make a dimension of a part of it.',
    );
  if (text.trim() === '')
    fail(0, 'empty', 'There is no expression.', 'Type a figure such as 18 mm, or a symbol.');
  const open: number[] = [];
  for (let at = 0; at < text.length; at += 1) {
    if (text[at] === '(') open.push(at);
    else if (text[at] === ')' && open.pop() === undefined)
      fail(at, 'syntax', 'This bracket closes nothing.', 'Take it out, or open one before it.');
    if (open.length > depth)
      fail(
        at,
        'too-deep',
        `Brackets are nested deeper than ${depth}.`,
        'Make a dimension of a part of it.',
      );
  }
  const unclosed = open.pop();
  if (unclosed !== undefined)
    fail(unclosed, 'syntax', 'This bracket is not closed.', 'Close it with ).');
}

/** Where the generated parser stopped, as a sentence. */
function stopped(text: string, at: number): ExpressionFault {
  const rest = text.slice(at).trimStart();
  const place = text.length - text.slice(at).trimStart().length;
  const say = (message: string, cure: string): ExpressionFault => ({
    at: Math.min(place, text.length),
    code: 'syntax',
    message,
    cure,
  });
  if (rest === '')
    return say('The expression stops too early.', 'End it with a figure or a symbol.');
  const before = text.slice(0, place).trimEnd();
  const word = /^[A-Za-z][A-Za-z0-9_]*/.exec(rest)?.[0];
  if (word && /[\d.½⅓⅔¼¾⅛⅜⅝⅞]$/.test(before) && !unitFacts.has(word)) {
    const near = nearest(word, unitFacts.keys());
    const cure = near ? `Did you mean ${near}?` : 'Use mm, in or another unit, or * between both.';
    return { ...say(`${word.slice(0, 30)} is no unit.`, cure), code: 'unknown-unit' };
  }
  if (/^(?:[<>=≤≥]|within\b)/.test(rest))
    return {
      ...say('A comparison stands only in a check.', 'Leave the comparison out.'),
      code: 'comparison',
    };
  if (/^["'′″’”]/.test(rest)) return say('An inch mark needs a figure.', 'Write 3/4" or 5 mm.');
  if (/[\w.)"'°]$/.test(before) && /^[\w.(]/.test(rest))
    return say('Something is missing between these.', 'Put + - * or / between them.');
  return say(
    `${rest[0] ?? ''} cannot stand here.`,
    /[-+*/^(,]$/.test(before) ? 'Put a figure or a symbol here.' : 'Take it out.',
  );
}

function read<T>(text: string, run: () => T): Read<T> {
  try {
    guard(text);
    return { ok: true, node: run() };
  } catch (error) {
    if (error instanceof FaultError) return { ok: false, fault: error.fault };
    const at = (error as { location?: { start: { offset: number } } }).location?.start.offset;
    if (at === undefined) throw error;
    return { ok: false, fault: stopped(text, at) };
  }
}

/** Trees of texts read lately: a plan is read again and again while it is drafted. Trees never change. */
const seen = new Map<string, Read<Node>>();

/** Reads an expression into its tree, or says what is wrong and where. Bounded in length and depth. */
export function parseExpression(text: string): Read<Node> {
  if (/^[A-Za-z]\w*$/.test(text)) return { ok: true, node: { t: 'sym', name: text, at: 0 } };
  const known = seen.get(text);
  if (known) return known;
  const found = read(text, () => parse(text, { ...options, startRule: 'Expression' }));
  if (seen.size >= 5000) seen.clear();
  if (text.length <= 200) seen.set(text, found);
  return found;
}

const counts: Partial<Record<CheckNode['op'], number>> = { between: 3, fit: 4 };

/** Reads a check: a comparison, `a = b within t`, `between(x, low, high)` or `fit(inner, outer, from, to)`. */
export function parseCheck(text: string): Read<CheckNode> {
  const found = read(text, () => {
    const node = parse(text, { ...options, startRule: 'Check' });
    const wanted = counts[node.op];
    if (wanted !== undefined && node.args.length !== wanted)
      fail(
        node.at,
        'arguments',
        `${node.op} takes ${wanted} figures; here are ${node.args.length}.`,
        node.op === 'fit' ? 'Write fit(inner, outer, from, to).' : 'Write between(x, low, high).',
      );
    return node;
  });
  if (found.ok || !['syntax', 'comparison'].includes(found.fault.code)) return found;
  const alone = parseExpression(text);
  if (alone.ok)
    return {
      ok: false,
      fault: {
        at: text.length,
        code: 'comparison',
        message: 'A check compares two things.',
        cure: 'Add < or <= and what it is compared with.',
      },
    };
  if (/=/.test(text) && !/[<>]|within/.test(text))
    return {
      ok: false,
      fault: {
        at: text.indexOf('='),
        code: 'comparison',
        message: 'Two measured things are never equal without a band.',
        cure: 'Add within and a band, such as within 0.2 mm.',
      },
    };
  return { ok: false, fault: { ...found.fault, code: 'syntax' } };
}

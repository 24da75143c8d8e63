import { singular } from './measures/counts';
import { groups, mishearingLines } from './mishearings.data';
import { spoken, type Token } from './tokens';
import { type Correction, type Cue } from './types';

/** One word or run of words that may be misheard, and what must speak for it. */
export interface Mishearing {
  heard: string[];
  meant: string;
  always: boolean;
  near: Set<string>;
  next: Set<string>;
  before: Set<string>;
  /** Only as a noun: an article stands before it. */
  noun: boolean;
  against: Set<string>;
}

const reach = 12;
const list = (text: string) =>
  text
    .trim()
    .split(/\s+/)
    .filter((word) => word !== '');

function evidenceOf(text: string): Omit<Mishearing, 'heard' | 'meant' | 'against'> {
  const words = list(text).flatMap((word) =>
    Object.hasOwn(groups, word) ? list(groups[word] ?? '') : [word],
  );
  const marked = (mark: string) =>
    new Set(
      words.filter((word) => word.startsWith(mark) && word.length > 1).map((word) => word.slice(1)),
    );
  return {
    always: words.includes('*'),
    noun: words.includes('@'),
    next: marked('+'),
    before: marked('-'),
    near: new Set(words.filter((word) => /^[a-z]/.test(word))),
  };
}

function entriesOf(line: string): Mishearing[] {
  const [words, evidence, against] = line.split('|');
  const [heard, meant] = (words ?? '').split(' > ').map((part) => part.trim().split(/,\s*/));
  const rest = { ...evidenceOf(evidence ?? ''), against: new Set(list(against ?? '')) };
  return (heard ?? [])
    .map((each, i) => ({
      heard: each.split(' '),
      meant: meant?.[i] ?? meant?.[meant.length - 1] ?? '',
      ...rest,
    }))
    .filter((entry) => entry.heard.join(' ') !== entry.meant);
}

/** All entries of the lexicon. */
export const mishearings: readonly Mishearing[] = mishearingLines
  .trim()
  .split('\n')
  .flatMap(entriesOf);

const byFirst = new Map<string, Mishearing[]>();
for (const entry of mishearings) {
  const first = entry.heard[0] ?? '';
  byFirst.set(
    first,
    [...(byFirst.get(first) ?? []), entry].sort((a, b) => b.heard.length - a.heard.length),
  );
}

function around(tokens: readonly Token[], from: number, to: number): string[] {
  return [...tokens.slice(Math.max(0, from - reach), from), ...tokens.slice(to, to + reach)].map(
    (token) => token.w,
  );
}

/** The words that speak for an entry at a place; null when it is not offered there. */
function support(entry: Mishearing, tokens: readonly Token[], at: number): string[] | null {
  const to = at + entry.heard.length;
  const close = around(tokens, at, to);
  if (entry.against.size > 0 && close.some((word, i) => entry.against.has(word) && isClose(i, at)))
    return null;
  const next = tokens[to]?.w ?? '';
  const before = tokens[at - 1]?.w ?? '';
  if (entry.always) return entry.heard;
  if (entry.noun && !/^(?:a|an|the|my|with|each|every|of|some)$/.test(before)) return null;
  if (entry.next.has(next)) return [next];
  if (entry.before.size > 0 && !entry.before.has(before)) return null;
  const found = [
    ...new Set(close.filter((word) => entry.near.has(word) || entry.near.has(singular(word)))),
  ];
  return found.length > 0 ? found : null;
}

/** Against counts within five words. */
function isClose(i: number, at: number): boolean {
  const before = Math.min(reach, at);
  return i < before ? before - i <= 5 : i - before < 5;
}

/** Shop words probably heard wrong, each with the evidence; nothing is changed. */
export function heardWrong(
  cues: readonly Cue[],
  tokens: readonly Token[],
): Omit<Correction, 'id'>[] {
  const found: Omit<Correction, 'id'>[] = [];
  for (let at = 0; at < tokens.length; at += 1) {
    for (const entry of byFirst.get(tokens[at]?.w ?? '') ?? []) {
      if (!entry.heard.every((word, k) => tokens[at + k]?.w === word)) continue;
      const evidence = support(entry, tokens, at);
      if (!evidence) continue;
      const { wordsRange } = spoken(cues, tokens, at, at + entry.heard.length);
      found.push({
        t: tokens[at]?.t ?? 0,
        wordsRange,
        heard: entry.heard.join(' '),
        meant: entry.meant,
        why: why(entry, evidence),
      });
      at += entry.heard.length - 1;
      break;
    }
  }
  return found;
}

function why(entry: Mishearing, evidence: readonly string[]): string {
  return entry.always
    ? `“${entry.heard.join(' ')}” is no shop word; “${entry.meant}” sounds like it.`
    : `Said beside “${evidence.slice(0, 3).join('”, “')}”.`;
}

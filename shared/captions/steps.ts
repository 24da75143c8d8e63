import {
  begins,
  farewell,
  letsGo,
  openings,
  reactions,
  signOff,
  sponsor,
  stopwords,
  trying,
  welcome,
} from './steps.data';
import { singular } from './measures/counts';
import { type Token } from './tokens';
import { type Cue, type Phase } from './types';

/** A stretch of cues, from the first to the one before `to`. */
export interface Stretch {
  from: number;
  to: number;
  phase: Phase;
}

const shortest = 9;
const usual = 38;
/** Weights found on the samples: what two like stretches share, what a turn is worth, what a boundary needs. */
const alike = 0.65;
const turnWorth = 2;
const leastNeed = 0.75;
const silenceNeed = 0.4;

/** Words of topic, by cue. */
function topics(cues: readonly Cue[], tokens: readonly Token[]): string[][] {
  const words: string[][] = cues.map(() => []);
  for (const token of tokens)
    if (token.w.length > 2 && !stopwords.has(token.w) && !/\d/.test(token.w))
      words[token.cue]?.push(singular(token.w));
  return words;
}

/** How little the words after a cue share with those before it: 0 alike, 1 nothing in common. */
function turn(words: readonly (readonly string[])[], at: number, reach: number): number {
  const before = new Map<string, number>();
  const after = new Map<string, number>();
  for (let k = Math.max(0, at - reach); k < at; k += 1)
    for (const w of words[k] ?? []) before.set(w, (before.get(w) ?? 0) + 1);
  for (let k = at; k < Math.min(words.length, at + reach); k += 1)
    for (const w of words[k] ?? []) after.set(w, (after.get(w) ?? 0) + 1);
  let dot = 0;
  for (const [w, n] of after) dot += n * (before.get(w) ?? 0);
  const size = (map: Map<string, number>) =>
    Math.sqrt([...map.values()].reduce((sum, n) => sum + n * n, 0));
  const both = size(before) * size(after);
  return both === 0 ? 0.5 : 1 - dot / both;
}

/** A silence is worth what it stands out by in this file. */
function pauseScale(cues: readonly Cue[]): number {
  const gaps = cues
    .map((cue, i) => (i === 0 ? 0 : Math.max(0, cue.start - (cues[i - 1]?.end ?? 0))))
    .sort((a, b) => a - b);
  return Math.max(0.9, (gaps[Math.floor(gaps.length * 0.85)] ?? 0) * 1.8);
}

function openingOf(text: string): number {
  if (reactions.test(text)) return -0.6;
  return openings.reduce(
    (most, { is, weight }) => (is.test(text) ? Math.max(most, weight) : most),
    0,
  );
}

/** The end of the welcome and the start of the sign-off are told by their words. */
function framing(cues: readonly Cue[], at: number, end: number): number {
  const cue = cues[at];
  if (!cue) return 0;
  const text = cue.text.toLowerCase();
  if (cue.start > end * 0.7 && signOff.test(text)) return 1.2;
  const before = cues[at - 1]?.text.toLowerCase() ?? '';
  return cue.start < end * 0.35 && letsGo.test(before) ? 0.8 : 0;
}

/** How much speaks for a new step at each cue. */
function scores(cues: readonly Cue[], tokens: readonly Token[]): number[] {
  const words = topics(cues, tokens);
  const scale = pauseScale(cues);
  const starts = sentenceTexts(cues, tokens);
  const end = cues[cues.length - 1]?.end ?? 0;
  const reach = Math.max(
    4,
    Math.min(14, Math.round(28 / ((cues[cues.length - 1]?.end ?? 1) / Math.max(1, cues.length)))),
  );
  return cues.map((cue, i) => {
    if (i === 0) return 0;
    const gap = Math.max(0, cue.start - (cues[i - 1]?.end ?? 0));
    const pause = Math.min(1.5, gap / scale);
    const frame = framing(cues, i, end);
    return pause * 2.2 + (starts[i] ?? 0) + frame + (turn(words, i, reach) - alike) * turnWorth;
  });
}

/** The best opening among the places in a cue where a thought may begin. */
function sentenceTexts(cues: readonly Cue[], tokens: readonly Token[]): number[] {
  const best = cues.map(() => 0);
  const seen = cues.map(() => false);
  tokens.forEach((token, k) => {
    const first = !seen[token.cue];
    seen[token.cue] = true;
    const after = tokens[k - 1];
    if (!first && !after?.end && !/^(?:okay|alright|now|next)$/.test(token.w)) return;
    const text = tokens
      .slice(k, k + 7)
      .map((each) => each.w)
      .join(' ');
    const weight = openingOf(text) * (first || after?.end ? 1 : 0.6);
    best[token.cue] = first ? weight : Math.max(best[token.cue] ?? 0, weight);
  });
  return best;
}

/** How well a length suits a step: none under nine seconds, long ones pay. */
function lengthCost(seconds: number): number {
  if (seconds < shortest) return 4;
  const ratio = Math.log(seconds / usual);
  return ratio < 0 ? ratio * ratio * 0.9 : ratio * ratio * 0.8;
}

/** What a boundary must score: less in a file that has no silences to go by. */
function need(cues: readonly Cue[]): number {
  const silences = cues.filter(
    (cue, i) => i > 0 && cue.start - (cues[i - 1]?.end ?? 0) >= 0.9,
  ).length;
  const expected = Math.max(1, ((cues[cues.length - 1]?.end ?? 0) - (cues[0]?.start ?? 0)) / 60);
  return leastNeed + silenceNeed * Math.min(1, silences / expected);
}

/** Boundaries that together score best. */
function boundaries(cues: readonly Cue[], score: readonly number[], need: number): number[] {
  const best: { sum: number; from: number }[] = [{ sum: 0, from: -1 }];
  const end = cues[cues.length - 1]?.end ?? 0;
  for (let i = 1; i <= cues.length; i += 1) {
    const t = i === cues.length ? end : (cues[i]?.start ?? end);
    let top = { sum: -Infinity, from: 0 };
    for (let k = i - 1; k >= 0; k -= 1) {
      const length = t - (cues[k]?.start ?? 0);
      if (length > 400 && top.sum > -Infinity) break;
      const sum = (best[k]?.sum ?? 0) - lengthCost(length);
      if (sum > top.sum) top = { sum, from: k };
    }
    best.push({ sum: top.sum + (i === cues.length ? 0 : (score[i] ?? 0) - need), from: top.from });
  }
  const cuts: number[] = [];
  for (let i = best[cues.length]?.from ?? 0; i > 0; i = best[i]?.from ?? 0) cuts.push(i);
  return cuts.reverse();
}

function textOf(cues: readonly Cue[], from: number, to: number): string {
  return cues
    .slice(from, to)
    .map((cue) => cue.text.toLowerCase())
    .join(' ');
}

const count = (text: string, is: RegExp) => text.match(new RegExp(is.source, 'g'))?.length ?? 0;

function phaseOf(
  cues: readonly Cue[],
  from: number,
  to: number,
  place: number,
  total: number,
): Phase {
  const text = textOf(cues, from, to);
  const opening = textOf(cues, from, Math.min(to, from + 3));
  if (sponsor.test(text) && count(text, sponsor) > 1) return place < total / 2 ? 'intro' : 'outro';
  if (place === 0 && welcome.test(opening + textOf(cues, from, to))) return 'intro';
  if (place === total - 1 && total > 1 && count(text, farewell) >= 2) return 'outro';
  return trying.test(opening) && place > total / 2 ? 'demo' : 'build';
}

/** The sign-off begins where its words do, however little the stretch was parted before. */
function partOutro(cues: readonly Cue[], starts: number[]): number[] {
  const last = starts[starts.length - 1] ?? 0;
  if (count(textOf(cues, last, cues.length), farewell) < 2) return starts;
  for (let k = last + 1; k < cues.length; k += 1) {
    const text = cues[k]?.text.toLowerCase() ?? '';
    if (signOff.test(text) && (cues[k]?.start ?? 0) - (cues[last]?.start ?? 0) >= shortest)
      return [...starts, k];
  }
  return starts;
}

/** The welcome ends where the first thing is begun. */
function partIntro(cues: readonly Cue[], starts: number[]): number[] {
  const second = starts[1] ?? cues.length;
  if (!welcome.test(textOf(cues, 0, Math.min(3, second)))) return starts;
  for (let k = 1; k < second; k += 1) {
    const start = cues[k]?.start ?? 0;
    if (
      start >= shortest &&
      begins.test(cues[k]?.text.toLowerCase() ?? '') &&
      (cues[second]?.start ?? Infinity) - start >= shortest
    )
      return [0, k, ...starts.slice(1)];
  }
  return starts;
}

/** Stretches of the clip that may become steps, first to last, with nothing between them. */
export function findStretches(cues: readonly Cue[], tokens: readonly Token[]): Stretch[] {
  if (cues.length === 0) return [];
  const starts = partIntro(
    cues,
    partOutro(cues, [0, ...boundaries(cues, scores(cues, tokens), need(cues))]),
  );
  return starts.map((from, place) => {
    const to = starts[place + 1] ?? cues.length;
    return { from, to, phase: phaseOf(cues, from, to, place, starts.length) };
  });
}

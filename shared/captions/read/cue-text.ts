import { type CueWord } from '../types';
import { readStamp } from './time';

const entities: Record<string, string> = {
  amp: '&',
  lt: '<',
  gt: '>',
  nbsp: ' ',
  lrm: '',
  rlm: '',
  quot: '"',
  apos: "'",
  '#39': "'",
};

function decode(text: string): string {
  return text.replace(/&(#?\w{1,6});/g, (all, name: string) => entities[name] ?? all);
}

/** A piece of a payload: text, with the time that a time tag before it gave. */
interface Piece {
  text: string;
  at: number | null;
}

// A tag begins with a letter, a slash or a time; "a < b" is text.
const tag =
  /<(\/?[a-zA-Z][^>]{0,300}|\/|\d[\d:.,]{3,20})>|<\/?[a-zA-Z][^>]{0,300}$|\{\\[^}]{0,80}\}/g;

function pieces(payload: string): Piece[] {
  const found: Piece[] = [];
  let from = 0;
  let at: number | null = null;
  for (const match of payload.matchAll(tag)) {
    if (match.index > from) found.push({ text: payload.slice(from, match.index), at });
    const stamp = match[1] !== undefined && /^\d/.test(match[1]) ? readStamp(match[1]) : null;
    // A piece takes its time once; what follows it is spread.
    at = stamp ?? (match.index > from ? null : at);
    from = match.index + match[0].length;
  }
  if (from < payload.length) found.push({ text: payload.slice(from), at });
  return found;
}

/** The words of a payload: tags taken out, entities read, spaces folded. */
export function plainText(payload: string): string {
  return decode(
    pieces(payload)
      .map((piece) => piece.text)
      .join(''),
  )
    .replace(/\s+/g, ' ')
    .trim();
}

interface Timed {
  text: string;
  at: number | null;
}

function timedWords(payload: string): Timed[] {
  const words: Timed[] = [];
  let open = false;
  for (const piece of pieces(payload)) {
    const text = decode(piece.text);
    const parts = text.split(/\s+/);
    parts.forEach((part, i) => {
      if (part === '') return;
      const last = words[words.length - 1];
      if (i === 0 && open && last) last.text += part;
      else
        words.push({
          text: part,
          at:
            i === 0 || words.length === 0 || parts.slice(0, i).every((p) => p === '')
              ? piece.at
              : null,
        });
    });
    open = text !== '' && !/\s$/.test(text);
  }
  return words;
}

/** Words of a payload with their times: kept where the file has them, else spread by length. */
export function cueWords(payload: string, start: number, end: number): CueWord[] {
  const words = timedWords(payload);
  let known = start;
  const times = words.map((word, i) => {
    if (i === 0) return start;
    if (word.at !== null && word.at >= known && word.at <= end) {
      known = word.at;
      return word.at;
    }
    return null;
  });
  return words.map((word, i) => ({ t: times[i] ?? spread(words, times, i, end), text: word.text }));
}

function spread(
  words: readonly Timed[],
  times: readonly (number | null)[],
  at: number,
  end: number,
): number {
  let from = at;
  while (times[from] == null) from -= 1;
  let to = at;
  while (to < words.length && times[to] == null) to += 1;
  const lo = times[from] ?? 0;
  const hi = times[to] ?? end;
  const length = (a: number, b: number) =>
    words.slice(a, b).reduce((sum, word) => sum + word.text.length + 1, 0);
  return Math.round((lo + ((hi - lo) * length(from, at)) / length(from, to)) * 1000) / 1000;
}

import { type Cue, type WordsRange } from './types';

/** A piece of a spoken word, made plain: lower case, written sizes taken apart ("18mm" is 18 and mm). */
export interface Token {
  w: string;
  cue: number;
  word: number;
  /** Start of its cue. */
  t: number;
  /** When it is said. */
  at: number;
  /** A sentence ends after it. */
  end: boolean;
  /** A comma or the like follows it. */
  comma: boolean;
  /** Seconds of silence before it. */
  gap: number;
}

const vulgar: Record<string, string> = {
  '½': '1/2',
  '¼': '1/4',
  '¾': '3/4',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
  '⅓': '1/3',
  '⅔': '2/3',
};
const piece =
  /\d{1,3}(?:,\d{3})+(?!\d)|\d+\/\d+(?=\D|$)|\d*\.\d+|\d+|"|'(?![a-z])|°|%|#|\$|€|£|×|:|-|[a-z]+(?:'[a-z]+)*/g;
const signs: Record<string, string> = {
  '"': 'inch',
  "'": 'foot',
  '°': 'degrees',
  '%': 'percent',
  '#': 'number',
  '×': 'by',
};
const contractions = /^(?:nd|nds|rd|th|ths|s)$/;

const isNumber = (w: string | undefined) => w !== undefined && /^[\d./]+$/.test(w);

/** The pieces of one word. */
export function piecesOf(raw: string): string[] {
  const plain = raw
    .toLowerCase()
    .replace(/[’‘`´′]/g, "'")
    .replace(/[“”″]/g, '"')
    .replace(/[–—−]/g, '-')
    .replace(/(\d+)\s*⁄\s*(\d+)/g, '$1/$2')
    .replace(/[½¼¾⅛⅜⅝⅞⅓⅔]/g, (c) => ` ${vulgar[c] ?? ''}`)
    .replace(/(\d)''/g, '$1"');
  const found = plain.match(piece) ?? [];
  const out: string[] = [];
  found.forEach((w, i) => {
    const before = out[out.length - 1];
    const next = found[i + 1];
    if (w === '-') {
      // "10-15" is a range, "1-1/2" one number, "1/4-20" a thread.
      if (isNumber(before) && isNumber(next) && !next?.includes('/') && !before?.includes('/'))
        out.push('to');
    } else if (w === ':') {
      if (isNumber(before) && isNumber(next)) out.push(':');
    } else if (w === '"' || w === "'") {
      if (isNumber(before)) out.push(signs[w] ?? w);
    } else if (
      w === 'x' &&
      (isNumber(before) || before === 'inch' || before === 'mm') &&
      next !== undefined
    )
      out.push('by');
    else if (isNumber(before) && contractions.test(w)) {
      // "2x4s" are sticks.
      if (w === 's' && out[out.length - 2] === 'by') out.push('sticks');
      else if (w !== 's' && !before?.includes('/')) out[out.length - 1] = `${before ?? ''}${w}`;
    } else if (/^\d{1,3}(?:,\d{3})+$/.test(w)) out.push(w.replace(/,/g, ''));
    else out.push(signs[w] ?? w);
  });
  return out;
}

/** An "x" on its own between two sizes is "by". */
function joins(tokens: readonly Token[], cues: readonly Cue[], cue: number, word: number): boolean {
  const before = tokens[tokens.length - 1]?.w;
  const next = cues[cue]?.words[word + 1]?.text ?? cues[cue + 1]?.words[0]?.text ?? '';
  return (
    /^\d/.test(next) && (isNumber(before) || /^(?:inch|foot|mm|cm|in|ft|m)$/.test(before ?? ''))
  );
}

/** All words of the captions as tokens. */
export function tokensOf(cues: readonly Cue[]): Token[] {
  const tokens: Token[] = [];
  cues.forEach((cue, c) => {
    const gap = c > 0 ? cue.start - (cues[c - 1]?.end ?? 0) : 0;
    cue.words.forEach((word, k) => {
      if (/^[[(♪]/.test(word.text)) return;
      const pieces = piecesOf(word.text);
      pieces.forEach((each, p) => {
        const w = each === 'x' && joins(tokens, cues, c, k) ? 'by' : each;
        const last = p === pieces.length - 1;
        tokens.push({
          w,
          cue: c,
          word: k,
          t: cue.start,
          at: word.t,
          end: last && /[.?!]["')\]]*$/.test(word.text),
          comma: last && /[,;:—–]["')]*$/.test(word.text),
          gap: k === 0 && p === 0 ? Math.max(0, gap) : 0,
        });
      });
    });
  });
  return tokens;
}

/** The words of tokens `from` to `to` (not included) as they stand in the captions. */
export function spoken(
  cues: readonly Cue[],
  tokens: readonly Token[],
  from: number,
  to: number,
): { text: string; wordsRange: WordsRange } {
  const a = tokens[from];
  const b = tokens[to - 1];
  if (!a || !b) throw new RangeError('No such tokens');
  const words: string[] = [];
  for (let c = a.cue; c <= b.cue; c += 1) {
    const cue = cues[c];
    if (!cue) continue;
    words.push(
      ...cue.words
        .slice(c === a.cue ? a.word : 0, c === b.cue ? b.word + 1 : undefined)
        .map((word) => word.text),
    );
  }
  return {
    text: words.join(' ').replace(/[.,;:!?]+$/, ''),
    wordsRange: { from: { cue: a.cue, word: a.word }, to: { cue: b.cue, word: b.word } },
  };
}

/** A run of words starting at a token? A word may offer variants: `the|a`. */
export function follows(tokens: readonly Token[], at: number, phrase: string): boolean {
  return phrase.split(' ').every((want, k) => {
    const w = tokens[at + k]?.w;
    return w !== undefined && want.split('|').includes(w);
  });
}

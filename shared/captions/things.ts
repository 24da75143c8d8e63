import { spoken, type Token } from './tokens';
import { type Cue, type HeardThing } from './types';
import { materialLines, toolLines } from './things.data';

/** First word of a name → the whole name's words and the thing, longest first. */
type Lexicon = Map<string, { words: string[]; name: string }[]>;

function lexiconOf(lines: string): Lexicon {
  const lexicon: Lexicon = new Map();
  for (const line of lines.trim().split('\n')) {
    const [name, names] = line.split(': ');
    for (const each of (names ?? '').split('|')) {
      const words = each.split(' ');
      const first = words[0] ?? '';
      lexicon.set(
        first,
        [...(lexicon.get(first) ?? []), { words, name: name ?? each }].sort(
          (a, b) => b.words.length - a.words.length,
        ),
      );
    }
  }
  return lexicon;
}

const lexicons = { tool: lexiconOf(toolLines), material: lexiconOf(materialLines) };

function matchAt(
  lexicon: Lexicon,
  tokens: readonly Token[],
  at: number,
): { name: string; n: number } | null {
  const candidates = lexicon.get(tokens[at]?.w ?? '') ?? [];
  const match = candidates.find(({ words }) =>
    words.every((word, k) => tokens[at + k]?.w === word || tokens[at + k]?.w === `${word}s`),
  );
  return match ? { name: match.name, n: match.words.length } : null;
}

// Words that are a tool only as a noun: "a square", "the level", not "dead square", "drill a hole".
const nounOnly = new Set([
  'square',
  'level',
  'file',
  'hammer',
  'clamp',
  'brush',
  'strap',
  'roller',
  'tape',
  'compass',
  'pencil',
  'marker',
  'chisel',
  'scraper',
  'paint',
  'stain',
  'glue',
  'wax',
  'screws',
  'bolts',
]);
const articles =
  /^(?:a|an|the|my|your|this|that|some|with|of|good|your|and|little|sharp|combination|yellow|more|paste|try|those|these|by|on|using|in)$/;

/** The things of a lexicon, first mention of each. */
export function heardThings(
  cues: readonly Cue[],
  tokens: readonly Token[],
  kind: 'tool' | 'material',
): Omit<HeardThing, 'id'>[] {
  const seen = new Set<string>();
  const things: Omit<HeardThing, 'id'>[] = [];
  for (let at = 0; at < tokens.length; at += 1) {
    const match = matchAt(lexicons[kind], tokens, at);
    if (!match) continue;
    const verb =
      match.n === 1 &&
      nounOnly.has(match.name) &&
      !/s$/.test(tokens[at]?.w ?? '') &&
      !articles.test(tokens[at - 1]?.w ?? '');
    if (!verb && !seen.has(match.name)) {
      seen.add(match.name);
      things.push({
        t: tokens[at]?.t ?? 0,
        ...spoken(cues, tokens, at, at + match.n),
        name: match.name,
      });
    }
    at += match.n - 1;
  }
  return things;
}

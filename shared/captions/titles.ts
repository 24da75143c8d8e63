import { stopwords, verbOf } from './steps.data';
import { type Token } from './tokens';
import { type Correction, type Phase } from './types';

const cutShort =
  /^(?:and|so|because|which|that|if|when|then|but|is|are|was|until|while|where|i|you|we|they|it's|i'm|just|um|uh|like|or|at|gets|get|has|have|to|before|there|there's|this|don't)$/;
const determiner =
  /^(?:the|a|an|my|your|those|these|this|that|some|two|three|four|all|both|each|it|them)$/;
const leading =
  /^(?:to|i|we|you|let's|and|then|i'm|we're|going|gonna|now|just|can|i'll|we'll|want|need|by|start|was|been|be|okay|so)$/;

/** The words after a verb that name its object, at most five. */
function objectOf(tokens: readonly Token[], at: number): string[] {
  const words: string[] = [];
  for (let k = at; k < Math.min(tokens.length, at + 6); k += 1) {
    const w = tokens[k]?.w ?? '';
    if (
      cutShort.test(w) ||
      (words.length > 0 &&
        /^(?:the|a|an|my|your)$/.test(w) &&
        !/^(?:to|on|in|into|off|of|for|with|onto|from)$/.test(words[words.length - 1] ?? ''))
    )
      break;
    if (!/^(?:really|uh|um)$/.test(w))
      words.push(/^(?:my|your|those|these|this)$/.test(w) ? 'the' : w);
    if (tokens[k]?.end || tokens[k]?.comma) break;
  }
  while (
    words.length > 0 &&
    /^(?:the|a|an|to|on|in|into|off|of|for|with|onto|from|up|down|my|it|them|one|by|about|some|over|across|through|as|two|three|four)$/.test(
      words[words.length - 1] ?? '',
    )
  )
    words.pop();
  return words;
}

interface Candidate {
  verb: string;
  object: string[];
  weight: number;
}

function candidates(tokens: readonly Token[]): Candidate[] {
  const found: Candidate[] = [];
  const said = new Map<string, number>();
  for (const token of tokens) said.set(token.w, (said.get(token.w) ?? 0) + 1);
  for (let k = 0; k < Math.min(tokens.length, 80); k += 1) {
    const w = tokens[k]?.w ?? '';
    const verb = verbOf(w);
    const before = tokens[k - 1]?.w ?? '';
    if (!verb || determiner.test(before)) continue;
    const object = objectOf(tokens, k + 1);
    const topic = object.filter((word) => word.length > 2 && !stopwords.has(word));
    if (topic.length === 0) continue;
    const weight =
      (leading.test(before) ? 1.5 : 0) +
      (determiner.test(tokens[k + 1]?.w ?? '') ? 1 : 0) +
      Math.min(
        2,
        topic.reduce((sum, word) => sum + ((said.get(word) ?? 1) - 1) * 0.5, 0),
      ) -
      k / 22 -
      (/^(?:make|get|set|check)$/.test(verb) ? 0.7 : 0);
    found.push({ verb, object, weight });
  }
  return found;
}

const sentenceCase = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);

/** The word said most that is of some topic. */
function topicOf(tokens: readonly Token[]): string {
  const counts = new Map<string, number>();
  for (const { w } of tokens)
    if (w.length > 3 && !stopwords.has(w) && !/\d/.test(w) && !verbOf(w))
      counts.set(w, (counts.get(w) ?? 0) + 1);
  return [...counts].sort((a, b) => b[1] - a[1])[0]?.[0] ?? '';
}

/** Misheard words put right for the title only; the words themselves stay. */
function rightWords(
  tokens: readonly Token[],
  corrections: readonly Pick<Correction, 'wordsRange' | 'meant'>[],
): Token[] {
  const at = new Map(
    corrections.map((correction) => [
      `${correction.wordsRange.from.cue}:${correction.wordsRange.from.word}`,
      correction,
    ]),
  );
  const out: Token[] = [];
  let until: { cue: number; word: number } | null = null;
  for (const token of tokens) {
    if (until && (token.cue < until.cue || (token.cue === until.cue && token.word <= until.word)))
      continue;
    until = null;
    const correction = at.get(`${token.cue}:${token.word}`);
    if (correction) until = correction.wordsRange.to;
    out.push(correction ? { ...token, w: correction.meant } : token);
  }
  return out;
}

/** A short imperative title made of the words said in a stretch. */
export function titleOf(
  tokens: readonly Token[],
  phase: Phase,
  corrections: readonly Pick<Correction, 'wordsRange' | 'meant'>[],
): string {
  const words = rightWords(tokens, corrections);
  const topic = topicOf(words);
  if (phase === 'intro') return topic === '' ? 'Opening' : `Opening: ${topic}`;
  if (phase === 'outro') return 'Sign-off';
  const best = candidates(words).sort((a, b) => b.weight - a.weight)[0];
  if (best)
    return sentenceCase(
      [best.verb === 'route' ? 'rout' : best.verb, ...best.object].join(' '),
    ).slice(0, 80);
  if (phase === 'demo') return topic === '' ? 'Try it' : `Try the ${topic}`;
  return topic === '' ? 'Go on with the work' : `Work on the ${topic}`;
}

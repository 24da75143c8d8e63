import { heardCautions } from './cautions';
import { idGiver } from './ids';
import { heardMeasures } from './measures/describe';
import { heardWrong } from './mishearings';
import { findStretches, type Stretch } from './steps';
import { heardThings } from './things';
import { titleOf } from './titles';
import { type Token } from './tokens';
import {
  type Captions,
  type Correction,
  type Cue,
  type HeardStep,
  type JotOptions,
  type Jottings,
  type WordsRange,
} from './types';

type Giver = ReturnType<typeof idGiver>;

/** The words beside a stretch of words, so that the same figure said twice keeps two ids. */
function beside(cues: readonly Cue[], { from, to }: WordsRange): string {
  const word = (cue: number, k: number) => cues[cue]?.words[k]?.text.toLowerCase() ?? '';
  const before =
    word(from.cue, from.word - 1) ||
    word(from.cue - 1, (cues[from.cue - 1]?.words.length ?? 0) - 1);
  const after = word(to.cue, to.word + 1) || word(to.cue + 1, 0);
  return `${before}|${after}`;
}

function named<T extends { wordsRange: WordsRange }>(
  cues: readonly Cue[],
  give: Giver,
  kind: string,
  items: readonly T[],
  words: (item: T) => string,
): (T & { id: string })[] {
  return items.map((item) => ({
    ...item,
    id: give(kind, `${words(item)}|${beside(cues, item.wordsRange)}`),
  }));
}

function stepsOf(
  cues: readonly Cue[],
  tokens: readonly Token[],
  stretches: readonly Stretch[],
  corrections: readonly Correction[],
  duration: number,
  give: Giver,
): HeardStep[] {
  let k = 0;
  return stretches.map((stretch, i) => {
    const next = stretches[i + 1];
    const from = k;
    while (k < tokens.length && (tokens[k]?.cue ?? 0) < stretch.to) k += 1;
    const last = cues[stretch.to - 1];
    const start = Math.min(cues[stretch.from]?.start ?? 0, duration);
    const opening = cues[stretch.from]?.text.toLowerCase() ?? '';
    return {
      id: give('step', opening),
      start,
      end: Math.max(
        start,
        Math.min(next ? (cues[next.from]?.start ?? duration) : duration, duration),
      ),
      title: titleOf(tokens.slice(from, k), stretch.phase, corrections),
      phase: stretch.phase,
      wordsRange: {
        from: { cue: stretch.from, word: 0 },
        to: { cue: stretch.to - 1, word: Math.max(0, (last?.words.length ?? 1) - 1) },
      },
    };
  });
}

function durationOf(cues: readonly Cue[], options: JotOptions): number {
  const spoken = cues.reduce((end, cue) => Math.max(end, cue.end), 0);
  const given = options.duration;
  return given !== undefined && Number.isFinite(given) && given > 0 ? given : spoken;
}

/**
 * Jots down what the captions say: steps, measures, tools, materials, cautions and words probably heard
 * wrong. Pure and deterministic; what lies after the clip's end is left out.
 */
export function jot(captions: Captions, options: JotOptions = {}): Jottings {
  const duration = durationOf(captions.cues, options);
  const cues = captions.cues.filter((cue) => cue.start < duration);
  const { measures, talk } = heardMeasures(cues, options.units);
  const { tokens } = talk;
  const give = idGiver();
  const corrections = named(cues, give, 'word', heardWrong(cues, tokens), (item) => item.heard);
  const stretches = findStretches(cues, tokens);
  const steps = stepsOf(cues, tokens, stretches, corrections, duration, give);
  const outro = steps.find((step) => step.phase === 'outro')?.start ?? Infinity;
  const intro = steps[0]?.phase === 'intro' ? steps[0].end : 0;
  return {
    units: talk.units,
    duration,
    steps,
    measures: named(cues, give, 'measure', measures, (item) => item.text.toLowerCase()),
    tools: named(cues, give, 'tool', heardThings(cues, tokens, 'tool'), (item) => item.name),
    materials: named(
      cues,
      give,
      'material',
      heardThings(cues, tokens, 'material'),
      (item) => item.name,
    ),
    cautions: named(cues, give, 'caution', heardCautions(cues, tokens, intro, outro), (item) =>
      item.text.toLowerCase(),
    ),
    corrections,
  };
}

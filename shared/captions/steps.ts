import { type Cue } from './read';

/** A stretch of the clip that may become a step. */
export interface DraftStep {
  start: number;
  end: number;
  title: string;
  cautions: { t: number; text: string }[];
}

const turns =
  /^(?:(?:so|okay|ok|alright|all right|right|now|and|um|uh)\s+)*(?:next|now (?:i|we|you|it|let|the)|first|then (?:i|we|you)|after that|once (?:that|the|it)|step|the next|time to|let'?s|on to|moving on|with (?:that|the) .{0,30}(?:done|dry|cut|glued)|finally|last)\b/;
const openings =
  /^(?:(?:so|okay|ok|alright|right|now|and|um|uh|then|next|first|finally|we|i|you|i'm|we're|going|gonna|to|let's|lets|can|want|need|will|i'll|we'll|just|go|ahead|it's|time|the|thing|is)\s+)+/;
const danger =
  /\b(?:careful|keep (?:your|the) (?:hands|fingers)|never|don'?t (?:ever|reach|put|stand)|push stick|unplug|pull the plug|eye protection|hearing|respirator|dust mask|kick ?back|watch your)\b/;

/** A title in a few words: the talk's own, without its run-up. */
export function titleFrom(text: string): string {
  const plain =
    text
      .toLowerCase()
      .replace(openings, '')
      .split(/[.!?]|\bso\b|\bbecause\b|\bwhich\b/)[0] ?? '';
  const words = plain.split(/\s+/).filter(Boolean).slice(0, 8).join(' ');
  return words === '' ? 'A step' : words.charAt(0).toUpperCase() + words.slice(1);
}

/**
 * Steps by plain means: a new one where the talk turns ("next", "now we", "let's") or falls silent for
 * four seconds, none shorter than fifteen.
 */
export function draftSteps(cues: readonly Cue[]): DraftStep[] {
  const steps: { start: number; cues: Cue[] }[] = [];
  cues.forEach((cue, i) => {
    const last = steps[steps.length - 1];
    const silent = i > 0 && cue.start - cues[i - 1]!.end >= 4;
    const turned = turns.test(cue.text.toLowerCase());
    if (!last || ((silent || turned) && cue.start - last.start >= 15))
      steps.push({ start: cue.start, cues: [cue] });
    else last.cues.push(cue);
  });
  return steps.map((step, i) => ({
    start: step.start,
    end: steps[i + 1]?.start ?? step.cues[step.cues.length - 1]!.end,
    title: titleFrom(
      step.cues
        .slice(0, 2)
        .map((c) => c.text)
        .join(' '),
    ),
    cautions: step.cues
      .filter((c) => danger.test(c.text.toLowerCase()))
      .map((c) => ({ t: c.start, text: c.text })),
  }));
}

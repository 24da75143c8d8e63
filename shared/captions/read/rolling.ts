import { type RawCue } from './blocks';
import { plainText } from './cue-text';

const folded = (line: string) => plainText(line).toLowerCase();

/** How many leading lines of a cue were already shown by the cue before it. */
function repeatedLines(before: readonly string[], lines: readonly string[]): number {
  const a = before.map(folded).filter((line) => line !== '');
  const b = lines.map(folded);
  for (let n = Math.min(a.length, b.length); n > 0; n -= 1) {
    if (b.slice(0, n).join('\n') === a.slice(-n).join('\n')) return n;
  }
  return 0;
}

/** How many leading words of a one-line cue repeat the end of the one before; none under four. */
function repeatedWords(before: string, text: string): number {
  const a = before.split(' ');
  const b = text.split(' ');
  for (let n = Math.min(a.length, b.length); n >= 4; n -= 1) {
    if (a.slice(-n).join(' ') === b.slice(0, n).join(' ')) return n;
  }
  return 0;
}

/**
 * Takes out what a rolling caption says again: lines shown by the cue before. A short line is taken for a
 * repeat only in a file that rolls, so that "again" said twice stays twice.
 */
export function mergeRolling(cues: readonly RawCue[]): RawCue[] {
  const shared = cues.map((cue, i) => {
    const before = cues[i - 1];
    if (!before || cue.start - (Number.isNaN(before.end) ? before.start + 5 : before.end) > 1)
      return 0;
    return repeatedLines(before.lines, cue.lines);
  });
  const rolls = shared.filter((n) => n > 0).length >= Math.max(2, cues.length * 0.2);
  return cues.map((cue, i) => {
    const before = cues[i - 1];
    const n = shared[i] ?? 0;
    const again = cue.lines.slice(0, n).join(' ').split(/\s+/).length;
    if (n > 0 && (rolls || again >= 4)) return { ...cue, lines: cue.lines.slice(n) };
    if (!rolls || !before || cue.start - before.end > 1) return cue;
    return dropWords(
      cue,
      repeatedWords(before.lines.map(folded).join(' '), cue.lines.map(folded).join(' ')),
    );
  });
}

function dropWords(cue: RawCue, n: number): RawCue {
  if (n === 0 || cue.lines.some((line) => line.includes('<'))) return cue;
  return { ...cue, lines: [cue.lines.join(' ').trim().split(/\s+/).slice(n).join(' ')] };
}

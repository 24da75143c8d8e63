import { stickFigures } from './figures';

/** Which marks may carry a number: every one, every fifth, every tenth. */
export function numberEvery(length: number, steps: number): 1 | 5 | 10 {
  const mean = steps > 0 ? Math.max(0, length - stickFigures.zeroEnd) / steps : Infinity;
  if (mean >= stickFigures.everyMark) return 1;
  return mean >= stickFigures.everyFifth ? 5 : 10;
}

export interface NumberedMark {
  /** px along the stick. */
  at: number;
  number: number;
  current: boolean;
}

/**
 * The numbers that are shown, by index of the mark: the first, the current, and by density every
 * one, fifth or tenth, none nearer than 17 px to the one before or to the current one.
 */
export function shownNumbers(marks: readonly NumberedMark[], every: 1 | 5 | 10): Set<number> {
  const shown = new Set<number>();
  const current = marks.findIndex((m) => m.current);
  const currentAt = marks[current]?.at;
  if (current >= 0) shown.add(current);
  let last = -Infinity;
  marks.forEach((mark, i) => {
    const wanted = i === 0 || every === 1 || mark.number % every === 0;
    if (i === current) {
      last = mark.at;
      return;
    }
    const clear =
      mark.at - last >= stickFigures.numberApart &&
      (currentAt === undefined || Math.abs(mark.at - currentAt) >= stickFigures.numberApart);
    if (!wanted || !clear) return;
    shown.add(i);
    last = mark.at;
  });
  return shown;
}

import { type StickStep } from './types';

const tenth = (seconds: number) => Math.round(seconds * 10) / 10;

export interface SnapOptions {
  /** Where captions start, seconds, in any order. */
  captionStarts: readonly number[];
  /** How near a caption's start takes hold, in seconds (some px of the stick). */
  reach: number;
  /** Shift held: tenths of a second only. */
  fine: boolean;
}

/** A dragged mark's time: the nearest caption's start within reach, else (and with Shift) the nearest tenth. */
export function snapTime(seconds: number, { captionStarts, reach, fine }: SnapOptions): number {
  if (!fine) {
    let best: number | undefined;
    for (const start of captionStarts) {
      if (Math.abs(start - seconds) > reach) continue;
      if (best === undefined || Math.abs(start - seconds) < Math.abs(best - seconds)) best = start;
    }
    if (best !== undefined) return best;
  }
  return tenth(seconds);
}

/** Least length of a step, seconds. */
const leastStep = 0.1;

/** The span a step's mark may be moved in: between its neighbours' marks, inside the clip. */
export function markRange(
  steps: readonly StickStep[],
  id: string,
  duration: number,
): { from: number; to: number } {
  const i = steps.findIndex((s) => s.id === id);
  const before = steps[i - 1];
  const after = steps[i + 1];
  const from = before ? tenth(before.start + leastStep) : 0;
  const to = after ? tenth(after.start - leastStep) : duration;
  return { from: Math.min(from, to), to: Math.max(from, to) };
}

/** A mark's time nudged by arrow keys: 0.1 s, with Shift 1 s, kept in its range. */
export function nudgeMark(
  step: StickStep,
  direction: -1 | 1,
  coarse: boolean,
  range: { from: number; to: number },
): number {
  const moved = tenth(step.start + direction * (coarse ? 1 : 0.1));
  return Math.min(range.to, Math.max(range.from, moved));
}

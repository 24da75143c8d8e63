import { stickFigures } from './figures';
import { type StickInput, type StickStep } from './types';

/** The stick's linear scale: seconds to px along the body, from the outside of the zero end. */
export interface StickScale {
  length: number;
  duration: number;
  /** px of a time; times outside the stick land on its ends. */
  at: (seconds: number) => number;
  /** Seconds of a place in px. */
  timeAt: (px: number) => number;
}

/** A scale for a body of `length` px. A stick without duration puts everything at its zero. */
export function stickScale(length: number, duration: number): StickScale {
  const run = Math.max(0, length - stickFigures.zeroEnd);
  const whole = Number.isFinite(duration) && duration > 0 ? duration : 0;
  const clamp = (t: number) => Math.min(whole, Math.max(0, Number.isFinite(t) ? t : 0));
  return {
    length,
    duration: whole,
    at: (seconds) => stickFigures.zeroEnd + (whole ? (clamp(seconds) / whole) * run : 0),
    timeAt: (px) => (run ? clamp(((px - stickFigures.zeroEnd) / run) * whole) : 0),
  };
}

/** The step a time lies in: the last that has begun, or the first. */
export function stepAtTime(steps: readonly StickStep[], seconds: number): StickStep | undefined {
  return steps.findLast((s) => s.start <= seconds) ?? steps[0];
}

/** The step in hand: the current one, else the first that is open, else the last. */
export function currentStep(input: StickInput): StickStep | undefined {
  const { steps } = input;
  return (
    steps.find((s) => s.state === 'current') ??
    steps.find((s) => s.state === 'open') ??
    steps.at(-1)
  );
}

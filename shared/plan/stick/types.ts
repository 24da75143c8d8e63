/** A verdict as it hangs on the stick: holds, at risk, fails, needs a reading, too close to call. */
export type StickVerdict = 'holds' | 'risk' | 'fails' | 'need' | 'close';

/** How far a step is. */
export type StickStepState = 'done' | 'current' | 'open';

/** One step of the stick. All times are seconds from the stick's zero end. */
export interface StickStep {
  id: string;
  /** As counted from 1. */
  number: number;
  title: string;
  start: number;
  end: number;
  state: StickStepState;
  /** Carries the square under its long mark. */
  failing?: boolean;
  /** Dimensions to hold in this step, where they are spoken of. */
  verdicts: readonly { at: number; verdict: StickVerdict }[];
  /** Waits; `left` is the time left in seconds while it runs. */
  waits: readonly { at: number; running?: boolean; left?: number }[];
  /** Talk hanging here, with its count. */
  talk: readonly { at: number; count: number }[];
}

/** What a stick is drawn from: a clip's length (or the hands-on time) and the steps in order. */
export interface StickInput {
  /** Seconds. */
  duration: number;
  steps: readonly StickStep[];
}

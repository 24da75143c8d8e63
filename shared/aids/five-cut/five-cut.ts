import { z } from 'zod';
import { defineAid } from '../aid';
import { refused, type Outcome } from '../outcome';

const width = z.number().positive().max(1_000);
/** One reading or several at the same place. */
const readings = z.union([width, z.array(width).min(1).max(20)]);

export const fiveCutInput = z.object({
  /** Width of the strip, square to the fresh edge: at the end that was at the fence, and at the other, mm. */
  fenceEnd: readings,
  otherEnd: readings,
  /** Along the strip between the two places, mm. */
  stripLength: z.number().positive().max(5_000),
  /** From the pivot of the fence to where it is moved, mm. */
  pivot: z.number().positive().max(5_000),
  /** Which end of the fence stands still: the one at the blade, or the outer one. */
  pivotAt: z.enum(['blade', 'outer']).default('blade'),
  /** The instrument reads true to ± this, mm. */
  instrument: z.number().min(0).max(2).default(0.025),
  /** The fence can be set to ± this where it is moved, mm. */
  setting: z.number().min(0).max(2).default(0.01),
  /** How true the fence shall be: ± this over this length, mm. */
  goal: z.number().positive().max(10).default(0.03),
  goalOver: z.number().positive().max(5_000).default(700),
});
export type FiveCutInput = z.output<typeof fiveCutInput>;

export interface FiveCutResult {
  /** Corner of the board less 90°, in degrees; positive: it comes out obtuse. */
  angle: number;
  /** The same over the length of the goal, and at the place where the fence is moved, mm. */
  overGoal: number;
  correction: number;
  /** 95 % of measurements lie within ± this of the true error: over the goal's length, and where it is moved, mm. */
  overGoalUncertainty: number;
  correctionUncertainty: number;
  move: FenceMove | null;
  /** `true`: within the goal for sure. `move`: set the fence and cut again. `swamped`: the error drowns in the reading. */
  verdict: 'true' | 'move' | 'swamped';
  /** ± over the goal's length that this board, instrument and setting reach in 95 of 100, mm; and whether that does. */
  reach: number;
  reachable: boolean;
  /** What would reach the goal: readings at each place with this board, or a strip of this length; null: setting alone is too coarse. */
  needed: { readings: number | null; stripLength: number | null } | null;
  /** Trim on the fifth cut below which the strip runs out to a point at this error, mm. */
  leastTrim: number;
}

export interface FenceMove {
  end: 'outer' | 'blade';
  direction: 'towards-the-board' | 'away-from-the-board';
  /** Where the fence is moved, mm. */
  by: number;
}

/** 95 % of a normal spread lie within this many standard deviations. */
const coverage = 1.96;
/** Most readings at one place that are worth a person's while. */
const mostReadings = 20;

const list = (r: number | number[]) => (typeof r === 'number' ? [r] : r);
const mean = (values: readonly number[]) => values.reduce((a, b) => a + b, 0) / values.length;

/** Standard uncertainty of a ± that says nothing else: a rectangle's, ±/√3 (GUM 4.3.7, from memory). */
const standard = (plusMinus: number) => plusMinus / Math.sqrt(3);

/**
 * ε = ¼ · atan((w_F − w_R)/L): corners of cuts 2, 3 and 4 are each 90 + ε, so the fourth is 90 − 3ε before the fifth cut
 * makes it 90 + ε; the strip is a wedge of 4ε (elementary geometry; proven by simulation in the tests). Positive: fatter
 * at the fence.
 *
 * @returns the angle in radians
 */
export const fenceError = (fenceEnd: number, otherEnd: number, stripLength: number): number =>
  Math.atan((fenceEnd - otherEnd) / stripLength) / 4;

/** Standard uncertainty of the angle in radians: two widths, each the mean of n readings. */
const angleUncertainty = (instrument: number, n: number, stripLength: number): number =>
  (Math.SQRT2 * standard(instrument)) / Math.sqrt(n) / (4 * stripLength);

/** ± over a length that a round of measuring and setting leaves in 95 of 100. */
export function reachOf(
  { instrument, setting, goalOver, pivot }: FiveCutInput,
  n: number,
  stripLength: number,
): number {
  const measured = angleUncertainty(instrument, n, stripLength) * goalOver;
  const set = standard(setting) * (goalOver / pivot);
  return coverage * Math.hypot(measured, set);
}

/** More readings, or a longer strip, until the goal is reached; null where the setting alone misses it. */
function neededFor(input: FiveCutInput, n: number): FiveCutResult['needed'] {
  const set = coverage * standard(input.setting) * (input.goalOver / input.pivot);
  if (set >= input.goal) return { readings: null, stripLength: null };
  let count = n;
  while (count <= mostReadings && reachOf(input, count, input.stripLength) > input.goal) count += 1;
  const room = Math.sqrt(input.goal ** 2 - set ** 2) / coverage;
  const strip = (angleUncertainty(input.instrument, n, 1) * input.goalOver) / room;
  return {
    readings: count <= mostReadings ? count : null,
    stripLength: Math.ceil(strip / 10) * 10,
  };
}

/**
 * Which way the fence goes. An obtuse corner is closed: with the blade's end standing still the outer end goes towards
 * the board; with the outer end standing still the blade's end goes away from it.
 */
function moveOf(correction: number, pivotAt: FiveCutInput['pivotAt']): FenceMove {
  const outer = pivotAt === 'blade';
  return {
    end: outer ? 'outer' : 'blade',
    direction: correction > 0 === outer ? 'towards-the-board' : 'away-from-the-board',
    by: Math.abs(correction),
  };
}

/** The error of a fence from the strip of the fifth cut, how sure it is, and what to do. */
export function workFiveCut(input: FiveCutInput): Outcome<FiveCutResult> {
  const { stripLength, pivot, goal, goalOver, instrument } = input;
  const [fence, other] = [list(input.fenceEnd), list(input.otherEnd)];
  const angle = fenceError(mean(fence), mean(other), stripLength);
  if (Math.abs(angle) > (2 * Math.PI) / 180)
    return refused(
      'fenceEnd',
      'A fence so far out (more than 2°) is set by a square first.',
      'Set it to a square, then cut again. Check that both widths are of one strip.',
    );
  const n = Math.min(fence.length, other.length);
  const spread = coverage * angleUncertainty(instrument, n, stripLength);
  const overGoal = goalOver * Math.tan(angle);
  const overGoalUncertainty = goalOver * spread;
  const correction = pivot * Math.tan(angle);
  const reach = reachOf(input, n, stripLength);
  const size = Math.abs(overGoal);
  const verdict =
    size + overGoalUncertainty <= goal ? 'true' : size > overGoalUncertainty ? 'move' : 'swamped';
  return {
    ok: true,
    result: {
      angle: (angle * 180) / Math.PI,
      overGoal,
      correction,
      overGoalUncertainty,
      correctionUncertainty: pivot * spread,
      // An error that is no more than the reading's own is left alone: to set by it makes the fence worse as often as better.
      move: verdict === 'move' ? moveOf(correction, input.pivotAt) : null,
      verdict,
      reach,
      reachable: reach <= goal,
      needed: reach <= goal ? null : neededFor(input, n),
      leastTrim: 4 * Math.abs(Math.tan(angle)) * stripLength,
    },
  };
}

/** The aid that squares a fence. */
export const fiveCutAid = defineAid({
  id: 'five-cut',
  title: 'Squaring a fence by five cuts',
  what: 'The error of a crosscut fence from one board cut five times, which end to move, which way and how far.',
  sources:
    'Elementary geometry: the strip of the fifth cut is a wedge of four times the error; uncertainty as the GUM adds it.',
  caution:
    'Guard and riving knife on. Keep hands out of the line of the blade, let it stop before you reach for the strip, unplug the saw to set the fence. The machine’s manual comes first.',
  example: { fenceEnd: 12, otherEnd: 10.7, stripLength: 372, pivot: 600 },
  input: fiveCutInput,
  work: workFiveCut,
});

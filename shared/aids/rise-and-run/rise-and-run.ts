import { z } from 'zod';
import { defineAid } from '../aid';
import { refused, type Outcome } from '../outcome';

export const riseAndRunInput = z.object({
  /** Straight up (or across), mm; below zero it leans the other way. */
  rise: z.number().min(-100_000).max(100_000),
  /** Along, mm. */
  run: z.number().min(0.1).max(100_000),
  /** Of each reading, mm. */
  uncertainty: z.number().min(0).max(10).default(0.25),
});

export interface RiseAndRunResult {
  /** Degrees from the run, and from the rise (a saw's scale may show either). */
  angle: number;
  complement: number;
  /** Degrees either way. */
  uncertainty: number;
  /** mm along the slope. */
  slope: number;
  /** 1 in so many; null when level. */
  oneIn: number | null;
}

const degrees = (radians: number) => (radians * 180) / Math.PI;

/** An angle from what it rises over a run, with its uncertainty (elementary geometry). */
export function workRiseAndRun(input: z.output<typeof riseAndRunInput>): Outcome<RiseAndRunResult> {
  const { rise, run, uncertainty: u } = input;
  if (u * 2 >= Math.hypot(rise, run))
    return refused(
      'run',
      'The measuring error is as large as what is measured.',
      'Measure over a longer run, or with a finer instrument.',
    );
  const slope = Math.hypot(rise, run);
  const angle = degrees(Math.atan2(rise, run));
  return {
    ok: true,
    result: {
      angle,
      complement: 90 - Math.abs(angle),
      // Both readings at their own u: dθ = √((run u)² + (rise u)²) / slope² = u / slope.
      uncertainty: degrees(u / slope),
      slope,
      oneIn: Math.abs(rise) < 1e-6 ? null : Math.abs(run / rise),
    },
  };
}

/** The aid "Angle by rise and run". */
export const riseAndRunAid = defineAid({
  id: 'rise-and-run',
  title: 'Angle by rise and run',
  what: 'An angle from what it rises over a length, to set a blade or a gauge by.',
  sources: 'Geometry, computed.',
  caution: 'Unplug before you measure at the blade.',
  example: { rise: 15, run: 500 },
  input: riseAndRunInput,
  work: workRiseAndRun,
});

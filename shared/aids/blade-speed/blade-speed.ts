import { z } from 'zod';
import { rimSpeed, smallestBlade } from '../../trade/saws';
import { defineAid } from '../aid';
import { refused, type Outcome } from '../outcome';

export const bladeSpeedInput = z.object({
  /** Blade, disc or bit, mm. */
  diameter: z.number(),
  /** What the arbor turns at without load, rev/min. */
  rpm: z.number(),
  /** The greatest speed marked on the blade, rev/min. */
  marked: z.number().positive().max(100_000).optional(),
  /** Largest blade the machine takes, mm. */
  largest: z.number().positive().max(1_000).optional(),
});

export interface BladeSpeedResult {
  /** Speed of the teeth. */
  metresPerSecond: number;
  feetPerMinute: number;
  verdict: 'under' | 'over' | 'no-mark';
  /** rev/min that are left under the mark; below zero, over it. */
  margin: number | null;
  size: 'fits' | 'too-large' | 'too-small' | null;
}

const sizes = [3, 1_000] as const;
const speeds = [50, 60_000] as const;
/** Rim speeds of hobby and joinery machines stay far under this; more is a slip of a unit. Common practice, no source. */
const fastest = 200;

/** Speed of the teeth, and the machine's turning speed against the greatest marked on the blade. */
export function workBladeSpeed(input: z.output<typeof bladeSpeedInput>): Outcome<BladeSpeedResult> {
  const { diameter, rpm, marked, largest } = input;
  if (!(diameter >= sizes[0] && diameter <= sizes[1]))
    return refused('diameter', 'From 3 to 1000 mm across.', 'Check the unit.');
  if (!(rpm >= speeds[0] && rpm <= speeds[1]))
    return refused('rpm', 'From 50 to 60 000 turns a minute.', 'Read the machine’s plate.');
  const metresPerSecond = rimSpeed(diameter, rpm);
  if (metresPerSecond > fastest)
    return refused(
      'rpm',
      `Teeth at ${Math.round(metresPerSecond)} m/s: no wood-cutting machine runs so.`,
      'Check diameter and turns again, do not start it.',
    );
  return {
    ok: true,
    result: {
      metresPerSecond,
      feetPerMinute: (metresPerSecond * 60) / 0.3048,
      verdict: marked === undefined ? 'no-mark' : rpm > marked ? 'over' : 'under',
      margin: marked === undefined ? null : marked - rpm,
      size:
        largest === undefined
          ? null
          : diameter > largest
            ? 'too-large'
            : diameter < smallestBlade * largest - 1e-9
              ? 'too-small'
              : 'fits',
    },
  };
}

/** The aid "Speed of a blade". */
export const bladeSpeedAid = defineAid({
  id: 'blade-speed',
  title: 'Speed of a blade',
  what: 'Speed of the teeth, and the machine against the greatest speed marked on the blade.',
  sources:
    'v = π D N/60, computed; never over the mark: WAC 296-78-70509(5); smallest blade 60 % of the largest: HSE, circular saw bench.',
  caution:
    'Never run a blade over its mark, or one without a mark. The machine’s manual decides which blades it takes.',
  example: { diameter: 250, rpm: 4500, marked: 7000 },
  input: bladeSpeedInput,
  work: workBladeSpeed,
});

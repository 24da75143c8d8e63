import { z } from 'zod';
import { defineAid } from '../aid';
import { refused, type Outcome } from '../outcome';

const length = z.number().positive().max(1_000_000);

export const arcInput = z.object({
  /** Straight from end to end, mm. */
  chord: length,
  /** Height in the middle, mm; or the radius, one of the two. */
  rise: length.optional(),
  radius: length.optional(),
  /** Ordinates asked for, over half of the chord and the other half alike. */
  points: z.number().int().min(2).max(100).default(10),
});

export interface ArcResult {
  radius: number;
  rise: number;
  /** Along the arc, and the angle it turns through. */
  arcLength: number;
  angle: number;
  /** Height above the chord at equal steps from end to end, mm. */
  ordinates: { x: number; y: number }[];
}

/** R = c²/(8s) + s/2 and back s = R − √(R² − c²/4), the lesser arc: 0 < s ≤ c/2 (elementary geometry). */
export function workArc(input: z.output<typeof arcInput>): Outcome<ArcResult> {
  const { chord, points } = input;
  if ((input.rise === undefined) === (input.radius === undefined))
    return refused('rise', 'Give the rise or the radius, one of the two.', 'Leave the other out.');
  if (input.radius !== undefined && input.radius < chord / 2)
    return refused(
      'radius',
      'A circle of this radius is narrower than the chord.',
      'Take at least half of the chord.',
    );
  if (input.rise !== undefined && input.rise > chord / 2)
    return refused(
      'rise',
      'Higher than a half circle over this chord.',
      'Take at most half of the chord.',
    );
  const half = chord / 2;
  // R − √(R² − h²) loses all its digits on a flat arc; h²/(R + √(R² − h²)) is the same without the difference.
  const rise =
    input.rise ??
    half ** 2 / ((input.radius ?? half) + Math.sqrt((input.radius ?? half) ** 2 - half ** 2));
  const radius = input.radius ?? chord ** 2 / (8 * rise) + rise / 2;
  const angle = 2 * Math.atan2(half, radius - rise);
  const height = (x: number) => {
    const off = x - half;
    const drop = off ** 2 / (radius + Math.sqrt(Math.max(0, radius ** 2 - off ** 2)));
    return Math.max(0, rise - drop);
  };
  return {
    ok: true,
    result: {
      radius,
      rise,
      arcLength: radius * angle,
      angle: (angle * 180) / Math.PI,
      ordinates: Array.from({ length: points + 1 }, (_, i) => {
        const x = (chord * i) / points;
        return { x, y: height(x) };
      }),
    },
  };
}

/** The aid that lays out an arc from its chord. */
export const arcAid = defineAid({
  id: 'arc',
  title: 'Arc over a chord',
  what: 'Radius from chord and rise, or rise from the radius, with heights to bend a batten through.',
  sources: 'Elementary geometry of the circle (sagitta).',
  example: { chord: 1000, rise: 50 },
  input: arcInput,
  work: workArc,
});

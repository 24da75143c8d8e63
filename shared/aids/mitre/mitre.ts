import { z } from 'zod';
import { defineAid } from '../aid';
import { refused, type Outcome } from '../outcome';

export const mitreInput = z.object({
  /** Equal sides of the frame, box or column. */
  sides: z.number().int().min(3).max(100),
  /** Of each side from horizontal, degrees: 90 stands upright (a box), 0 lies flat (a frame). */
  slope: z.number().default(0),
  /** Across the flats, or across the points, mm: gives the length of a side. */
  acrossFlats: z.number().positive().max(100_000).optional(),
  acrossPoints: z.number().positive().max(100_000).optional(),
});

export interface MitreResult {
  /** Turn of the mitre gauge and tilt of the blade, both from a square cut, degrees. */
  mitre: number;
  bevel: number;
  /** Between the faces of two sides that meet, degrees. */
  dihedral: number;
  /** Inside the corner of the plan, degrees. */
  corner: number;
  /** Length of one side outside, mm; null where no size is given. */
  side: number | null;
  /** What one corner's error of 0.1° on every cut opens the last joint by, degrees. */
  closing: number;
}

const degrees = Math.PI / 180;

/**
 * tan M = cos α · tan(180°/n), sin B = sin α · sin(180°/n), dihedral 180° − 2B: n equal sides, mitred, inclined α from
 * horizontal (elementary geometry; proven against vectors in the tests).
 */
export function workMitre(input: z.output<typeof mitreInput>): Outcome<MitreResult> {
  const { sides, slope, acrossFlats, acrossPoints } = input;
  if (!(slope >= 0 && slope <= 90))
    return refused('slope', 'A side slopes 0 to 90° from horizontal.', 'Give it from horizontal.');
  if (acrossFlats !== undefined && acrossPoints !== undefined)
    return refused(
      'acrossFlats',
      'Give one size: across the flats or the points.',
      'Leave one out.',
    );
  const half = Math.PI / sides;
  const alpha = slope * degrees;
  const bevel = Math.asin(Math.sin(alpha) * Math.sin(half)) / degrees;
  const across =
    acrossFlats === undefined
      ? acrossPoints === undefined
        ? null
        : acrossPoints * Math.sin(half)
      : acrossFlats * Math.tan(half);
  return {
    ok: true,
    result: {
      mitre: Math.atan(Math.cos(alpha) * Math.tan(half)) / degrees,
      bevel,
      dihedral: 180 - 2 * bevel,
      corner: 180 - 360 / sides,
      side: across,
      closing: 2 * sides * 0.1,
    },
  };
}

/** The aid for mitred frames, boxes and columns. */
export const mitreAid = defineAid({
  id: 'mitre',
  title: 'Mitres, plain and compound',
  what: 'Mitre and bevel for any number of equal sides, upright, flat or sloping, and the length of a side.',
  sources: 'Elementary geometry; settings are from a square cut.',
  caution:
    'Cut a trial corner in scrap first. Hold short pieces in a jig or clamp, not by hand; keep the guard on.',
  example: { sides: 4, slope: 60 },
  input: mitreInput,
  work: workMitre,
});

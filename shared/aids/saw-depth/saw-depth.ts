import { z } from 'zod';
import { chord, fullHeight, tilted } from '../../trade/saws';
import { defineAid } from '../aid';
import { refused, type Outcome } from '../outcome';

export const sawDepthInput = z.object({
  /** Blade, mm. */
  diameter: z.number().positive().max(1_000),
  /** Centre of the arbor below the table at full height, mm. */
  arborBelow: z.number().min(0).max(500),
  /** What the work rests on above the table, mm; 0 for the bare table. */
  base: z.number().min(0).max(500).default(0),
  /** Tilt of the blade, degrees from upright. */
  bevel: z.number().default(0),
  /** What is to be cut through, mm. */
  stock: z.number().positive().max(500).optional(),
  /** How sure the measures are, together, mm. */
  uncertainty: z.number().min(0).max(10).default(0.5),
});

export interface SawDepthResult {
  /** Blade above the table at full height, along the blade, mm. */
  full: number;
  /** Straight up above the table at this tilt, and above the base, mm. */
  upright: number;
  left: number;
  uncertainty: number;
  /** Length of the blade at the table and at the face of the base, at full height, mm. */
  chordAtTable: number;
  chordAtBase: number;
  /** Cuts through the stock for sure, not at all, or within the uncertainty. */
  verdict: 'through' | 'near' | 'short' | null;
}

const bevels = [0, 60] as const;

/** Depth of cut that is left above a base that carries the work, and the length of the slot the blade makes. */
export function workSawDepth(input: z.output<typeof sawDepthInput>): Outcome<SawDepthResult> {
  const { diameter, arborBelow, base, bevel, stock, uncertainty } = input;
  if (!(bevel >= bevels[0] && bevel <= bevels[1]))
    return refused('bevel', 'Blades tilt 0 to 60 degrees from upright.', 'Give the tilt itself.');
  const full = fullHeight(diameter, arborBelow);
  if (full <= 0)
    return refused(
      'arborBelow',
      'So far below the table this blade does not come through it.',
      'Measure from the table to the middle of the arbor at full height.',
    );
  const upright = tilted(full, bevel);
  const left = upright - base;
  if (left <= 0)
    return refused(
      'base',
      'The base takes all of the depth: no tooth shows above it.',
      'Use a thinner base or upright blade.',
    );
  const along = full - base / Math.cos((bevel * Math.PI) / 180);
  return {
    ok: true,
    result: {
      full,
      upright,
      left,
      uncertainty,
      chordAtTable: chord(diameter, full),
      chordAtBase: chord(diameter, along),
      verdict:
        stock === undefined
          ? null
          : left - uncertainty > stock
            ? 'through'
            : left + uncertainty < stock
              ? 'short'
              : 'near',
    },
  };
}

/** The aid "Depth of cut". */
export const sawDepthAid = defineAid({
  id: 'saw-depth',
  title: 'Depth of cut',
  what: 'Depth that is left above a base, upright and tilted, and the blade’s length in the face.',
  sources: 'Geometry of a circle, computed.',
  caution:
    'Guard, riving knife and the machine’s manual come first; a cut that does not go through wants other guards. Unplug before you measure at the blade.',
  example: { diameter: 254, arborBelow: 50, base: 18, bevel: 0, stock: 50 },
  input: sawDepthInput,
  work: workSawDepth,
});

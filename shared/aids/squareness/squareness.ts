import { z } from 'zod';
import { defineAid } from '../aid';
import { refused, type Outcome } from '../outcome';

const side = z.number().positive().max(100_000);

export const squarenessInput = z.object({
  /** Sides that meet, as measured, mm; the sides across from them must be equal. */
  a: side,
  b: side,
  /** Diagonals, mm. */
  d1: side,
  d2: side,
  /** The tape reads true to ± this, mm. */
  instrument: z.number().min(0).max(50).default(0.5),
});

export interface SquarenessResult {
  /** 90° less the corner at either end of the first diagonal, degrees: positive where that one is the longer. */
  angle: number;
  uncertainty: number;
  /** What the corner is out at the end of side b, mm. */
  overB: number;
  /** What both diagonals are when it is square, mm. */
  diagonal: number;
  /** Push the ends of the longer diagonal together until it is shorter by this, mm. */
  shorten: number;
  longer: 'd1' | 'd2' | 'neither';
  /** Whether sides and diagonals belong together: d₁² + d₂² = 2(a² + b²) of a parallelogram, mm off. */
  mismatch: number;
  verdict: 'square' | 'out' | 'within-reading';
}

/**
 * Out of square from the diagonals: sin δ = (d₁² − d₂²)/(4ab) of a parallelogram (elementary geometry). Only true where
 * opposite sides are equal; sides and diagonals that do not belong together are refused.
 */
export function workSquareness(input: z.output<typeof squarenessInput>): Outcome<SquarenessResult> {
  const { a, b, d1, d2, instrument } = input;
  const sine = (d1 ** 2 - d2 ** 2) / (4 * a * b);
  const mean = Math.sqrt((d1 ** 2 + d2 ** 2) / 2);
  const diagonal = Math.hypot(a, b);
  const mismatch = mean - diagonal;
  const slack = Math.max(4 * instrument, 0.002 * diagonal);
  if (Math.abs(mismatch) > slack)
    return refused(
      'd1',
      'These diagonals do not belong to these sides.',
      'Measure all four sides: opposite ones must be equal for the diagonals to tell.',
    );
  if (Math.abs(sine) > 0.35)
    return refused('d1', 'More than 20° out of square.', 'Set it by a square first.');
  const delta = Math.asin(sine);
  // Each diagonal's ± moves sin δ by d/(2ab); the two add as squares, 95 of 100.
  const spread = (1.96 * (instrument / Math.sqrt(3)) * Math.hypot(d1, d2)) / (2 * a * b);
  const size = Math.abs(delta);
  return {
    ok: true,
    result: {
      angle: (delta * 180) / Math.PI,
      uncertainty: (spread * 180) / Math.PI,
      overB: b * Math.sin(delta),
      diagonal,
      shorten: Math.max(d1, d2) - mean,
      longer: d1 === d2 ? 'neither' : d1 > d2 ? 'd1' : 'd2',
      mismatch,
      verdict: size === 0 ? 'square' : size <= spread ? 'within-reading' : 'out',
    },
  };
}

/** The aid that squares a carcase or a frame by its diagonals. */
export const squarenessAid = defineAid({
  id: 'squareness',
  title: 'Square by the diagonals',
  what: 'How far a frame is out of square, and which diagonal to shorten by how much.',
  sources: 'Elementary geometry of the parallelogram.',
  example: { a: 800, b: 600, d1: 1001, d2: 999 },
  input: squarenessInput,
  work: workSquareness,
});

import { z } from 'zod';
import { defineAid } from '../aid';
import { refused, type Outcome } from '../outcome';

const mm = z.number().positive().max(100_000);

export const taperInput = z.object({
  /** Along the piece, mm. */
  length: mm.optional(),
  /** What it gets narrower by over that length, in all, mm. */
  narrower: mm.optional(),
  /** Tapered on one side, or half of it on each. */
  faces: z.enum(['one', 'both']).default('one'),
  /** Instead: a slope of 1 in this many, as dovetails are spoken of. */
  oneIn: z.number().positive().max(1000).optional(),
});

export interface TaperResult {
  /** Of one face against the axis, and between both faces, degrees. */
  perFace: number;
  included: number;
  /** The slope as 1 in so many, per face. */
  oneIn: number;
}

const degrees = Math.PI / 180;

/** atan(d/L) of a taper on one face, 2·atan(d/2L) between two, atan(1/k) of a dovetail (elementary geometry). */
export function workTaper(input: z.output<typeof taperInput>): Outcome<TaperResult> {
  const { length, narrower, faces, oneIn } = input;
  const bySlope = oneIn !== undefined;
  if (bySlope === (length !== undefined || narrower !== undefined))
    return refused(
      'length',
      'Give length and narrowing, or the slope as 1 in so many.',
      'Leave the other out.',
    );
  if (!bySlope && (length === undefined || narrower === undefined))
    return refused(
      length === undefined ? 'length' : 'narrower',
      'One of the two is missing.',
      'Give both.',
    );
  const rise = bySlope ? 1 / oneIn : (narrower ?? 0) / (length ?? 1) / (faces === 'both' ? 2 : 1);
  const perFace = Math.atan(rise) / degrees;
  return {
    ok: true,
    result: { perFace, included: faces === 'both' ? 2 * perFace : perFace, oneIn: 1 / rise },
  };
}

/** The aid for tapered legs and dovetails. */
export const taperAid = defineAid({
  id: 'taper',
  title: 'Tapers and dovetail slopes',
  what: 'The angle of a taper on one or both faces, or of a dovetail of 1 in so many.',
  sources:
    'Elementary geometry. 1 in 6 for softwood and 1 in 8 for hardwood dovetails are common practice, no source.',
  caution: 'Taper legs in a jig with hold-downs; never freehand against a fence.',
  example: { length: 500, narrower: 15 },
  input: taperInput,
  work: workTaper,
});

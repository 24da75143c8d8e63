import { z } from 'zod';
import { defineAid } from '../aid';
import { refused, type Outcome } from '../outcome';

/** Lengths are worked out in steps of 0.0001 mm, in which every 64th of an inch (0.396875) and 0.001 mm stand exactly. */
const steps = 1_000_000;
const exact = (mm: number) => Math.round(mm * steps);

export const repeatedCutsInput = z.object({
  /** Length of a piece, mm. */
  piece: z.number().positive().max(20_000),
  /** As measured in scrap, mm. */
  kerf: z.number().min(0).max(20).default(3.2),
  stock: z.number().positive().max(50_000),
  /** Sawn off the stock's ends first, mm, the cut included. */
  trim: z.number().min(0).max(5_000).default(0),
  /** Pieces wanted; left out, as many as there are. */
  wanted: z.number().int().positive().max(100_000).optional(),
  /** The stop is off by this, mm (one reading). */
  stopOff: z.number().min(-10).max(10).default(0),
  /** Shortest stock that can be held safely at the machine, mm. */
  hold: z.number().min(0).max(2_000).default(300),
});

export interface RepeatedCutsResult {
  /** Pieces the stock gives, and how many of those wanted are missing. */
  pieces: number;
  missing: number;
  /** Left after the last piece, mm; and what is left if that is sawn off as well. */
  left: number;
  offcut: number;
  /** From the blade's near side to the stop, and from its far side. */
  stopFromNear: number;
  stopFromFar: number;
  /** One piece's error, and that of all pieces laid end to end, mm. */
  pieceError: number;
  runningError: number;
  /** The first piece whose stock is too short to hold when it is cut, counted from 1; null when none is. */
  tooShortAt: number | null;
}

/**
 * n = ⌊(L + k)/(p + k)⌋ pieces with kerfs between them, in exact steps, so that a fit with nothing left over does not
 * fail; the ends' trim comes off first (the elementary layout of cuts with a kerf, worked by hand for the test's rows).
 */
export function workRepeatedCuts(
  input: z.output<typeof repeatedCutsInput>,
): Outcome<RepeatedCutsResult> {
  const { kerf, trim, wanted, stopOff, hold } = input;
  const piece = input.piece + stopOff;
  if (piece <= 0)
    return refused('stopOff', 'The stop is off by more than the piece.', 'Check the sign.');
  const [p, k, stock] = [exact(piece), exact(kerf), exact(input.stock - trim)];
  if (p + k < steps / 100)
    return refused('piece', 'Pieces so short cannot be sawn.', 'Check the unit of the length.');
  if (stock < p)
    return refused(
      'stock',
      'The stock is shorter than one piece once its ends are trimmed.',
      'Take a longer piece of stock or a shorter piece.',
    );
  const fits = Math.floor((stock + k) / (p + k));
  const pieces = Math.min(fits, wanted ?? fits);
  const left = stock - pieces * p - Math.max(0, pieces - 1) * k;
  // What is in the hands at the cut of piece j: the stock less the pieces and kerfs before it.
  const short = Math.floor((stock - exact(hold)) / (p + k)) + 1;
  const tooShortAt = stock < exact(hold) ? 1 : short + 1 <= pieces ? short + 1 : null;
  return {
    ok: true,
    result: {
      pieces,
      missing: (wanted ?? pieces) - pieces,
      left: left / steps,
      offcut: Math.max(0, left - k) / steps,
      stopFromNear: input.piece,
      stopFromFar: (exact(input.piece) + k) / steps,
      pieceError: stopOff,
      runningError: (pieces * exact(stopOff)) / steps,
      tooShortAt,
    },
  };
}

export const repeatedCutsAid = defineAid({
  id: 'repeated-cuts',
  title: 'Repeated cuts at a stop',
  what: 'How many pieces a stock gives at one stop setting, what is left, when it gets too short to hold.',
  sources:
    'Elementary geometry of cuts with a kerf. The shortest stock to hold is common practice; the machine’s manual says its own.',
  caution:
    'Never use the rip fence as the stop for a crosscut: the piece is trapped and thrown. Clamp a block that the work leaves before it reaches the blade.',
  example: { piece: 300, stock: 2440, kerf: 3.2, trim: 10 },
  input: repeatedCutsInput,
  work: workRepeatedCuts,
});

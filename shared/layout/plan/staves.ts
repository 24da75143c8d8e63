import { type JobPiece } from './types';

/** Added to each stave of a panel, mm: its two edges jointed, its ends cut back after the glue. Common practice, no source. */
export const staveAllowance = { edge: 3, end: 20 } as const;

/**
 * A part wider than every board, as staves to be glued edge to edge: as few as the widest board allows, all of one width.
 * The part itself when it fits, or when no stave of the board's width would be left over its allowance.
 */
export function stavesOf(
  piece: JobPiece,
  widest: number | null,
  allowance: { edge: number; end: number } = staveAllowance,
): JobPiece {
  if (widest === null || piece.width <= widest + 1e-6 || piece.turn) return piece;
  const each = widest - allowance.edge;
  if (each <= 0) return piece;
  const staves = Math.ceil(piece.width / each - 1e-9);
  return {
    ...piece,
    name: `${piece.name}, stave`,
    length: piece.length + allowance.end,
    width: piece.width / staves + allowance.edge,
    quantity: piece.quantity * staves,
    staves,
  };
}

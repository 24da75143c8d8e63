import { type MachineLimits } from './types';

/**
 * May this machine make the cut? Along the longer side it is a rip: the narrower of both pieces lies between fence and
 * blade. Across the longer side it is a crosscut, as long as the shorter side. Either way the longer side must be long
 * enough to hold.
 */
export function machineAllows(
  limits: MachineLimits | undefined,
  piece: { w: number; h: number },
  axis: 'x' | 'y',
  setting: number,
  rest: number,
): boolean {
  if (limits === undefined) return true;
  const { rip = Infinity, crosscut = Infinity, hold = 0 } = limits;
  const [run, across] = axis === 'x' ? [piece.h, piece.w] : [piece.w, piece.h];
  if (Math.max(run, across) < hold) return false;
  return run >= across ? Math.min(setting, Math.max(0, rest)) <= rip : run <= crosscut;
}

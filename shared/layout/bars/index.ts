/** Boards, strips and rod: pieces laid out in one dimension, with kerf, end trim, several lengths, prices and limited stock. Pure. */
export { solveBars } from './solve';
export { verifyBars } from './verify';
export {
  barInstanceSchema,
  barJobOf,
  barResultOf,
  type BarResult,
  isBarInstance,
  solveBarInstance,
  toMm,
  unitsDown,
  unitsPerMm,
  unitsUp,
} from './file';
export type * from './types';

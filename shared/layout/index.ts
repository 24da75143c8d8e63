/**
 * Layout: parts on sheets, sawable edge to edge. Types and units here; every length is a whole number of 0.000625 mm.
 * Pure: no I/O, no clock.
 */
export {
  type Answer,
  type Cut,
  type Frees,
  type Grain,
  type Item,
  type Job,
  type LaidSheet,
  type MachineLimits,
  type Objective,
  type Options,
  type Placement,
  type Rect,
  type Sheet,
  type Trims,
  type Unplaced,
  type WhyUnplaced,
} from './types';
export { partUnits, stockUnits, unitsPerMm, unitsToMm } from './units';
export { solve, type SolveOptions } from './solve';
export { type BrokenRule, type Fault, verifyLayout } from './verify';

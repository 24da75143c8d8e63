/**
 * Sizes of timber and sheets, inches. Softwood: American Softwood Lumber Standard PS 20, minimum dressed, dry (a
 * transcription of its table; the standard itself was not opened).
 */
export const dressedThickness = [
  [1, 3 / 4],
  [1.25, 1],
  [1.5, 1.25],
  [2, 1.5],
  [2.5, 2],
  [3, 2.5],
  [3.5, 3],
  [4, 3.5],
] as const;

/** Nominal and dressed width, dry: half an inch less up to 7, three quarters from 8 on. */
export const dressedWidth = [
  [2, 1.5],
  [3, 2.5],
  [4, 3.5],
  [5, 4.5],
  [6, 5.5],
  [7, 6.5],
  [8, 7.25],
  [9, 8.25],
  [10, 9.25],
  [11, 10.25],
  [12, 11.25],
  [14, 13.25],
  [16, 15.25],
] as const;

/** Hardwood by quarters: rough and surfaced two sides (NHLA rules, three transcriptions that agree). */
export const quarters = [
  [4, 1, 13 / 16],
  [5, 1.25, 1 + 1 / 16],
  [6, 1.5, 1 + 5 / 16],
  [7, 1.75, 1.5],
  [8, 2, 1.75],
  [12, 3, 2.75],
  [14, 3.5, 3.25],
  [16, 4, 3.75],
] as const;

/** Structural plywood PS 1 at 9 % moisture: performance category, least and most thickness, label. */
export const plywood = [
  ['1/4', 0.219, 0.281, 0.225],
  ['11/32', 0.313, 0.375, 0.322],
  ['3/8', 0.344, 0.406, 0.354],
  ['15/32', 0.438, 0.5, 0.451],
  ['1/2', 0.469, 0.531, 0.483],
  ['19/32', 0.563, 0.625, 0.578],
  ['5/8', 0.594, 0.656, 0.609],
  ['23/32', 0.688, 0.75, 0.703],
  ['3/4', 0.719, 0.781, 0.734],
  ['7/8', 0.831, 0.919, 0.849],
  ['1', 0.95, 1.05, 0.97],
  ['1-1/8', 1.069, 1.181, 1.091],
] as const;

/** Metric plywood, sanded, by EN 315 (formulas from memory; read in a national standard that follows it): mm over and under. */
export const metricPlywoodBand = (t: number) => ({ over: 0.2 + 0.03 * t, under: 0.4 + 0.03 * t });

/** A nominal size and the least dressed size, dry (up to 19 % moisture) and green, inches. */
export interface Dressed {
  nominal: number;
  dry: number;
  green: number;
}

/** Softwood thickness, American Softwood Lumber Standard PS 20 (a transcription of its table, read twice removed). */
export const softwoodThickness: readonly Dressed[] = [
  { nominal: 0.75, dry: 0.625, green: 0.6875 },
  { nominal: 1, dry: 0.75, green: 0.78125 },
  { nominal: 1.25, dry: 1, green: 1.03125 },
  { nominal: 1.5, dry: 1.25, green: 1.28125 },
  { nominal: 2, dry: 1.5, green: 1.5625 },
  { nominal: 2.5, dry: 2, green: 2.0625 },
  { nominal: 3, dry: 2.5, green: 2.5625 },
  { nominal: 3.5, dry: 3, green: 3.0625 },
  { nominal: 4, dry: 3.5, green: 3.5625 },
];

/** Softwood width, the same source: 1/2 in off up to 7, 3/4 in from 8 up. */
export const softwoodWidth: readonly Dressed[] = [
  { nominal: 2, dry: 1.5, green: 1.5625 },
  { nominal: 3, dry: 2.5, green: 2.5625 },
  { nominal: 4, dry: 3.5, green: 3.5625 },
  { nominal: 5, dry: 4.5, green: 4.625 },
  { nominal: 6, dry: 5.5, green: 5.625 },
  { nominal: 7, dry: 6.5, green: 6.625 },
  { nominal: 8, dry: 7.25, green: 7.5 },
  { nominal: 9, dry: 8.25, green: 8.5 },
  { nominal: 10, dry: 9.25, green: 9.5 },
  { nominal: 11, dry: 10.25, green: 10.5 },
  { nominal: 12, dry: 11.25, green: 11.5 },
  { nominal: 14, dry: 13.25, green: 13.5 },
  { nominal: 16, dry: 15.25, green: 15.5 },
];

/**
 * Hardwood by quarters, inches: rough (green or air-dried), surfaced one side, surfaced two sides. NHLA rules, also in the Wood
 * Handbook (three transcriptions agree, read twice removed); 10/4 from memory. The thin S1S sizes are left out: their sources
 * differ. Kiln-dried rough 4/4 and 5/4 may be 1/16 under.
 */
export const hardwoodQuarters: readonly {
  quarter: string;
  rough: number;
  s1s?: number;
  s2s: number;
}[] = [
  { quarter: '3/8', rough: 0.375, s2s: 0.1875 },
  { quarter: '1/2', rough: 0.5, s2s: 0.3125 },
  { quarter: '5/8', rough: 0.625, s2s: 0.4375 },
  { quarter: '3/4', rough: 0.75, s2s: 0.5625 },
  { quarter: '4/4', rough: 1, s1s: 0.875, s2s: 0.8125 },
  { quarter: '5/4', rough: 1.25, s1s: 1.125, s2s: 1.0625 },
  { quarter: '6/4', rough: 1.5, s1s: 1.375, s2s: 1.3125 },
  { quarter: '7/4', rough: 1.75, s2s: 1.5 },
  { quarter: '8/4', rough: 2, s1s: 1.8125, s2s: 1.75 },
  { quarter: '10/4', rough: 2.5, s2s: 2.25 },
  { quarter: '12/4', rough: 3, s1s: 2.8125, s2s: 2.75 },
  { quarter: '14/4', rough: 3.5, s2s: 3.25 },
  { quarter: '16/4', rough: 4, s1s: 3.8125, s2s: 3.75 },
];

/**
 * Structural plywood by performance category, PS 1 at 9 % moisture (read in the producers' association's reproduction): least and
 * greatest thickness unsanded, touch-sanded or overlaid, and the figure of the label, inches.
 */
export const plywoodCategories: readonly {
  category: string;
  least: number;
  greatest: number;
  label: number;
}[] = [
  { category: '1/4', least: 0.219, greatest: 0.281, label: 0.225 },
  { category: '11/32', least: 0.313, greatest: 0.375, label: 0.322 },
  { category: '3/8', least: 0.344, greatest: 0.406, label: 0.354 },
  { category: '15/32', least: 0.438, greatest: 0.5, label: 0.451 },
  { category: '1/2', least: 0.469, greatest: 0.531, label: 0.483 },
  { category: '19/32', least: 0.563, greatest: 0.625, label: 0.578 },
  { category: '5/8', least: 0.594, greatest: 0.656, label: 0.609 },
  { category: '23/32', least: 0.688, greatest: 0.75, label: 0.703 },
  { category: '3/4', least: 0.719, greatest: 0.781, label: 0.734 },
  { category: '7/8', least: 0.831, greatest: 0.919, label: 0.849 },
  { category: '1', least: 0.95, greatest: 1.05, label: 0.97 },
  { category: '1 1/8', least: 1.069, greatest: 1.181, label: 1.091 },
];

/** Usual thicknesses of metric birch plywood and their plies, mm (read twice removed). */
export const metricPlywood: readonly { mm: number; plies: number }[] = [
  { mm: 4, plies: 3 },
  { mm: 6.5, plies: 5 },
  { mm: 9, plies: 7 },
  { mm: 12, plies: 9 },
  { mm: 15, plies: 11 },
  { mm: 18, plies: 13 },
  { mm: 21, plies: 15 },
  { mm: 24, plies: 17 },
];

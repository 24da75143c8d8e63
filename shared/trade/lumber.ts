/** Lumber arithmetic; sizes in inches where the trade counts in inches. */

const near = 1e-9;

export interface Tally {
  /** Surface measure, whole square feet. */
  surface: number;
  boardFeet: number;
  /** It fell on the half: the count was taken up, where a tallier may take it down. */
  onTheHalf: boolean;
}

/**
 * Hardwood tally (NHLA, from memory): surface measure W · L / 12 (inches, feet) to the nearest whole foot, then times the
 * thickness. Lengths in inches here.
 */
export function tally(thickness: number, width: number, length: number): Tally {
  const exact = (width * length) / 144;
  const surface = Math.floor(exact + 0.5 + near);
  return {
    surface,
    boardFeet: surface * Math.max(1, thickness),
    onTheHalf: Math.abs(exact - Math.floor(exact) - 0.5) < near,
  };
}

/** Wood's mass per volume, kg/m³: 1000 G (1 + M/100), G at that moisture (Wood Handbook ch. 4, from memory). */
export const woodDensity = (gravity: number, moisture: number): number =>
  1000 * gravity * (1 + moisture / 100);

/** EN 315 limits of a metric plywood, mm over and under; sanded read in GB/T 9846.3, unsanded from memory. */
export function metricPlywoodLimits(mm: number, sanded: boolean): { over: number; under: number } {
  return { over: (sanded ? 0.2 : 0.8) + 0.03 * mm, under: 0.4 + 0.03 * mm };
}

/**
 * PS 1 limits for a category, inches either side (read): unsanded ±1/32 to 13/16 and ±5 % above; sanded ±1/64 to 3/4 and
 * ±3 % above.
 */
export function plywoodTolerance(category: number, sanded: boolean): number {
  if (sanded) return category <= 3 / 4 ? 1 / 64 : 0.03 * category;
  return category <= 13 / 16 ? 1 / 32 : 0.05 * category;
}

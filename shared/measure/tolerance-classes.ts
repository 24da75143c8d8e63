import { angularClasses, linearClasses, toleranceGrades } from './tolerance-classes.data';

export type ToleranceClass = 'f' | 'm' | 'c' | 'v';

/** ± mm of ISO 2768-1 table 1 for a size; null below 0.5 mm, above 4 m and where the table has a dash. */
export function linearTolerance(size: number, of: ToleranceClass): number | null {
  if (size < 0.5) return null;
  return linearClasses.find((row) => size <= row.to)?.[of] ?? null;
}

/** ± degrees of ISO 2768-1 table 3 for an angle with this shorter side in mm. */
export function angularTolerance(side: number, of: ToleranceClass): number {
  return (angularClasses.find((row) => side <= row.to)?.[of] ?? 0) / 60;
}

/** mm of an ISO 286-1 grade for a size over 3 and up to 250 mm, as tabled; null outside. */
export function gradeTolerance(size: number, grade: 6 | 7 | 8 | 9 | 10 | 11 | 12): number | null {
  const row = toleranceGrades.find(({ over, to }) => size > over && size <= to);
  return row ? row.it[grade] / 1000 : null;
}

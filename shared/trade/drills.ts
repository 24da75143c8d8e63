import { Rational } from '../measure';
import { letterDrills, numberDrills } from './drills.data';

/** A drill by the name on its shank and its diameter in mm. */
export interface Drill {
  name: string;
  mm: number;
}

export const drillSeries = ['fraction', 'metric', 'number', 'letter'] as const;
export type DrillSeries = (typeof drillSeries)[number];

const inch = 25.4;

/** 1/64 to 1 in by 64ths, in lowest terms. */
const fractions = (): Drill[] =>
  Array.from({ length: 64 }, (_, i) => {
    const size = Rational.of(i + 1, 64);
    const name = size.d === 1n ? `${size.n} in` : `${size.n}/${size.d} in`;
    return { name, mm: ((i + 1) / 64) * inch };
  });

/** BS 328: 1.0 to 2.95 by 0.05, 3.0 to 13.9 by 0.1 (read twice removed). */
const metric = (): Drill[] =>
  [
    ...Array.from({ length: 40 }, (_, i) => (100 + 5 * i) / 100),
    ...Array.from({ length: 110 }, (_, i) => (30 + i) / 10),
  ].map((mm) => ({ name: `${mm} mm`, mm }));

const series: Record<DrillSeries, () => Drill[]> = {
  fraction: fractions,
  metric,
  number: () =>
    Object.entries(numberDrills).map(([n, size]) => ({ name: `No. ${n}`, mm: size * inch })),
  letter: () => Object.entries(letterDrills).map(([n, size]) => ({ name: n, mm: size * inch })),
};

/** All drills of a series, smallest first. */
export const drillsOf = (name: DrillSeries): Drill[] => series[name]().sort((a, b) => a.mm - b.mm);

/** The drill nearest to a size, the smaller on a tie; null when there are none. */
export function nearestDrill(mm: number, drills: readonly Drill[]): Drill | null {
  return drills.reduce<Drill | null>((best, drill) => {
    if (!best) return drill;
    const nearer = Math.abs(drill.mm - mm) - Math.abs(best.mm - mm);
    return nearer < -1e-9 || (Math.abs(nearer) <= 1e-9 && drill.mm < best.mm) ? drill : best;
  }, null);
}

/** The smallest drill that is not under a size; null when none is. A drill exactly of the size will do. */
export const drillAtLeast = (mm: number, drills: readonly Drill[]): Drill | null =>
  nearestDrill(
    mm,
    drills.filter((drill) => drill.mm >= mm - 1e-9),
  );

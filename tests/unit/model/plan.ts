import {
  planDocumentSchema,
  type PlanDocument,
  type PlanDocumentInput,
} from '../../../shared/plan/document';
import { type ModelReadings } from '../../../shared/plan/model';

type DimensionInput = NonNullable<PlanDocumentInput['dimensions']>[number];
type CheckInput = NonNullable<PlanDocumentInput['checks']>[number];
type PartInput = NonNullable<PlanDocumentInput['parts']>[number];

/** A UUIDv7-shaped id made of a list's letter and a running number. */
export const idOf = (list: number, n: number): string =>
  `0190f${list.toString(16).padStart(3, '0')}-0000-7000-8000-${n.toString(16).padStart(12, '0')}`;

/** An invented plan of a few dimensions, checks and parts. The id of the n-th dimension is `idOf(1, n)`. */
export function planOf(
  dimensions: (Partial<DimensionInput> & { symbol: string })[],
  checks: (Partial<CheckInput> & { expression: string })[] = [],
  parts: Partial<PartInput>[] = [],
  units: PlanDocument['units'] = 'mm',
): PlanDocument {
  return planDocumentSchema.parse({
    scantling: 1,
    id: idOf(0, 0),
    title: 'Invented for a test',
    units,
    dimensions: dimensions.map((d, i) => ({
      id: idOf(1, i),
      name: d.symbol.replaceAll('_', ' '),
      origin: 'given',
      expression: '1 mm',
      ...d,
    })),
    checks: checks.map((c, i) => ({ id: idOf(2, i), name: `Check ${i}`, ...c })),
    parts: parts.map((p, i) => ({
      id: idOf(3, i),
      mark: String.fromCharCode(65 + i),
      name: 'Part',
      length: '100 mm',
      width: '50 mm',
      ...p,
    })),
  });
}

/** Figures read of dimensions by their place in the plan, in mm. */
export function readingsOf(
  all: Record<number, string[]>,
  instrument: 'tape' | 'calipers' = 'calipers',
): ModelReadings {
  return {
    readings: new Map(
      Object.entries(all).map(([n, figures]) => [
        idOf(1, Number(n)),
        figures.map((mm) => ({ value: { text: `${mm} mm`, mm }, instrument })),
      ]),
    ),
  };
}

export const pm = (by: string) => ({ form: 'plus-minus', by }) as const;

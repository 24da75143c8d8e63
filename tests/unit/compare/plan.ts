import { planDocumentSchema, type PlanDocument } from '../../../shared/plan/document';
import { type Entry } from '../../../shared/plan/bench/entry';
import { type OrderedEntry } from '../../../shared/plan/bench/fold';
import { idOf } from '../model/plan';

export interface DimensionRow {
  /** Millimetres of a given one, or two indexes whose sum it is. */
  of: number | [number, number];
  tolerance: number;
  sense: 'outside' | 'inside' | 'place' | 'setting';
  taken?: boolean;
}
export interface StepRow {
  holds: number[];
  takes: number[];
  sizes: number[];
  text?: string;
  caution?: string;
}
export interface Rows {
  dimensions: DimensionRow[];
  /** Length from one dimension, width a figure, quantity. */
  parts: { length: number; width: number; quantity: number }[];
  steps: StepRow[];
}

export const dimensionId = (n: number): string => idOf(1, n);
export const partId = (n: number): string => idOf(3, n);
export const stepId = (n: number): string => idOf(4, n);
export const cautionId = (n: number): string => idOf(5, n);

/** An invented plan from rows of figures, so that a test can work everything out by itself. */
export function planFrom(rows: Rows): PlanDocument {
  return planDocumentSchema.parse({
    scantling: 1,
    id: idOf(0, 0),
    title: 'Invented for a test',
    units: 'mm',
    dimensions: rows.dimensions.map((d, i) => ({
      id: dimensionId(i),
      name: `d${i}`,
      symbol: `d${i}`,
      origin: Array.isArray(d.of) ? 'derived' : d.taken ? 'taken' : 'given',
      expression: Array.isArray(d.of) ? `d${d.of[0]} + d${d.of[1]}` : `${d.of} mm`,
      tolerance: { form: 'plus-minus', by: `${d.tolerance} mm` },
      sense: d.sense,
    })),
    parts: rows.parts.map((p, i) => ({
      id: partId(i),
      mark: String.fromCharCode(65 + i),
      name: 'Part',
      quantity: p.quantity,
      length: `d${p.length}`,
      width: `${p.width} mm`,
      thickness: '18 mm',
    })),
    steps: rows.steps.map((s, i) => ({
      id: stepId(i),
      title: `Step ${i}`,
      text: s.text ?? 'Do it.',
      holds: s.holds.map(dimensionId),
      takes: s.takes.map(dimensionId),
      parts: s.sizes.map((p) => ({ partId: partId(p), to: 'sized' })),
      cautions: s.caution === undefined ? [] : [{ id: cautionId(i), text: s.caution }],
    })),
  });
}

/** Entries of a bench copy: ticked steps and figures read in mm, in order. */
export function entriesOf(ticks: number[], readings: [number, number][]): OrderedEntry[] {
  const base = (n: number) => ({
    id: idOf(9, n),
    revisionId: idOf(8, 0),
    device: 'a',
    deviceSequence: n,
    deviceTime: '2026-06-01T10:00:00Z',
  });
  const entries: Entry[] = [
    ...ticks.map((t, i) => ({ ...base(i), kind: 'tick' as const, elementId: stepId(t) })),
    ...readings.map(([d, mm], i) => ({
      ...base(1000 + i),
      kind: 'reading' as const,
      form: 'figure' as const,
      elementId: dimensionId(d),
      value: { text: `${mm} mm`, mm: String(mm) },
      instrument: 'calipers' as const,
      place: '',
    })),
  ];
  return entries.map((entry, i) => ({ entry, sequence: i + 1 }));
}

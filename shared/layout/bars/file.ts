import { z } from 'zod';
import { solveBars } from './solve';
import { type BarAnswer, type BarJob, type BarOptions } from './types';

/** Layout units to the millimetre: 1/64 in is 635 of them, 0.01 mm is 16. */
export const unitsPerMm = 1600;
const slack = 1e-6;
/** What must not come out short. */
export const unitsUp = (mm: number): number => Math.ceil(mm * unitsPerMm - slack);
/** What must not be counted on beyond what is there. */
export const unitsDown = (mm: number): number => Math.floor(mm * unitsPerMm + slack);
export const toMm = (units: number): number => units / unitsPerMm;

const size = z.number().positive().max(1_000_000);
export const barInstanceSchema = z.object({
  name: z.string().default(''),
  kerf: z.number().min(0).max(100).default(0),
  trim: z
    .union([
      z
        .number()
        .min(0)
        .transform((each) => ({ start: each, end: each })),
      z.object({ start: z.number().min(0).default(0), end: z.number().min(0).default(0) }),
    ])
    .default({ start: 0, end: 0 }),
  bins: z.array(
    z.object({
      length: size,
      qty: z.number().int().min(0).nullable().default(null),
      cost: z.number().min(0).optional(),
    }),
  ),
  items: z.array(z.object({ length: size, qty: z.number().int().min(0).default(1) })).max(10_000),
});
export type BarInstance = z.infer<typeof barInstanceSchema>;

/** An instance in millimetres as a job in layout units; costs in hundredths. */
export const barJobOf = (instance: BarInstance): BarJob => ({
  kerf: unitsUp(instance.kerf),
  trim: { start: unitsUp(instance.trim.start), end: unitsUp(instance.trim.end) },
  stock: instance.bins.map(({ length, qty, cost }) => ({
    length: unitsDown(length),
    quantity: qty,
    ...(cost === undefined ? {} : { cost: Math.round(cost * 100) }),
  })),
  items: instance.items.map(({ length, qty }) => ({ length: unitsUp(length), quantity: qty })),
});

const perMeasure = { bars: 1, cost: 100, length: unitsPerMm } as const;

/** What `scantling layout` prints of one instance, in the file's own millimetres. */
export const barResultOf = (name: string, answer: BarAnswer) => ({
  name,
  sheets: answer.bars.map((bar) => ({
    bin: bar.stock,
    placements: bar.placements.map((p) => ({ item: p.item, x: toMm(p.x), w: toMm(p.length) })),
    cuts: bar.cuts.map(({ n, at, setting, same, frees }) => ({
      n,
      at: toMm(at),
      setting: toMm(setting),
      same,
      frees,
    })),
    offcuts: bar.offcuts.map(({ x, length }) => ({ x: toMm(x), w: toMm(length) })),
  })),
  lowerBound: answer.lowerBound / perMeasure[answer.measure],
  proven: answer.proven,
  leftOut: answer.leftOut,
});
export type BarResult = ReturnType<typeof barResultOf>;

/** Is this instance one of lengths alone? */
export const isBarInstance = (value: unknown): boolean =>
  barInstanceSchema.safeParse(value).success;

/** Solves one instance of the file form; throws a ZodError that names what is wrong with it. */
export function solveBarInstance(value: unknown, options: BarOptions = {}): BarResult {
  const instance = barInstanceSchema.parse(value);
  return barResultOf(instance.name, solveBars(barJobOf(instance), options));
}

import { z } from 'zod';
import { Rational } from '../measure';
import { waysOf } from './problem';
import { type Answer, type Job, type Objective, type Options, type Trims } from './types';
import { partUnits, stockUnits, unitsPerMm } from './units';

/** 100 m, as for every length of a plan. */
const longest = 100_000;
const length = z.number().positive().max(longest);
const edge = z.number().min(0).max(longest);
const grain = z.enum(['along', 'across', 'free']);
const trims = z.union([
  edge.transform((each): Trims => ({ left: each, right: each, bottom: each, top: each })),
  z.object({
    left: edge.default(0),
    right: edge.default(0),
    bottom: edge.default(0),
    top: edge.default(0),
  }),
]);

export const sheetInstanceSchema = z.object({
  name: z.string().default(''),
  kerf: z.number().min(0).max(100).default(0),
  trim: trims.optional(),
  bins: z
    .array(
      z.object({
        w: length,
        h: length,
        qty: z.number().int().min(0).nullable().default(null),
        cost: z.number().min(0).optional(),
        grain: grain.optional(),
        trim: trims.optional(),
        owned: z.boolean().optional(),
      }),
    )
    .min(1, 'there is no stock'),
  items: z.array(
    z.object({
      w: length,
      h: length,
      qty: z.number().int().min(0).default(1),
      rotatable: z.boolean().default(false),
      grain: grain.optional(),
    }),
  ),
});
export type SheetInstance = z.infer<typeof sheetInstanceSchema>;

const exact = (value: number): Rational => {
  const text = String(value);
  return text.includes('e') ? Rational.fromNumber(value) : Rational.decimal(text);
};

const marginsOf = (t: Trims | undefined): number[] =>
  t === undefined ? [] : [t.left, t.right, t.bottom, t.top];

/** Places behind the point of the costs, as a factor. */
function coinOf(instance: SheetInstance): number {
  const costs = instance.bins.flatMap((bin) => (bin.cost === undefined ? [] : [bin.cost]));
  return [1, 100, 10_000].find((coin) => costs.every((c) => Number.isInteger(c * coin))) ?? 10_000;
}

/**
 * An instance as a job. Where every length is whole, the file's unit is the job's; where any has a fraction, lengths are
 * millimetres and become whole units of 0.000625 mm, parts, kerf and trims rounded up, sheets down.
 */
export function jobOf(
  instance: SheetInstance,
  options: Options = {},
): { job: Job; scale: number; coin: number } {
  const lengths = [
    instance.kerf,
    ...[instance.trim, ...instance.bins.map((bin) => bin.trim)].flatMap(marginsOf),
    ...[...instance.bins, ...instance.items].flatMap(({ w, h }) => [w, h]),
  ];
  const whole = lengths.every(Number.isInteger);
  const up = (value: number) => (whole ? value : partUnits(exact(value)));
  const down = (value: number) => (whole ? value : stockUnits(exact(value)));
  const edges = (t: Trims): Trims => ({
    left: up(t.left),
    right: up(t.right),
    bottom: up(t.bottom),
    top: up(t.top),
  });
  const coin = coinOf(instance);
  const job: Job = {
    kerf: up(instance.kerf),
    sheets: instance.bins.map(({ w, h, cost, trim, ...rest }) => {
      const margins = trim ?? instance.trim;
      return {
        ...rest,
        w: down(w),
        h: down(h),
        ...(cost === undefined ? {} : { cost: Math.round(cost * coin) }),
        ...(margins === undefined ? {} : { trims: edges(margins) }),
      };
    }),
    items: instance.items.map(({ w, h, ...rest }) => ({ ...rest, w: up(w), h: up(h) })),
    options,
  };
  return { job, scale: whole ? 1 : unitsPerMm, coin };
}

const perObjective = (objective: Objective, scale: number, coin: number): number =>
  objective === 'area' ? scale * scale : objective === 'cost' ? coin : 1;

/** What `scantling layout` prints of one instance, in the file's own unit. */
export function resultOf(name: string, answer: Answer, scale: number, coin: number) {
  const out = (units: number) => units / scale;
  const per = perObjective(answer.objective, scale, coin);
  const rect = <T extends { x: number; y: number; w: number; h: number }>(r: T): T => ({
    ...r,
    x: out(r.x),
    y: out(r.y),
    w: out(r.w),
    h: out(r.h),
  });
  return {
    name,
    sheets: answer.sheets.map((sheet) => ({
      bin: sheet.bin,
      placements: sheet.placements.map(rect),
      cuts: sheet.cuts.map((cut) => ({
        ...cut,
        at: out(cut.at),
        setting: out(cut.setting),
        kerf: out(cut.kerf),
      })),
      offcuts: sheet.offcuts.map(rect),
    })),
    objective: answer.objective,
    cost: answer.cost / per,
    lowerBound: answer.lowerBound / per,
    proven: answer.proven,
    unplaced: answer.unplaced,
  };
}
export type SheetResult = ReturnType<typeof resultOf>;

/** Parts that no sheet can hold, in words. */
export function whyTooBig(instance: SheetInstance, job: Job, item: number): string {
  const part = instance.items[item];
  const may =
    job.items[item] && job.sheets.some((sheet) => (waysOf(job.items[item]!, sheet) & 2) !== 0);
  return `part ${item} (${part?.w} × ${part?.h}${may ? ', turned or not' : ''}) is larger than every sheet`;
}

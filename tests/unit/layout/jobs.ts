import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import fc from 'fast-check';
import {
  type Answer,
  type Item,
  type Job,
  type Options,
  solve,
  verifyLayout,
} from '../../../shared/layout';
import { jobOf, sheetInstanceSchema } from '../../../shared/layout/file';

interface WorkshopFile {
  instances: { name: string; best: number }[];
}

/** The workshop set, own work (CC0): random guillotine dissections with kerf, trim and grain; optimum by construction. */
export const workshop = (
  JSON.parse(
    readFileSync(join(__dirname, '../../data/layout/2d-workshop-kerf.json'), 'utf8'),
  ) as WorkshopFile
).instances.map((raw) => ({
  name: raw.name,
  best: raw.best,
  job: jobOf(sheetInstanceSchema.parse(raw)).job,
}));

export const item = (w: number, h: number, qty = 1, rest: Partial<Item> = {}): Item => ({
  w,
  h,
  qty,
  rotatable: false,
  ...rest,
});

/** Solves by iterations and has every answer verified. */
export function laid(job: Job, iterations = 60, seed = 1): Answer {
  const answer = solve(job, { iterations, seed });
  expect(verifyLayout(job, answer)).toEqual([]);
  return answer;
}

const grains = fc.constantFrom<Item['grain'][]>('along', 'across', 'free', undefined);
const small = (least: number, most: number) => fc.integer({ min: least, max: most });

/** Small jobs of every sort. */
export const anyJob: fc.Arbitrary<Job> = fc.record({
  kerf: fc.constantFrom(0, 1, 3, 5),
  sheets: fc.array(
    fc.record({
      w: small(30, 120),
      h: small(30, 120),
      qty: fc.constantFrom(null, 1, 3),
      cost: small(1, 50),
      grain: fc.constantFrom('along', 'across', 'free'),
      trims: fc.record({
        left: small(0, 6),
        right: small(0, 6),
        bottom: small(0, 6),
        top: small(0, 6),
      }),
      owned: fc.boolean(),
    }),
    { minLength: 1, maxLength: 3 },
  ),
  items: fc.array(
    fc
      .record({ w: small(3, 70), h: small(3, 70), qty: small(0, 4), rotatable: fc.boolean() })
      .chain((each) =>
        grains.map((grain): Item => (grain === undefined ? each : { ...each, grain })),
      ),
    { maxLength: 8 },
  ),
  options: fc.constantFrom<Options[]>(
    {},
    { offcut: false },
    { stages: 2 },
    { stages: 3 },
    { firstCut: 'rip' },
    { firstCut: 'crosscut' },
    { stages: 2, firstCut: 'rip' },
    { stages: 3, firstCut: 'crosscut' },
    { objective: 'sheets' },
    { objective: 'area' },
    { machine: { rip: 40 } },
    { machine: { crosscut: 50, hold: 12 } },
    { machine: { rip: 35, crosscut: 60, hold: 10 }, stages: 3 },
  ),
});

import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { z } from 'zod';
import { type Answer, type Job, type Options, solve, verifyLayout } from '../../shared/layout';
import { jobOf, sheetInstanceSchema } from '../../shared/layout/file';

const reference = z.object({
  best: z.number().nullish(),
  lb: z.number().nullish(),
  rotated: z.object({ best: z.number().nullish(), lb: z.number().nullish() }).optional(),
});
const instanceSchema = sheetInstanceSchema.and(reference);
export type Instance = z.infer<typeof instanceSchema>;

export interface SetFile {
  file: string;
  instances: Instance[];
}

const lengthSchema = z.object({
  instances: z.array(z.object({ bins: z.array(z.object({ w: z.number() })) })),
});

/** The files of a folder with sheets in them; others are named and left out. */
export function setsOf(folder: string): { sets: SetFile[]; others: string[] } {
  const sets: SetFile[] = [];
  const others: string[] = [];
  for (const file of readdirSync(folder)
    .filter((name) => name.endsWith('.json'))
    .sort()) {
    const value: unknown = JSON.parse(readFileSync(join(folder, file), 'utf8'));
    if (!lengthSchema.safeParse(value).success) continue;
    const read = z.object({ instances: z.array(instanceSchema) }).safeParse(value);
    if (read.success)
      sets.push({ file: file.replace('.json', ''), instances: read.data.instances });
    else others.push(file);
  }
  return { sets, others };
}

export interface Way {
  time: number;
  turn?: boolean;
  /** As many sheets as are wanted, whatever the file says. */
  unlimited?: boolean;
  options?: Options;
}

export interface Row {
  name: string;
  job: Job;
  answer: Answer;
  best: number | null;
  ms: number;
  /** Placed area of all sheets used, in %. */
  use: number;
  /** Sheets, the last counted as far as it is cut into. */
  strips: number;
}

/** Lays one instance out and has the answer verified; a fault ends the benchmark. */
export function row(instance: Instance, way: Way): Row {
  const { job: read } = jobOf(instance, way.options ?? {});
  const job: Job = {
    ...read,
    sheets: way.unlimited ? read.sheets.map((sheet) => ({ ...sheet, qty: null })) : read.sheets,
    items: way.turn ? read.items.map((item) => ({ ...item, rotatable: true })) : read.items,
  };
  const start = performance.now();
  const answer = solve(job, { seed: 1, clock: () => performance.now(), timeLimit: way.time });
  const ms = performance.now() - start;
  const faults = verifyLayout(job, answer);
  if (faults.length > 0) throw new Error(`${instance.name}: ${faults[0]?.message}`);
  const placed = answer.sheets.flatMap((sheet) => sheet.placements);
  const area = (of: readonly { w: number; h: number }[]) =>
    of.reduce((sum, r) => sum + r.w * r.h, 0);
  const used = answer.sheets.map((sheet) => job.sheets[sheet.bin]!);
  const last = answer.sheets.at(-1);
  const top = Math.max(0, ...(last?.placements ?? []).map((p) => p.y + p.h));
  return {
    name: instance.name,
    job,
    answer,
    best: (way.turn ? instance.rotated?.best : instance.best) ?? null,
    ms,
    use: (100 * area(placed)) / area(used),
    strips: used.length - 1 + top / (used.at(-1)?.h ?? 1),
  };
}

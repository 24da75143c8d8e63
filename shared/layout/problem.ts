import { type Item, type Job, type Objective, type Sheet } from './types';

/**
 * A job as the solver sees it. Parts a kerf longer and wider on sheets a kerf longer and wider need no kerf between
 * them; all lengths are divided by their common unit. Equal parts are one kind.
 */
export interface Problem {
  kinds: number;
  w: Int32Array;
  h: Int32Array;
  area: Float64Array;
  demand: Int32Array;
  /** Which items of the job a kind stands for; `turn` where its w and h are exchanged. */
  members: { item: number; qty: number; turn: boolean }[][];
  bins: number;
  binW: Int32Array;
  binH: Int32Array;
  cost: Float64Array;
  /** How many at most. */
  qty: Int32Array;
  /** By kind × bin: 1 may lie as it is, 2 may be turned, 3 both, 0 does not fit. */
  fits: Uint8Array;
  /** The common unit. */
  unit: number;
  objective: Objective;
  /** Levels of cuts, 0 for any number. */
  stages: number;
  /** Axis of the first stage: 0 pieces side by side along w, 1 one above the other, -1 either. */
  first: -1 | 0 | 1;
  /** Parts that fit no sheet. */
  tooBig: { item: number; qty: number }[];
  /** Parts the machine cannot cut from any sheet. */
  refused: number[];
}

const gcd = (a: number, b: number): number => (b === 0 ? a : gcd(b, a % b));

export const noTrims = { left: 0, right: 0, bottom: 0, top: 0 };

export const usableOf = (sheet: Sheet): { w: number; h: number } => {
  const trims = sheet.trims ?? noTrims;
  return { w: sheet.w - trims.left - trims.right, h: sheet.h - trims.bottom - trims.top };
};

/** How a part may lie on a sheet: 1 as it is, 2 turned, 3 both. */
export function waysOf(item: Item, sheet: Sheet): number {
  const [part, stock] = [item.grain ?? 'free', sheet.grain ?? 'free'];
  if (part === 'free' || stock === 'free') return item.rotatable ? 3 : 1;
  return part === stock ? 1 : 2;
}

function objectiveOf(job: Job): Objective {
  if (job.options?.objective !== undefined) return job.options.objective;
  const bought = job.sheets.filter((sheet) => sheet.owned !== true);
  if (bought.length > 0 && bought.every((sheet) => sheet.cost !== undefined)) return 'cost';
  return new Set(job.sheets.map((sheet) => `${sheet.w}/${sheet.h}`)).size > 1 ? 'area' : 'sheets';
}

/** What one sheet counts in the objective. */
export function countOf(sheet: Sheet, objective: Objective): number {
  if (sheet.owned === true) return 0;
  if (objective === 'sheets') return 1;
  return objective === 'area' ? sheet.w * sheet.h : Math.max(0, sheet.cost ?? 0);
}

interface Kind {
  w: number;
  h: number;
  ways: number[];
  qty: number;
  members: { item: number; qty: number; turn: boolean }[];
}

const exchanged = (ways: number): number => (ways === 1 ? 2 : ways === 2 ? 1 : ways);

function kindsOf(job: Job, tooBig: Problem['tooBig']): Kind[] {
  const kinds = new Map<string, Kind>();
  job.items.forEach((item, index) => {
    if (item.qty <= 0) return;
    let [w, h] = [item.w + job.kerf, item.h + job.kerf];
    let ways = job.sheets.map((sheet) => {
      const usable = usableOf(sheet);
      const [W, H] = [usable.w + job.kerf, usable.h + job.kerf];
      const may = sheet.qty === 0 ? 0 : waysOf(item, sheet);
      return may & ((w <= W && h <= H ? 1 : 0) | (h <= W && w <= H ? 2 : 0));
    });
    if (ways.every((way) => way === 0)) {
      tooBig.push({ item: index, qty: item.qty });
      return;
    }
    // Parts that are the same turned are the same kind.
    const turn = ways.some((way) => (way & 2) !== 0) && w < h;
    if (turn) [w, h, ways] = [h, w, ways.map(exchanged)];
    const key = `${w}/${h}/${ways.join()}`;
    const kind = kinds.get(key) ?? { w, h, ways, qty: 0, members: [] };
    kind.qty += item.qty;
    kind.members.push({ item: index, qty: item.qty, turn });
    kinds.set(key, kind);
  });
  return [...kinds.values()].sort((a, b) => b.w * b.h - a.w * a.h || b.w - a.w || b.h - a.h);
}

/** Brings a job into the solver's form. */
export function problemOf(job: Job): Problem {
  const tooBig: Problem['tooBig'] = [];
  const kinds = kindsOf(job, tooBig);
  const objective = objectiveOf(job);
  const pieces = kinds.reduce((sum, kind) => sum + kind.qty, 0);
  const unit = kinds.reduce((g, kind) => gcd(gcd(g, kind.w), kind.h), 0) || 1;
  const down = (length: number) => Math.max(0, Math.floor((length + job.kerf) / unit));
  const w = Int32Array.from(kinds, (kind) => kind.w / unit);
  const h = Int32Array.from(kinds, (kind) => kind.h / unit);
  const { stages, firstCut } = job.options ?? {};
  return {
    kinds: kinds.length,
    w,
    h,
    area: Float64Array.from(kinds, (_, t) => (w[t] ?? 0) * (h[t] ?? 0)),
    demand: Int32Array.from(kinds, (kind) => kind.qty),
    members: kinds.map((kind) => kind.members),
    bins: job.sheets.length,
    binW: Int32Array.from(job.sheets, (sheet) => down(usableOf(sheet).w)),
    binH: Int32Array.from(job.sheets, (sheet) => down(usableOf(sheet).h)),
    cost: Float64Array.from(job.sheets, (sheet) => countOf(sheet, objective)),
    qty: Int32Array.from(job.sheets, (sheet) => Math.min(sheet.qty ?? pieces, pieces)),
    fits: Uint8Array.from(kinds.flatMap((kind) => kind.ways)),
    unit,
    objective,
    stages: stages ?? 0,
    first: firstCut === undefined ? -1 : firstCut === 'rip' ? 1 : 0,
    tooBig,
    refused: [],
  };
}

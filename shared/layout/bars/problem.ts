import { type BarJob, type LeftOut } from './types';

/** One kind of piece: kerf added, divided by the common unit, largest first; which items of the job it stands for. */
export interface Kind {
  size: number;
  demand: number;
  items: { item: number; quantity: number }[];
}
export interface Bin {
  stock: number;
  capacity: number;
  quantity: number;
  cost: number;
}

/** A job as the solver sees it: pieces a kerf longer on bars a kerf longer need no kerf between them. */
export interface Problem {
  kinds: Kind[];
  bins: Bin[];
  measure: 'bars' | 'cost' | 'length';
  /** Every possible cost is a multiple of this. */
  grain: number;
  leftOut: LeftOut[];
}

export const gcd = (a: number, b: number): number => (b === 0 ? a : gcd(b, a % b));

function measureOf(job: BarJob): Problem['measure'] {
  if (job.stock.some((s) => s.cost !== undefined)) return 'cost';
  return new Set(job.stock.map((s) => s.length)).size > 1 ? 'length' : 'bars';
}

const costOf = (measure: Problem['measure'], stock: BarJob['stock'][number]): number =>
  measure === 'bars' ? 1 : measure === 'length' ? stock.length : Math.max(0, stock.cost ?? 0);

/** Bars that may be used, the longest first; one that is free of charge only as many times as it is there. */
function binsOf(job: BarJob, measure: Problem['measure'], pieces: number) {
  const usable = (length: number) => length - job.trim.start - job.trim.end + job.kerf;
  return job.stock
    .map((stock, i) => ({
      stock: i,
      capacity: usable(stock.length),
      quantity: Math.min(stock.quantity ?? pieces, pieces),
      cost: costOf(measure, stock),
    }))
    .filter((bin) => bin.quantity > 0 && bin.capacity > 0)
    .sort((a, b) => b.capacity - a.capacity || a.cost - b.cost || a.stock - b.stock);
}

export function problemOf(job: BarJob): Problem {
  const measure = measureOf(job);
  const pieces = job.items.reduce((sum, item) => sum + item.quantity, 0);
  const bins = binsOf(job, measure, pieces);
  const longest = bins[0]?.capacity ?? 0;
  const leftOut: LeftOut[] = [];
  const bySize = new Map<number, Kind>();
  job.items.forEach(({ length, quantity }, item) => {
    if (quantity <= 0) return;
    const size = length + job.kerf;
    if (size > longest) {
      leftOut.push({ item, quantity, because: 'too-long' });
      return;
    }
    const kind = bySize.get(size) ?? { size, demand: 0, items: [] };
    kind.demand += quantity;
    kind.items.push({ item, quantity });
    bySize.set(size, kind);
  });
  const unit = [...bySize.keys()].reduce(gcd, 0) || 1;
  const kinds = [...bySize.values()]
    .sort((a, b) => b.size - a.size)
    .map((kind) => ({ ...kind, size: kind.size / unit }));
  return {
    kinds,
    bins: bins
      .map((bin) => ({ ...bin, capacity: Math.floor(bin.capacity / unit) }))
      .filter((bin) => bin.capacity > 0),
    measure,
    grain: bins.reduce((unitCost, bin) => gcd(unitCost, bin.cost), 0) || 1,
    leftOut,
  };
}

/** How a bar is cut: how many of each kind, by the kind's place. */
export interface Pattern {
  bin: number;
  counts: [kind: number, count: number][];
}

/** Patterns with how often each is cut, and what no bar was left for. */
export interface Packing {
  patterns: { pattern: Pattern; times: number }[];
  cost: number;
  missing: number[];
}

export const missingOf = (packing: Packing): number =>
  packing.missing.reduce((sum, count) => sum + count, 0);

/** Everything placed counts first, then the cost. */
export const betterThan = (a: Packing, b: Packing | null): boolean => {
  if (!b) return true;
  const [left, right] = [missingOf(a), missingOf(b)];
  return left < right || (left === right && a.cost < b.cost);
};

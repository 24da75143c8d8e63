import { boardsOf, gatherOffcuts } from './tidy';
import { type Packing, type Problem } from './problem';
import { type BarAnswer, type BarCut, type BarJob, type BarSheet, type LeftOut } from './types';

/** Hands out the job's items of each kind in their order. */
function handOut(problem: Problem): (kind: number) => number {
  const left = problem.kinds.map((kind) => kind.items.map((entry) => ({ ...entry })));
  return (kind) => {
    const entry = left[kind]?.find((e) => e.quantity > 0);
    if (entry) entry.quantity -= 1;
    return entry?.item ?? -1;
  };
}

/** The cuts of one bar from the left: the end squared, then piece after piece at the stop, equal settings together. */
function sawBar(job: BarJob, stock: number, items: readonly number[]): BarSheet {
  const whole = job.stock[stock]?.length ?? 0;
  const usable = whole - job.trim.end;
  const sheet: BarSheet = { stock, placements: [], cuts: [], offcuts: [] };
  const cut = (at: number, setting: number, kind: BarCut['kind'], frees: number | null) => {
    const last = sheet.cuts.at(-1);
    sheet.cuts.push({
      n: sheet.cuts.length + 1,
      at,
      setting,
      kerf: Math.min(job.kerf, kind === 'trim' ? job.trim.start : whole - at),
      kind,
      same: kind === 'part' && last?.kind === 'part' && last.setting === setting,
      frees,
    });
  };
  let x = job.trim.start;
  if (x > 0) cut(Math.max(0, x - job.kerf), Math.max(0, x - job.kerf), 'trim', null);
  for (const item of items) {
    const length = job.items[item]?.length ?? 0;
    sheet.placements.push({ item, x, length });
    x += length;
    if (x < whole) cut(x, length, 'part', item);
    x += job.kerf;
  }
  if (usable - x > job.kerf) {
    sheet.offcuts.push({ x, length: usable - x });
    if (job.trim.end > 0) cut(usable, usable - x, 'end', null);
  }
  return sheet;
}

function leftOutOf(problem: Problem, missing: readonly number[]): LeftOut[] {
  const out: LeftOut[] = [...problem.leftOut];
  missing.forEach((count, kind) => {
    let rest = count;
    for (const { item, quantity } of [...(problem.kinds[kind]?.items ?? [])].reverse()) {
      const lost = Math.min(rest, quantity);
      if (lost > 0) out.push({ item, quantity: lost, because: 'stock-used-up' });
      rest -= lost;
    }
  });
  return out.sort((a, b) => a.item - b.item);
}

/** The packing as bars with their cuts, the fullest first, and what could not be cut. */
export function answerOf(
  job: BarJob,
  problem: Problem,
  packing: Packing,
  bound: number,
): BarAnswer {
  const boards = gatherOffcuts(problem, boardsOf(problem, packing));
  const next = handOut(problem);
  const bars = boards
    .sort((a, b) => a.room - b.room || (b.pieces.length ?? 0) - (a.pieces.length ?? 0))
    .map(({ bin, pieces }) => {
      const items = [...pieces].sort((a, b) => a - b).map(next);
      return sawBar(job, problem.bins[bin]?.stock ?? 0, items);
    });
  const cost = boards.reduce((sum, { bin }) => sum + (problem.bins[bin]?.cost ?? 0), 0);
  const short = packing.missing.some((count) => count > 0);
  return {
    bars,
    cost,
    lowerBound: Math.min(bound, cost),
    measure: problem.measure,
    proven: !short && cost <= bound,
    leftOut: leftOutOf(problem, packing.missing),
  };
}

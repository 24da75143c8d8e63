import { Knapsack } from './knapsack';
import { type Pattern, type Problem } from './problem';
import { patternsWithin } from './enumerate';
import { type Rest } from './heuristics';
import { Programme } from './simplex';

/** More kinds than this would make the programme too wide; the simple rules and the length bound answer then. */
export const kindLimit = 320;

const goesIn = (rest: Rest, pattern: Pattern | undefined): boolean =>
  pattern !== undefined && pattern.counts.every(([kind, n]) => n <= (rest.demand[kind] ?? 0));

/** Duals as whole numbers, so that the bound made of them is exact. */
const scale = 1e7;

/**
 * The relaxation by patterns (Gilmore and Gomory, Operations Research 9, 1961): how often each way of cutting a bar
 * is used, in fractions, the ways made as they are wanted by a knapsack over the duals.
 */
export class Relaxation {
  readonly patterns: Pattern[] = [];
  private readonly programme: Programme;
  private readonly sack: Knapsack;
  private readonly binRow: number[];
  private readonly dearest: number;
  /** No further ways are made: all that can matter are there. */
  closed = false;

  constructor(
    private readonly problem: Problem,
    private readonly whole: Rest,
  ) {
    const { kinds, bins } = problem;
    this.dearest = Math.max(1, ...bins.map((bin) => bin.cost));
    const pieces = kinds.reduce((sum, kind) => sum + kind.demand, 0);
    let rows = kinds.length;
    this.binRow = bins.map((bin) => (bin.quantity < pieces ? rows++ : -1));
    const penalty = Array.from({ length: rows }, () => 50);
    this.programme = new Programme(rows, this.rhsOf(whole), penalty);
    this.sack = new Knapsack(
      kinds.map((kind) => kind.size),
      bins.map((bin) => bin.capacity),
    );
  }

  private rhsOf(rest: Rest): number[] {
    const limited = this.problem.bins.flatMap((_, bin) =>
      (this.binRow[bin] ?? -1) < 0 ? [] : [-(rest.bins[bin] ?? 0)],
    );
    return [...rest.demand, ...limited];
  }

  add(pattern: Pattern): void {
    const rows = pattern.counts.map(([kind]) => kind);
    const values = pattern.counts.map(([, count]) => count);
    const binRow = this.binRow[pattern.bin] ?? -1;
    if (binRow >= 0) {
      rows.push(binRow);
      values.push(-1);
    }
    const cost = (this.problem.bins[pattern.bin]?.cost ?? 0) / this.dearest;
    this.programme.add({ cost, rows, values, tag: this.patterns.length });
    this.patterns.push(pattern);
  }

  /** Solves for what is left; false when it ran out of rounds. */
  solve(rest: Rest, rounds = 400): boolean {
    this.programme.setRhs(this.rhsOf(rest));
    if (this.closed) {
      const whole = this.programme.solve();
      this.programme.forbid((tag) => !goesIn(rest, this.patterns[tag]));
      return whole && this.programme.solve();
    }
    for (let round = 0; round < rounds; round += 1) {
      if (!this.programme.solve()) return false;
      if (!this.price(rest)) return true;
    }
    return false;
  }

  /** Adds the ways of cutting that would pay; false when there is none. */
  private price(rest: Rest): boolean {
    const { duals } = this.programme;
    const { fills } = this.sack.fill(duals, rest.demand);
    let found = false;
    fills.forEach((fill, bin) => {
      if ((rest.bins[bin] ?? 0) <= 0 || fill.counts.length === 0) return;
      const row = this.binRow[bin] ?? -1;
      const worth = fill.counts.reduce((sum, [kind, n]) => sum + n * (duals[kind] ?? 0), 0);
      const own = (this.problem.bins[bin]?.cost ?? 0) / this.dearest;
      if (own + (row < 0 ? 0 : (duals[row] ?? 0)) - worth > -1e-7) return;
      this.add({ bin, counts: fill.counts });
      found = true;
    });
    return found;
  }

  /** All ways of cutting that a packing of this cost may use, if they are few enough to be listed. */
  close(cost: number, most = 6000): boolean {
    const gap = (cost - this.objective()) / this.dearest;
    const { duals } = this.programme;
    const price = (bin: number) => {
      const row = this.binRow[bin] ?? -1;
      return (this.problem.bins[bin]?.cost ?? 0) / this.dearest + (row < 0 ? 0 : (duals[row] ?? 0));
    };
    const all = patternsWithin(this.problem, duals, price, Math.max(0, gap), most);
    if (!all) return false;
    const key = ({ bin, counts }: Pattern) =>
      `${bin}:${[...counts].sort((a, b) => a[0] - b[0]).join(';')}`;
    const known = new Set(this.patterns.map(key));
    for (const pattern of all) if (!known.has(key(pattern))) this.add(pattern);
    this.closed = true;
    return true;
  }

  work = (): number => this.programme.work;

  objective = (): number => this.programme.objective() * this.dearest;

  solution(): { pattern: Pattern; value: number }[] {
    return this.programme.solution().flatMap(({ tag, value }) => {
      const pattern = this.patterns[tag];
      return pattern ? [{ pattern, value }] : [];
    });
  }

  save = () => this.programme.save();
  restore = (state: ReturnType<Programme['save']>) => this.programme.restore(state);

  /**
   * What nobody can do better than, from the duals made whole: exact, whatever the programme's rounding. Each bar on sale
   * limits how much the duals may promise together; a bar with few of its kind only lowers it by what it promises too much.
   */
  bound(): number {
    const { kinds, bins, grain } = this.problem;
    const duals = kinds.map((_, i) =>
      Math.floor(Math.max(0, this.programme.duals[i] ?? 0) * scale),
    );
    const { fills } = this.sack.fill(duals, this.whole.demand);
    const most = (bin: number) => fills[bin]?.value ?? 0;
    const promised = kinds.reduce((sum, kind, i) => sum + kind.demand * (duals[i] ?? 0), 0);
    const open = bins.flatMap((bin, i) =>
      (this.binRow[i] ?? -1) < 0 && most(i) > 0 ? [{ bin, i }] : [],
    );
    if (open.length === 1 && bins.length === 1) {
      const [only] = open;
      return only ? Math.ceil(promised / most(only.i)) * only.bin.cost : 0;
    }
    const share = open.reduce((least, { bin, i }) => Math.min(least, bin.cost / most(i)), Infinity);
    const factor = Number.isFinite(share) ? share : this.dearest / scale;
    const over = bins.reduce(
      (sum, bin, i) =>
        (this.binRow[i] ?? -1) < 0
          ? sum
          : sum + bin.quantity * Math.max(0, factor * most(i) - bin.cost),
      0,
    );
    const value = factor * promised - over;
    return Math.max(0, Math.ceil(value / grain - 1e-9 * (1 + value / grain)) * grain);
  }
}

import { answerOf } from './answer';
import { lowerBound } from './bound';
import { refuse } from './refuse';
import { type Problem, problemOf } from './problem';
import { sawSheet } from './saw';
import { Search } from './search';
import { planOf, type Snapshot, treeOf } from './snapshot';
import { type Answer, type Job } from './types';

export interface SolveOptions {
  /** The same seed and iterations give the same answer. */
  seed?: number;
  /** Moves at most; 0 for the quick answer alone. */
  iterations?: number;
  /** A clock in milliseconds and how long it may run; without them only `iterations` ends the search. */
  clock?: () => number;
  timeLimit?: number;
  /** Hears of the quick answer and of every better one. */
  onProgress?: (answer: Answer) => void;
  shouldStop?: () => boolean;
}

/** Moves where nothing else is said. */
const usualIterations = 20000;

/** One search over a job; `run` may be called again and goes on. */
class Solver {
  private readonly problem: Problem;
  private readonly search: Search;
  private best: Snapshot;
  private bound = 0;
  private moves = 0;
  private readonly began: number;

  constructor(
    private readonly job: Job,
    private readonly options: SolveOptions,
  ) {
    this.began = options.clock?.() ?? 0;
    this.problem = problemOf(job);
    if (job.options?.machine) refuse(job, this.problem);
    const { problem } = this;
    const parts = problem.demand.reduce((sum, qty) => sum + qty, 0);
    const stock = problem.qty.reduce((sum, qty) => sum + qty, 0);
    const quick = this.searchOf(Math.min(parts, stock));
    this.best = this.construct(quick);
    const sheets = Math.min(stock, this.best.bins.length + (problem.bins > 1 ? 8 : 0));
    this.search = this.searchOf(sheets);
    this.search.load(this.best);
  }

  private searchOf(sheets: number): Search {
    const { job, problem } = this;
    const search = new Search(problem, Math.max(1, sheets), this.options.seed ?? 1);
    if (job.options?.machine) {
      const deal = (kind: number) => problem.members[kind]![0]!;
      search.allow = (s) => {
        const bin = search.forest.binOf(s);
        const plan = planOf(problem, job.kerf, treeOf(search.forest, s), deal);
        return sawSheet(plan, bin, job.sheets[bin]!, job.kerf, job.options) !== null;
      };
    }
    return search;
  }

  /** Several quick layouts, the best of them. */
  private construct(search: Search): Snapshot {
    const { problem } = this;
    const parts = problem.demand.reduce((sum, qty) => sum + qty, 0);
    const tries = parts > 1000 ? 1 : problem.bins > 1 ? 12 : 6;
    let best: Snapshot | null = null;
    for (let i = 0; i < tries; i++) {
      if (best !== null && this.over(0.03)) break;
      search.reset(i);
      search.budget = Infinity;
      let before = Infinity;
      while (search.missing > 0 && search.missing < before) {
        before = search.missing;
        search.recreate();
      }
      const shot = search.snapshot();
      if (best === null || better(shot, best)) best = shot;
    }
    return best ?? search.snapshot();
  }

  private over(share = 1): boolean {
    const { clock, timeLimit = Infinity, iterations, shouldStop } = this.options;
    const moves = iterations ?? (clock && timeLimit < Infinity ? Infinity : usualIterations);
    if (this.moves >= moves * share) return true;
    if (clock && clock() - this.began >= timeLimit * share) return true;
    return shouldStop?.() ?? false;
  }

  /** Moves until nothing is missing or the share of the effort is used up; true when nothing is. */
  private reach(share: number, most = Infinity): boolean {
    const { search } = this;
    for (let i = 0; search.missing > 0; i++) {
      if (i >= most) return false;
      if ((i & 7) === 0 && this.over(share)) return false;
      search.step();
      this.moves++;
    }
    return true;
  }

  answer(): Answer {
    return answerOf(this.job, this.problem, this.best, this.bound);
  }

  private keep(): void {
    this.best = this.search.snapshot();
    this.options.onProgress?.(this.answer());
  }

  run(): Answer {
    this.options.onProgress?.(this.answer());
    if (this.problem.kinds === 0) return this.answer();
    this.bound = lowerBound(this.problem);
    if (this.best.missing > 0) this.fill();
    else {
      this.lower();
      if (this.job.options?.offcut !== false) this.strip();
    }
    return this.answer();
  }

  /** Stock is short: as much as goes on what there is. */
  private fill(): void {
    const { search } = this;
    search.budget = Infinity;
    while (this.best.missing > 0 && !this.over()) {
      search.step();
      this.moves++;
      if (search.missing < this.best.missing) this.keep();
    }
  }

  private share(): number {
    if (this.job.options?.offcut === false) return 1;
    // With two sheets and hardly any room to spare, a narrower strip is what can be won.
    const { problem, best } = this;
    const load = problem.area.reduce((sum, area, t) => sum + area * problem.demand[t]!, 0);
    const room = problem.binW[best.bins[0]!]! * problem.binH[best.bins[0]!]!;
    const tight = problem.bins === 1 && load > 0.97 * room * (best.bins.length - 1);
    return tight && best.bins.length <= 2 ? 0.1 : 0.7;
  }

  /** Lower and lower goals for the cost. */
  private lower(): void {
    const { search, problem } = this;
    const unit = problem.cost.reduce(gcd, 0);
    const share = this.share();
    while (this.best.cost > this.bound && unit > 0 && !this.over(share)) {
      search.budget = this.best.cost - unit;
      search.shed();
      search.recreate();
      search.settle();
      if (this.reach(share)) this.keep();
    }
  }

  /** The same sheets, the last of them cut down to less and less. */
  private strip(): void {
    const { search, problem } = this;
    if (this.best.bins.length === 0) return;
    search.fixed = true;
    let patience = 200;
    let step = Infinity;
    while (!this.over()) {
      search.load(this.best);
      const s = search.lowest();
      const height = this.best.heights[s]!;
      const full = problem.binH[this.best.bins[s]!]!;
      step = Math.max(1, Math.min(step, Math.ceil(full / 50)));
      const goal = height - step;
      if (goal < 1) {
        if (step === 1) return;
        step >>= 1;
        continue;
      }
      search.lowerTo(s, goal);
      if (this.reach(1, patience)) this.keep();
      else if (step > 1) step = Math.ceil(step / 2);
      else {
        patience *= 2;
        step = Math.max(1, Math.ceil(full / 200));
      }
    }
  }
}

const gcd = (a: number, b: number): number => (b === 0 ? a : gcd(b, a % b));

const better = (a: Snapshot, b: Snapshot): boolean =>
  a.missing < b.missing || (a.missing === b.missing && a.cost < b.cost);

/**
 * Lays a job out: a quick answer at once, then better ones until the effort is used up or it is proven. Deterministic by
 * seed and iterations; with a clock it may end earlier.
 */
export function solve(job: Job, options: SolveOptions = {}): Answer {
  return new Solver(job, options).run();
}

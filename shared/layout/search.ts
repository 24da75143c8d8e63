import { Chooser, type Choice } from './chooser';
import { Forest } from './forest';
import { type Problem } from './problem';
import { Random } from './random';
import { type Snapshot, treeOf } from './snapshot';

/** The numbers of the search; found by trial on the published sets (`bench:layout`). */
export const tuning = {
  /** Share of slots passed over. */
  blink: 0.03,
  /** Length of the late acceptance's memory. */
  history: 100,
  /** Most branches taken off in one move. */
  ruins: 20,
  /** Share of moves that clear a sheet where sizes differ. */
  swap: 0.1,
  choice: 1 as Choice,
};

/** How the quick layouts choose. */
const starts: { choice: Choice; blink: number }[] = [
  { choice: 1, blink: 0 },
  { choice: 0, blink: 0 },
  { choice: 4, blink: 0 },
  { choice: 2, blink: 0 },
  { choice: 1, blink: 0.05 },
  { choice: 0, blink: 0.05 },
];

/** Kinds considered at once, so that ten thousand parts take bounded time. */
const rowsFor = (parts: number): number => Math.min(512, Math.max(16, Math.floor(4e5 / parts)));

/** Ruin and recreate towards a goal: all parts on sheets that count no more than `budget`. */
export class Search {
  readonly forest: Forest;
  readonly random: Random;
  readonly chooser: Chooser;
  /** Parts without a place, by kind; their area; what the open sheets count. */
  readonly out: Int32Array;
  missing = 0;
  spent = 0;
  budget = 0;
  iterations = 0;
  /** No sheet is opened or closed. */
  fixed = false;
  /** Says whether a sheet can be cut on the machine; asked after every part. */
  allow: ((s: number) => boolean) | null = null;
  private readonly usedBins: Int32Array;
  private readonly savedOut: Int32Array;
  private readonly savedBins: Int32Array;
  private readonly history: Float64Array;
  private tick = 0;
  /** Open sheets, for this round. */
  private readonly open: Int32Array;
  private opened = 0;
  /** Kinds without a place in this round, each with a row of counts and best slots by sheet. */
  private readonly list: Int32Array;
  private readonly row: Int32Array;
  private listed = 0;
  private readonly counts: Int32Array;
  private readonly scores: Float64Array;
  private readonly slots: Int32Array;
  private readonly turned: Uint8Array;
  private readonly freed: (kind: number) => void;

  constructor(
    readonly problem: Problem,
    readonly sheets: number,
    seed: number,
  ) {
    const { kinds, w, h } = problem;
    let least = Infinity;
    for (let t = 0; t < kinds; t++) least = Math.min(least, w[t]!, h[t]!);
    const { area: kindArea, stages, first } = problem;
    this.forest = new Forest({ sheets, kindW: w, kindH: h, kindArea, stages, first, least });
    this.random = new Random(seed);
    this.chooser = new Chooser(problem, this.forest, this.random);
    this.out = Int32Array.from(problem.demand);
    this.savedOut = new Int32Array(kinds);
    this.usedBins = new Int32Array(problem.bins);
    this.savedBins = new Int32Array(problem.bins);
    this.history = new Float64Array(tuning.history);
    for (let t = 0; t < kinds; t++) this.missing += this.out[t]! * kindArea[t]!;
    const most = Math.min(kinds, rowsFor(problem.demand.reduce((a, b) => a + b, 0)));
    this.list = new Int32Array(most);
    this.row = Int32Array.from({ length: most }, (_, i) => i);
    this.open = new Int32Array(sheets);
    this.counts = new Int32Array(most * sheets);
    this.scores = new Float64Array(most * sheets);
    this.slots = new Int32Array(most * sheets);
    this.turned = new Uint8Array(most * sheets);
    this.freed = (kind) => {
      this.out[kind]!++;
      this.missing += kindArea[kind]!;
    };
  }

  /** Opens a sheet of a bin in the first free place; its number, or -1. */
  openSheet(which: number, height = this.problem.binH[which]!): number {
    const { forest, problem } = this;
    if (this.usedBins[which]! >= problem.qty[which]!) return -1;
    for (let s = 0; s < this.sheets; s++) {
      if (forest.binOf(s) >= 0) continue;
      forest.open(s, which, problem.binW[which]!, height);
      this.usedBins[which]!++;
      this.spent += problem.cost[which]!;
      return s;
    }
    return -1;
  }

  /** Clears a sheet and closes it. */
  closeSheet(s: number): void {
    this.clear(s);
    const which = this.forest.binOf(s);
    this.usedBins[which]!--;
    this.spent -= this.problem.cost[which]!;
    this.forest.close(s);
  }

  clear(s: number): void {
    const root = this.forest.rootOf(s);
    if (root >= 0) this.forest.remove(s, root, this.freed);
  }

  private look(i: number, s: number): void {
    const { chooser } = this;
    chooser.look(this.list[i]!, s);
    const at = this.row[i]! * this.sheets + s;
    this.counts[at] = chooser.count;
    this.scores[at] = chooser.score;
    this.slots[at] = chooser.slot;
    this.turned[at] = chooser.rotated ? 1 : 0;
  }

  private gather(): void {
    const { forest, problem, out } = this;
    this.opened = 0;
    for (let s = 0; s < this.sheets; s++) if (forest.binOf(s) >= 0) this.open[this.opened++] = s;
    this.listed = 0;
    for (let t = 0; t < problem.kinds && this.listed < this.list.length; t++)
      if (out[t]! > 0) this.list[this.listed++] = t;
    for (let i = 0; i < this.listed; i++)
      for (let j = 0; j < this.opened; j++) this.look(i, this.open[j]!);
  }

  /** Places what is out, the most restricted first; opens sheets as the budget allows. */
  recreate(): void {
    this.gather();
    for (;;) {
      const i = this.mostRestricted();
      if (i >= 0) this.place(i);
      else if (this.listed === 0 || !this.openMore()) return;
    }
  }

  private place(i: number): void {
    const { forest, problem } = this;
    const kind = this.list[i]!;
    const s = this.bestSheet(i);
    const at = this.row[i]! * this.sheets + s;
    if (s < 0) {
      // Every slot was passed over by chance: none this time.
      for (let j = 0; j < this.opened; j++)
        this.counts[this.row[i]! * this.sheets + this.open[j]!] = 0;
      return;
    }
    const slots = forest.slotsOn(s);
    const slot = this.slots[at]!;
    const mark = forest.memory.mark();
    forest.insert(s, slots.node[slot]!, slots.axis[slot]!, kind, this.turned[at] === 1);
    if (this.allow !== null && !this.allow(s)) {
      forest.undo(mark);
      this.nextBest(i, s);
      return;
    }
    this.missing -= problem.area[kind]!;
    if (--this.out[kind]! === 0) this.unlist(i);
    for (let j = 0; j < this.listed; j++) this.look(j, s);
  }

  /** The machine refuses the best slot: the next one after it, or none on this sheet. */
  private nextBest(i: number, s: number): void {
    const { chooser } = this;
    const at = this.row[i]! * this.sheets + s;
    chooser.after(this.scores[at]!, this.slots[at]!, this.turned[at]!);
    this.look(i, s);
    chooser.after(-Infinity, -1, 0);
    if (chooser.slot < 0) this.counts[at] = 0;
  }

  private unlist(i: number): void {
    const last = --this.listed;
    const freedRow = this.row[i]!;
    this.list[i] = this.list[last]!;
    this.row[i] = this.row[last]!;
    this.row[last] = freedRow;
  }

  private mostRestricted(): number {
    const { sheets, counts, open, opened } = this;
    let best = -1;
    let least = Infinity;
    for (let i = 0; i < this.listed; i++) {
      let count = 0;
      const from = this.row[i]! * sheets;
      for (let j = 0; j < opened; j++) count += counts[from + open[j]!]!;
      if (count > 0 && (count < least || (count === least && this.list[i]! < this.list[best]!))) {
        best = i;
        least = count;
      }
    }
    return best;
  }

  private bestSheet(i: number): number {
    const { open, opened, sheets } = this;
    let best = -1;
    let score = Infinity;
    const from = this.row[i]! * sheets;
    for (let j = 0; j < opened; j++) {
      const s = open[j]!;
      if (this.counts[from + s] === 0 || this.slots[from + s]! < 0) continue;
      if (this.scores[from + s]! < score) {
        best = s;
        score = this.scores[from + s]!;
      }
    }
    return best;
  }

  /** Opens a sheet some listed kind fits on, if the budget allows one. */
  private openMore(): boolean {
    const { problem, random } = this;
    if (this.fixed) return false;
    let [which, many] = [-1, 0];
    for (let b = 0; b < problem.bins; b++) {
      if (this.usedBins[b]! >= problem.qty[b]!) continue;
      if (this.spent + problem.cost[b]! > this.budget || !this.wanted(b)) continue;
      if (random.below(++many) === 0) which = b;
    }
    const s = which < 0 ? -1 : this.openSheet(which);
    if (s < 0) return false;
    this.open[this.opened++] = s;
    for (let i = 0; i < this.listed; i++) this.look(i, s);
    return true;
  }

  private wanted(b: number): boolean {
    const { problem } = this;
    for (let i = 0; i < this.listed; i++)
      if (problem.fits[this.list[i]! * problem.bins + b]! > 0) return true;
    return false;
  }

  private ruin(): void {
    const { forest, random } = this;
    this.opened = 0;
    for (let s = 0; s < this.sheets; s++) if (forest.binOf(s) >= 0) this.open[this.opened++] = s;
    if (this.opened === 0) return;
    const several = this.problem.bins > 1 && !this.fixed;
    if (several && random.unit() < tuning.swap) {
      this.closeSheet(this.open[random.below(this.opened)]!);
    }
    const many = 1 + random.below(tuning.ruins);
    for (let k = 0; k < many; k++) {
      const s = this.open[random.below(this.opened)]!;
      if (forest.binOf(s) < 0 || forest.rootOf(s) < 0) continue;
      const slots = forest.slotsOn(s);
      forest.remove(s, slots.nodes[random.below(slots.count)]!, this.freed);
      if (several && forest.rootOf(s) < 0) this.closeSheet(s);
    }
  }

  /** What is there now is where the search goes on from, with a new memory. */
  settle(): void {
    this.chooser.choice = tuning.choice;
    this.chooser.blink = tuning.blink * 4294967296;
    this.history.fill(this.missing);
    this.forest.memory.commit();
  }

  /** One move, kept or taken back. */
  step(): void {
    const { missing, spent } = this;
    this.savedOut.set(this.out);
    this.savedBins.set(this.usedBins);
    this.ruin();
    this.recreate();
    this.iterations++;
    const place = this.tick++ % this.history.length;
    if (this.missing <= missing || this.missing <= this.history[place]!) {
      this.history[place] = this.missing;
      this.forest.memory.commit();
      return;
    }
    this.history[place] = missing;
    this.forest.undo();
    this.out.set(this.savedOut);
    this.usedBins.set(this.savedBins);
    this.missing = missing;
    this.spent = spent;
  }

  /** Everything out, nothing open; another start for the same search. */
  reset(start: number): void {
    const { problem } = this;
    for (let s = 0; s < this.sheets; s++) if (this.forest.binOf(s) >= 0) this.closeSheet(s);
    this.out.set(problem.demand);
    this.settle();
    const { choice, blink } = starts[start % starts.length]!;
    this.chooser.choice = choice;
    this.chooser.blink = blink * 4294967296;
  }

  /** Closes sheets until the goal is met, those first that hold least for what they count. */
  shed(): void {
    const { forest, problem } = this;
    while (this.spent > this.budget) {
      let [worst, least] = [-1, Infinity];
      for (let s = 0; s < this.sheets; s++) {
        const which = forest.binOf(s);
        if (which < 0 || problem.cost[which] === 0) continue;
        const held = forest.usedOn(s) / problem.cost[which]!;
        if (held < least) [worst, least] = [s, held];
      }
      if (worst < 0) return;
      this.closeSheet(worst);
    }
  }

  /** The open sheet with the lowest tree, by its share of the sheet. */
  lowest(): number {
    const { forest } = this;
    let [low, share] = [0, Infinity];
    for (let s = 0; s < this.sheets; s++) {
      if (forest.binOf(s) < 0 || forest.rootOf(s) < 0) continue;
      const part = forest.heightOf(forest.rootOf(s)) / forest.limitH(s);
      if (part < share) [low, share] = [s, part];
    }
    return low;
  }

  /** A lower goal for one sheet: its parts are placed anew. */
  lowerTo(s: number, height: number): void {
    this.clear(s);
    this.forest.setLimitH(s, height);
    this.recreate();
    this.settle();
  }

  /** Puts everything as a snapshot has it. */
  load(shot: Snapshot): void {
    for (let s = 0; s < this.sheets; s++) if (this.forest.binOf(s) >= 0) this.closeSheet(s);
    shot.bins.forEach((which, i) => this.forest.plant(this.openSheet(which), shot.trees[i]!));
    this.out.set(shot.out);
    this.missing = shot.missing;
    this.settle();
  }

  snapshot(): Snapshot {
    const { forest } = this;
    const shot: Snapshot = {
      bins: [],
      heights: [],
      trees: [],
      out: Int32Array.from(this.out),
      missing: this.missing,
      cost: 0,
    };
    for (let s = 0; s < this.sheets; s++) {
      if (forest.binOf(s) < 0 || forest.rootOf(s) < 0) continue;
      shot.bins.push(forest.binOf(s));
      shot.heights.push(forest.heightOf(forest.rootOf(s)));
      shot.trees.push(treeOf(forest, s));
      shot.cost += this.problem.cost[forest.binOf(s)]!;
    }
    return shot;
  }
}

import { type Column, ColumnStore } from './column-store';
import { invert } from './invert';

const tiny = 1e-9;
const forbidden = 40;

export interface ProgrammeState {
  basis: Int32Array;
  inverse: Float64Array;
  rhs: Float64Array;
}

/**
 * A small linear programme in the form min c·x, A x ≥ b, x ≥ 0, whose columns come while it is solved: revised simplex with
 * a dense inverse. It starts from one column a row that is dear enough never to be wanted (`penalty`), so any b is possible.
 */
export class Programme {
  private readonly columns = new ColumnStore();
  /** Values of the basic columns, by row; and the rows' duals. */
  private readonly x: Float64Array;
  readonly duals: Float64Array;
  private inverse: Float64Array;
  private basis: Int32Array;
  private rhs: Float64Array;
  private readonly isBasic: boolean[] = [];
  private pivots = 0;
  /** Steps of arithmetic so far, roughly: a clock that goes alike everywhere. */
  work = 0;
  private readonly direction: Float64Array;

  constructor(
    private readonly size: number,
    rhs: readonly number[],
    penalty: readonly number[],
  ) {
    this.rhs = Float64Array.from(rhs);
    this.x = new Float64Array(size);
    this.duals = new Float64Array(size);
    this.direction = new Float64Array(size);
    this.inverse = new Float64Array(size * size);
    this.basis = new Int32Array(size);
    for (let row = 0; row < size; row += 1) {
      const under = (rhs[row] ?? 0) < 0;
      const slack = this.add({ cost: 0, rows: [row], values: [-1], tag: -1 });
      const dear = this.add({ cost: penalty[row] ?? 0, rows: [row], values: [1], tag: -1 });
      this.basis[row] = under ? slack : dear;
      this.isBasic[this.basis[row] ?? 0] = true;
    }
    this.refactor();
  }

  add(column: Column): number {
    this.isBasic.push(false);
    return this.columns.add(column);
  }

  /** Value of each column with a tag that is above nothing. */
  solution(): { tag: number; value: number }[] {
    const found: { tag: number; value: number }[] = [];
    for (let row = 0; row < this.size; row += 1) {
      const tag = this.columns.tag(this.basis[row] ?? 0);
      const value = this.x[row] ?? 0;
      if (tag >= 0 && value > 1e-7) found.push({ tag, value });
    }
    return found;
  }

  objective(): number {
    let sum = 0;
    for (let row = 0; row < this.size; row += 1)
      sum += (this.x[row] ?? 0) * (this.columns.cost[this.basis[row] ?? 0] ?? 0);
    return sum;
  }

  save(): ProgrammeState {
    return { basis: this.basis.slice(), inverse: this.inverse.slice(), rhs: this.rhs.slice() };
  }

  restore(state: ProgrammeState): void {
    this.basis = state.basis.slice();
    this.inverse = state.inverse.slice();
    this.rhs = state.rhs.slice();
    this.isBasic.fill(false);
    for (const column of this.basis) this.isBasic[column] = true;
    this.values();
  }

  setRhs(rhs: readonly number[]): void {
    this.rhs = Float64Array.from(rhs);
    this.values();
  }

  /** Makes columns too dear to be wanted, and the others what they were. */
  forbid(unwanted: (tag: number) => boolean): void {
    this.columns.forbid(unwanted, forbidden);
    this.prices();
  }

  /** Back to x ≥ 0 after another b, then to the best over the columns there are. False when it ran out of pivots. */
  solve(limit = 4000): boolean {
    for (let i = 0; i < limit; i += 1) if (!this.dualStep() && !this.primalStep()) return true;
    return false;
  }

  private reducedCost(column: number): number {
    return (this.columns.cost[column] ?? 0) - this.columns.times(column, this.duals, 0);
  }

  /** How the basic columns move when this one comes in. */
  private direct(column: number): void {
    for (let row = 0; row < this.size; row += 1)
      this.direction[row] = this.columns.times(column, this.inverse, row * this.size);
  }

  private primalStep(): boolean {
    let [entering, least] = [-1, -1e-8];
    for (let j = 0; j < this.columns.count; j += 1) {
      if (this.isBasic[j]) continue;
      const reduced = this.reducedCost(j);
      if (reduced < least) [entering, least] = [j, reduced];
    }
    if (entering < 0) return false;
    this.direct(entering);
    const leaving = this.leaves();
    if (leaving < 0) return false;
    this.pivot(leaving, entering);
    return true;
  }

  /** The row whose column is used up first; of equal ones that with the surest pivot. */
  private leaves(): number {
    let [leaving, least, surest] = [-1, Infinity, 0];
    for (let row = 0; row < this.size; row += 1) {
      const by = this.direction[row] ?? 0;
      if (by <= 1e-8) continue;
      const ratio = Math.max(0, this.x[row] ?? 0) / by;
      if (ratio > least + tiny || (ratio > least - tiny && by <= surest)) continue;
      [leaving, least, surest] = [row, Math.min(ratio, least), by];
    }
    return leaving;
  }

  private dualStep(): boolean {
    let [leaving, lowest] = [-1, -1e-8];
    for (let row = 0; row < this.size; row += 1) {
      const value = this.x[row] ?? 0;
      if (value < lowest) [leaving, lowest] = [row, value];
    }
    if (leaving < 0) return false;
    const { columns, inverse, isBasic } = this;
    const at = leaving * this.size;
    let [entering, least, surest] = [-1, Infinity, 0];
    for (let j = 0; j < columns.count; j += 1) {
      if (isBasic[j]) continue;
      const alpha = columns.times(j, inverse, at);
      if (alpha >= -1e-8) continue;
      const ratio = Math.max(0, this.reducedCost(j)) / -alpha;
      if (ratio > least + tiny || (ratio > least - tiny && -alpha <= surest)) continue;
      [entering, least, surest] = [j, Math.min(ratio, least), -alpha];
    }
    if (entering < 0) return false;
    this.direct(entering);
    this.pivot(leaving, entering);
    return true;
  }

  private pivot(leaving: number, entering: number): void {
    const { size, inverse, direction, x, basis, duals } = this;
    const by = direction[leaving] ?? 1;
    const reduced = this.reducedCost(entering);
    const at = leaving * size;
    this.isBasic[basis[leaving] ?? 0] = false;
    this.isBasic[entering] = true;
    basis[leaving] = entering;
    this.pivots += 1;
    this.work += size * size + 6 * this.columns.count;
    if (this.pivots % 150 === 0) {
      this.refactor();
      return;
    }
    const filled: number[] = [];
    for (let k = 0; k < size; k += 1) {
      const value = (inverse[at + k] ?? 0) / by;
      inverse[at + k] = value;
      if (value !== 0) filled.push(k);
    }
    const moved = (x[leaving] ?? 0) / by;
    for (let row = 0; row < size; row += 1) {
      const share = direction[row] ?? 0;
      if (row === leaving || share === 0) continue;
      const to = row * size;
      for (const k of filled)
        inverse[to + k] = (inverse[to + k] ?? 0) - share * (inverse[at + k] ?? 0);
      x[row] = (x[row] ?? 0) - share * moved;
    }
    x[leaving] = moved;
    for (const k of filled) duals[k] = (duals[k] ?? 0) + reduced * (inverse[at + k] ?? 0);
  }

  /** The inverse from scratch, so that rounding does not pile up. */
  private refactor(): void {
    const { size } = this;
    const a = new Float64Array(size * size);
    this.basis.forEach((column, at) => this.columns.into(column, a, size, at));
    this.inverse = invert(a, size);
    this.values();
  }

  private values(): void {
    const { size, inverse, rhs, x } = this;
    for (let row = 0; row < size; row += 1) {
      let sum = 0;
      for (let k = 0; k < size; k += 1) sum += (inverse[row * size + k] ?? 0) * (rhs[k] ?? 0);
      x[row] = Math.abs(sum) < 1e-11 ? 0 : sum;
    }
    this.prices();
  }

  private prices(): void {
    const { size, inverse, duals, basis } = this;
    duals.fill(0);
    for (let row = 0; row < size; row += 1) {
      const cost = this.columns.cost[basis[row] ?? 0] ?? 0;
      if (cost === 0) continue;
      for (let k = 0; k < size; k += 1)
        duals[k] = (duals[k] ?? 0) + cost * (inverse[row * size + k] ?? 0);
    }
  }
}

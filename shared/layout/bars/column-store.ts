/** A column of the programme: what it costs and what it gives to each row. */
export interface Column {
  cost: number;
  rows: readonly number[];
  values: readonly number[];
  /** What the caller knows it by; -1 for the programme's own slack. */
  tag: number;
}

const grown = <T extends Float64Array | Int32Array>(old: T, make: (size: number) => T): T => {
  const bigger = make(old.length * 2);
  bigger.set(old);
  return bigger;
};

/** Columns one behind the other in flat arrays: the programme looks through all of them at every step. */
export class ColumnStore {
  count = 0;
  /** What each costs now, and what it costs when it is not forbidden. */
  cost = new Float64Array(256);
  private own = new Float64Array(256);
  private tags = new Int32Array(256);
  private starts = new Int32Array(257);
  private rows = new Int32Array(1024);
  private values = new Float64Array(1024);

  add({ cost, rows, values, tag }: Column): number {
    if (this.count + 2 > this.cost.length) {
      this.cost = grown(this.cost, (n) => new Float64Array(n));
      this.own = grown(this.own, (n) => new Float64Array(n));
      this.tags = grown(this.tags, (n) => new Int32Array(n));
      this.starts = grown(this.starts, (n) => new Int32Array(n));
    }
    const from = this.starts[this.count] ?? 0;
    while (from + rows.length > this.rows.length) {
      this.rows = grown(this.rows, (n) => new Int32Array(n));
      this.values = grown(this.values, (n) => new Float64Array(n));
    }
    rows.forEach((row, i) => {
      this.rows[from + i] = row;
      this.values[from + i] = values[i] ?? 0;
    });
    const column = this.count;
    this.cost[column] = cost;
    this.own[column] = cost;
    this.tags[column] = tag;
    this.starts[column + 1] = from + rows.length;
    this.count += 1;
    return column;
  }

  tag = (column: number): number => this.tags[column] ?? -1;

  /** The column times a vector that begins at `offset`. */
  times(column: number, vector: Float64Array, offset: number): number {
    const { rows, values, starts } = this;
    const end = starts[column + 1] ?? 0;
    let sum = 0;
    for (let i = starts[column] ?? 0; i < end; i += 1)
      sum += (vector[offset + (rows[i] ?? 0)] ?? 0) * (values[i] ?? 0);
    return sum;
  }

  /** Writes the column into a square matrix. */
  into(column: number, matrix: Float64Array, size: number, at: number): void {
    const end = this.starts[column + 1] ?? 0;
    for (let i = this.starts[column] ?? 0; i < end; i += 1)
      matrix[(this.rows[i] ?? 0) * size + at] = this.values[i] ?? 0;
  }

  /** Makes columns too dear to be wanted, and the others what they were. */
  forbid(unwanted: (tag: number) => boolean, dear: number): void {
    for (let column = 0; column < this.count; column += 1) {
      const tag = this.tag(column);
      if (tag >= 0) this.cost[column] = unwanted(tag) ? dear : (this.own[column] ?? 0);
    }
  }
}

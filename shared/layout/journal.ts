/** A block of integers that remembers what was written, to take it back. */
export class Journal {
  cells: Int32Array;
  private log = new Int32Array(4096);
  private length = 0;

  constructor(size: number) {
    this.cells = new Int32Array(size);
  }

  put(cell: number, value: number): void {
    if (this.length + 2 > this.log.length) this.lengthen();
    this.log[this.length] = cell;
    this.log[this.length + 1] = this.cells[cell]!;
    this.length += 2;
    this.cells[cell] = value;
  }

  private lengthen(): void {
    const longer = new Int32Array(this.log.length * 2);
    longer.set(this.log);
    this.log = longer;
  }

  /** Makes room for `size` integers. */
  reserve(size: number): void {
    if (size <= this.cells.length) return;
    const longer = new Int32Array(size * 2);
    longer.set(this.cells);
    this.cells = longer;
  }

  /** Where `undo` can come back to. */
  mark(): number {
    return this.length;
  }

  /** What is there now stays. */
  commit(): void {
    this.length = 0;
  }

  /** Takes back all since a mark; hears of every cell below `watched`. */
  undo(mark: number, watched: number, touched: (cell: number) => void): void {
    const { cells, log } = this;
    for (let i = this.length - 2; i >= mark; i -= 2) {
      const cell = log[i]!;
      cells[cell] = log[i + 1]!;
      if (cell < watched) touched(cell);
    }
    this.length = mark;
  }
}

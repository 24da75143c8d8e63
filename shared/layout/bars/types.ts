/**
 * Cutting stock in one dimension: boards of one width, strips, rod. Every length is an integer of the layout's unit
 * (0.000625 mm); parts and kerf rounded up, stock down, by whoever makes the job.
 */
export interface BarStock {
  length: number;
  /** How many there are; null for as many as are wanted. */
  quantity: number | null;
  /** What one costs, in the smallest coin or any other whole number; without any, fewest (of one length) or least length. */
  cost?: number;
}

export interface BarItem {
  length: number;
  quantity: number;
}

export interface BarJob {
  stock: readonly BarStock[];
  items: readonly BarItem[];
  /** Taken between two pieces by the saw. */
  kerf: number;
  /** Taken off either end before the first and after the last piece, its saw cut included. */
  trim: { start: number; end: number };
}

/** A piece on a bar: item by its place in the job's list, from `x` on. */
export interface BarPlacement {
  item: number;
  x: number;
  length: number;
}

/** One saw cut. The stop is set `setting` from the end that was cut last. */
export interface BarCut {
  n: number;
  /** Where the kerf begins, from the bar's left end. */
  at: number;
  setting: number;
  /** The saw's own width there; less where the cut lies partly in the end. */
  kerf: number;
  kind: 'trim' | 'part' | 'end';
  /** The stop stays where it is. */
  same: boolean;
  /** The item this cut frees; null for the trim. */
  frees: number | null;
}

export interface BarSheet {
  /** Which stock, by its place in the job's list. */
  stock: number;
  placements: BarPlacement[];
  cuts: BarCut[];
  /** What is left, longer than a kerf. */
  offcuts: { x: number; length: number }[];
}

export interface LeftOut {
  item: number;
  quantity: number;
  because: 'too-long' | 'stock-used-up';
}

export interface BarAnswer {
  bars: BarSheet[];
  /** In the job's cost, or bars, or length, as `measure` says. */
  cost: number;
  /** Nobody can do with less for the parts that fit. */
  lowerBound: number;
  measure: 'bars' | 'cost' | 'length';
  proven: boolean;
  leftOut: LeftOut[];
}

export interface BarOptions {
  /** Steps of arithmetic (millions) the search may take, 0 for the quick answer alone; the same number gives the same answer. */
  effort?: number;
  /** Asked between dives; true ends the search with the best so far. */
  stop?: () => boolean;
  onBetter?: (answer: BarAnswer) => void;
}

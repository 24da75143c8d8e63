import { type Grain, type Part, type Stock } from '../../plan/document';

/** A piece the person has in the shop, mm. */
export interface OwnPiece {
  id: string;
  name: string;
  form: Stock['form'];
  thickness: number | null;
  length: number;
  width: number | null;
  quantity: number;
  offcut: boolean;
}

/** A size on sale the person chose in place of the plan's, mm; price of one. */
export interface OwnSize {
  id: string;
  length: number;
  width: number | null;
  price: number | null;
}

/** What is different in the person's shop from what the plan counts on. All in mm; absent or null: as the plan says. */
export interface ShopSettings {
  kerf?: number | null;
  /** Taken off every edge of sheets and both ends of bars. */
  trim?: number | null;
  /** Use what is in the shop before buying. */
  own?: readonly OwnPiece[];
  /** Sizes by stock id. */
  sizes?: Readonly<Record<string, readonly OwnSize[]>>;
  /** Prices by size id. */
  prices?: Readonly<Record<string, number>>;
  /** A size that the person cannot get, by id. */
  without?: readonly string[];
  /** Grain of the stock does not matter to them, by stock id. */
  anyWay?: readonly string[];
  /** Added to every stave of a glued-up panel: in width for its two edges, in length for its ends. */
  stave?: { edge: number; end: number };
}

/** One line of the cut list; sizes in mm, null where they cannot be worked out. */
export interface CutRow {
  partId: string;
  mark: string;
  name: string;
  role: Part['role'];
  quantity: number;
  length: number | null;
  width: number | null;
  thickness: number | null;
  /** With the part's allowance; null where it has none. */
  rough: { length: number; width: number } | null;
  stockId: string | null;
  stock: string;
  grain: Grain;
  /** Steps that make it, in order, counted from 1. */
  steps: { number: number; stepId: string; to: 'roughed' | 'sized' | 'shaped' | 'used' }[];
  /** Which size does not come out, and why. */
  fault: string | null;
}

/** Pieces of one kind to be cut from a stock: `length` runs along the stock's length. */
export interface JobPiece {
  partId: string;
  mark: string;
  name: string;
  role: Part['role'];
  length: number;
  width: number;
  quantity: number;
  /** It may lie the other way round. */
  turn: boolean;
  /** One of so many glued edge to edge to make the part. */
  staves: number;
}

/** A size a stock can be cut from: on sale as often as wanted, or in the shop so many times. */
export interface JobStock {
  id: string;
  source: 'sale' | 'shop';
  name: string;
  length: number;
  /** null for rod and where the width does not matter. */
  width: number | null;
  quantity: number | null;
  price: number | null;
}

/** What to cut from one stock, and from which pieces of it. */
export interface StockJob {
  stockId: string;
  name: string;
  form: Stock['form'];
  /** Lengths alone, or rectangles. */
  kind: 'bars' | 'sheets';
  grained: boolean;
  kerf: number;
  trim: number;
  stock: JobStock[];
  pieces: JobPiece[];
  /** What could not be taken into account, in words. */
  faults: string[];
}

export interface LaidPlacement {
  /** By the piece's place in the job. */
  piece: number;
  x: number;
  y: number;
  /** Along the stock's length and across it, as it lies; mm. */
  w: number;
  h: number;
  turned: boolean;
}

export interface LaidCut {
  n: number;
  /** Across the length (crosscut) or along it (rip). */
  kind: 'crosscut' | 'rip';
  /** The line of the cut's first edge, from the lower left corner of the piece of stock. */
  from: { x: number; y: number };
  to: { x: number; y: number };
  /** Fence or stop from the edge cut last. */
  setting: number;
  /** The fence stays where it is. */
  same: boolean;
  purpose: 'trim' | 'split' | 'part';
  /** Pieces of the job it frees. */
  frees: number[];
}

export interface LaidOffcut {
  x: number;
  y: number;
  w: number;
  h: number;
}

/** One piece of stock, laid out. All in mm. */
export interface LaidSheet {
  /** By the size's place in the job. */
  stock: number;
  placements: LaidPlacement[];
  cuts: LaidCut[];
  offcuts: LaidOffcut[];
  /** Share of its area (length, for bars) that becomes parts. */
  used: number;
}

export interface LaidStock {
  stockId: string;
  sheets: LaidSheet[];
  /** Pieces, or money in the smallest coin, or mm / mm²: what was made least. */
  measure: 'pieces' | 'price' | 'size';
  cost: number;
  lowerBound: number;
  proven: boolean;
  leftOut: { piece: number; quantity: number; because: 'too-big' | 'stock-used-up' }[];
}

/**
 * Laying parts out on sheets. Every length is a whole number of the layout's unit, 0.000625 mm (`units.ts`): parts and
 * kerf rounded up, stock down, by whoever makes the job. x runs along a sheet's w, y along its h, from its left bottom
 * corner.
 */

/** Which way the grain runs: along w, along h, or any way. On a sheet, `free` is a sheet with no grain. */
export type Grain = 'along' | 'across' | 'free';

/** What is taken off each edge before parts are cut, its saw cut included; 0 uses the factory edge. */
export interface Trims {
  left: number;
  right: number;
  bottom: number;
  top: number;
}

export interface Sheet {
  w: number;
  h: number;
  /** How many there are; null for as many as are wanted. */
  qty: number | null;
  /** What one costs, a whole number (the smallest coin); an offcut the shop has costs 0. */
  cost?: number;
  grain?: Grain;
  trims?: Trims;
  /** Already in the shop: costs nothing whatever `cost` says, so it is used first. */
  owned?: boolean;
}

export interface Item {
  w: number;
  h: number;
  qty: number;
  /** May be turned by 90°. Where part and sheet both have grain, the grain decides instead. */
  rotatable: boolean;
  grain?: Grain;
}

/** A limit that is missing does not bind. A cut along a piece's longer side is a rip, across it a crosscut. */
export interface MachineLimits {
  /** Rip capacity: of the two pieces a rip leaves, the narrower lies between fence and blade. */
  rip?: number;
  /** Crosscut capacity: the longest crosscut. */
  crosscut?: number;
  /** Shortest piece that can be held: the longer side of the piece that is being cut. */
  hold?: number;
}

export interface Options {
  /** Most stages of cuts of one direction, a last trim to size apart; none for as many as it takes. */
  stages?: 2 | 3;
  /** The first stage: rips run along the sheet's w, crosscuts along its h; none for either. */
  firstCut?: 'rip' | 'crosscut';
  /** What is to be least; by default cost where every sheet has one, area where sizes differ, else sheets. */
  objective?: Objective;
  /** Cut the last sheet down to the least full-width strip; by default it is. */
  offcut?: boolean;
  machine?: MachineLimits;
}

export type Objective = 'sheets' | 'cost' | 'area';

export interface Job {
  sheets: readonly Sheet[];
  items: readonly Item[];
  kerf: number;
  options?: Options;
}

/** A part on a sheet: `item` by its place in the job's list; w and h as placed. */
export interface Placement {
  item: number;
  x: number;
  y: number;
  w: number;
  h: number;
  rotated: boolean;
}

export interface Rect {
  x: number;
  y: number;
  w: number;
  h: number;
}

/** What a cut frees: a part, a piece to be cut further, an offcut, or an edge that is thrown away. */
export type Frees =
  { kind: 'part'; item: number } | { kind: 'piece' } | { kind: 'offcut' } | { kind: 'trim' };

/**
 * One cut, edge to edge through one piece. Piece 0 is the sheet; a cut makes `near` and, where anything is left, `far`.
 * Numbers are never used twice.
 */
export interface Cut {
  /** From 1, in the order to saw. */
  n: number;
  piece: number;
  /** `x`: the blade runs along h, at an x; `y`: it runs along w, at a y. */
  axis: 'x' | 'y';
  /** Where the kerf begins on the sheet. */
  at: number;
  /** Fence setting: from the piece's left or bottom edge, the one that was cut last. */
  setting: number;
  /** Width of the kerf in the material: less than the job's where the blade runs partly in the edge. */
  kerf: number;
  /** The piece on the side of the edge the setting is measured from; null where the blade takes all of it. */
  near: number | null;
  /** What is left beyond the blade; null for nothing. */
  far: number | null;
  /** What `near` is. */
  frees: Frees;
  /** Same axis and setting as the cut before: the fence stays. */
  same: boolean;
}

export interface LaidSheet {
  /** Which stock, by its place in the job's list. */
  bin: number;
  placements: Placement[];
  cuts: Cut[];
  /** What is left and as wide as a kerf at least. */
  offcuts: Rect[];
}

export type WhyUnplaced = 'too-big' | 'stock-used-up' | 'machine' | 'stopped';

export interface Unplaced {
  item: number;
  qty: number;
  why: WhyUnplaced;
}

export interface Answer {
  sheets: LaidSheet[];
  /** By the objective: sheets, cost or area. */
  cost: number;
  objective: Objective;
  /** Nobody can do with less for the parts that fit. */
  lowerBound: number;
  proven: boolean;
  unplaced: Unplaced[];
}

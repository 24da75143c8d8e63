/** Rules an answer can break. */
export type BrokenRule =
  | 'whole-numbers'
  | 'stock'
  | 'quantity'
  | 'size'
  | 'turned'
  | 'inside'
  | 'apart'
  | 'numbers'
  | 'parent-first'
  | 'edge-to-edge'
  | 'kerf'
  | 'fence'
  | 'pieces'
  | 'freed'
  | 'remainder'
  | 'offcuts'
  | 'sum'
  | 'stages'
  | 'first-cut'
  | 'rip-capacity'
  | 'crosscut-capacity'
  | 'hold'
  | 'cost'
  | 'bound'
  | 'unplaced';

export interface Fault {
  rule: BrokenRule;
  message: string;
  /** Sheet by its place in the answer, cut by its number. */
  sheet?: number;
  cut?: number;
}

import { type Rational } from '../../measure';

/** A thing that varies by itself: a toleranced dimension, or what was read of one. */
export interface Source {
  /** The dimension's id, with `!` before it for what was made of it. */
  key: string;
  dimensionId: string;
  symbol: string;
  name: string;
  read: boolean;
  /** ± about the nominal plus `shift`. */
  tolerance: number;
  /** Middle of an unequal band less the nominal. */
  shift: number;
  setting?: string | undefined;
}

/** A value as an expression meets it: nominal, and slopes by the sources it comes from. */
export interface Flow {
  x: number;
  q: Rational | null;
  slopes: ReadonlyMap<Source, number>;
  /** Somewhere on the way an operation was not linear. */
  curved: boolean;
}

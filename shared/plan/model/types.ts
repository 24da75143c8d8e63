import { type ExpressionFault, type Powers, type Rational } from '../../measure';
import { type Check, type Dimension, type InstrumentName, type Kind } from '../document';
import { type FitWord } from '../document-dimensions';
import { type ExactLength } from '../document-values';

/** A figure read at the bench; the fold's reading entries fit as they are. */
export interface FigureReading {
  value: ExactLength;
  instrument: InstrumentName;
  uncertainty?: ExactLength | undefined;
  place?: string;
}

/** What a bench copy knows; the state of `foldEntries` fits. Given at all, even empty, it means "at the bench". */
export interface ModelReadings {
  /** By dimension id. */
  readings: ReadonlyMap<string, readonly FigureReading[]>;
  /** By dimension or check id. */
  trials?: ReadonlyMap<string, { result: 'fits' | 'loose' | "won't go" }>;
  looks?: ReadonlyMap<string, { result: 'good' | 'not-good' }>;
  /** The person's own instruments, mm (degrees for angles). */
  uncertainties?: Partial<Record<InstrumentName, number>>;
}

/** A fault with the expression it stands in and, for a loop, the dimensions around it in order. */
export interface ModelFault extends ExpressionFault {
  /** `expression`, `tolerance`, `symbol`, `length`, `width`, `thickness` … */
  in: string;
  /** Symbols around a loop, the first again at the end. */
  loop?: string[];
}

/** One source of variation: `slope` × its tolerance is its share of the worst case. */
export interface Contributor {
  dimensionId: string;
  symbol: string;
  name: string;
  /** Made from a reading. */
  read: boolean;
  slope: number;
  /** ± in base units. */
  tolerance: number;
  /** |slope| × tolerance. */
  share: number;
  setting?: string | undefined;
}

/** Readings of one dimension taken together. */
export interface ReadingSummary {
  /** The one that counts: smallest, largest or mean. */
  value: Rational;
  count: number;
  /** Largest less smallest. */
  spread: number;
  /** The uncertainty of the coarsest instrument used. */
  uncertainty: number;
  instrument: InstrumentName;
}

/** A value with what can happen to it. Lengths in mm, angles in degrees, durations in minutes. */
export interface Stack {
  /** Nominal. */
  x: number;
  /** The exact fraction, when the operations kept one. */
  exact: Rational | null;
  /** Middle of the band once unequal tolerances are recentred. */
  centre: number;
  /** ± about the centre, everything at its worst together. */
  worst: number;
  low: number;
  high: number;
  /** ± by root-sum-square about the centre. */
  rss: number;
  /** Largest first. */
  contributors: Contributor[];
}

export interface DimensionState {
  id: string;
  dimension: Dimension;
  kind: Kind;
  /** What it is worth in other expressions; null with an error. */
  value: Stack | null;
  /** The band to make it in, when it has one of its own or follows from its inputs. */
  band: { low: number; high: number; own: boolean } | null;
  /** ± of the band's half. */
  tolerance: number | null;
  readings: ReadingSummary | null;
  /** A taken dimension that still stands on the creator's reading. */
  standIn: boolean;
  error: ModelFault | null;
}

export type CheckVerdict = 'holds' | 'at-risk' | 'fails' | 'needs-a-reading' | 'too-close';

/** What would make a check hold; figures in base units. */
export type Advice =
  | { do: 'hold'; dimensionId: string; tolerance: number }
  | { do: 'move'; dimensionId: string; by: number }
  | { do: 'read'; dimensionId: string }
  | { do: 'try' }
  | { do: 'look' };

export interface CheckState {
  id: string;
  check: Check;
  /** Of what its margins are. */
  kind: Kind;
  verdict: CheckVerdict;
  /** Room left at nominal, and with everything at its worst; below 0 it fails. null with an error or no figures. */
  margin: number | null;
  worstMargin: number | null;
  /** Share that holds by root-sum-square under a normal model, three sigma to the tolerance, 0–1. */
  share: number | null;
  /** For a fit: the gap and its word. */
  fit?: { gap: number; word: FitWord };
  contributors: Contributor[];
  advice: Advice[];
  /** Answered by a trial or a look instead of figures. */
  answeredBy: 'figures' | 'trial' | 'look' | null;
  error: ModelFault | null;
}

export interface SizeState {
  value: Stack | null;
  error: ModelFault | null;
}
export interface PartState {
  id: string;
  length: SizeState;
  width: SizeState;
  thickness: SizeState;
}

/** A compiled expression's wanted kind, or any. */
export type Wanted = Powers | null;

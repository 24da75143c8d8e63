import { instrumentFacts, type Rational, uncertaintyOf, type Uncertainties } from '../../measure';
import { type InstrumentName, type Kind, type Sense } from '../document';
import { type DimensionState } from './types';

export type ReadingVerdict = 'inside' | 'over' | 'under' | 'no-band';

/** What to do about a reading; screens put it in words with `describeReading`. */
export interface ReadingJudgement {
  verdict: ReadingVerdict;
  /** How far outside the band, in base units, above 0; 0 inside. */
  amount: number;
  /** Reading less nominal, signed. */
  off: number;
  /** `work` it down or open it up, `move` it, `set` it again, `keep`: it cannot be put back. */
  cure: 'none' | 'work' | 'move' | 'set' | 'cannot';
  sense: Sense;
  kind: Kind;
  /** The instrument is coarse for this tolerance; finer ones to reach for, or a trial. */
  coarse: { uncertainty: number; tolerance: number; finer: readonly InstrumentName[] } | null;
}

function cureFor(sense: Sense, verdict: ReadingVerdict): ReadingJudgement['cure'] {
  if (verdict === 'inside' || verdict === 'no-band') return 'none';
  if (sense === 'outside') return verdict === 'over' ? 'work' : 'cannot';
  if (sense === 'inside') return verdict === 'under' ? 'work' : 'cannot';
  if (sense === 'setting') return 'set';
  return sense === 'place' ? 'move' : 'work';
}

/**
 * Judges a figure against a dimension's band as it was read, by the dimension's sense. A taken dimension and one
 * without a band have no verdict: what is read is what counts.
 */
export function judgeReading(
  state: DimensionState,
  reading: Rational,
  instrument: InstrumentName = state.dimension.instrument,
  own?: Uncertainties,
): ReadingJudgement {
  const { sense, origin } = state.dimension;
  const x = reading.toNumber();
  const off = x - (state.value?.x ?? x);
  const band = origin === 'taken' ? null : state.band;
  const verdict: ReadingVerdict = !band
    ? 'no-band'
    : x > band.high + 1e-6
      ? 'over'
      : x < band.low - 1e-6
        ? 'under'
        : 'inside';
  const amount = !band
    ? 0
    : verdict === 'over'
      ? x - band.high
      : verdict === 'under'
        ? band.low - x
        : 0;
  const tolerance = band ? (band.high - band.low) / 2 : 0;
  const uncertainty = uncertaintyOf(instrument, own);
  const coarse =
    band && tolerance > 0 && uncertainty > tolerance / 4
      ? { uncertainty, tolerance, finer: finerThan(instrument, tolerance, own) }
      : null;
  return { verdict, amount, off, cure: cureFor(sense, verdict), sense, kind: state.kind, coarse };
}

function finerThan(instrument: InstrumentName, tolerance: number, own?: Uncertainties) {
  return instrumentFacts[instrument].finer.filter(
    (name) => uncertaintyOf(name, own) <= tolerance / 4,
  );
}

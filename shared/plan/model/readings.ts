import { fromExact, Rational, uncertaintyOf } from '../../measure';
import { type Dimension } from '../document';
import { type FigureReading, type ModelReadings, type ReadingSummary } from './types';

function uncertainty(reading: FigureReading, own: ModelReadings['uncertainties']): number {
  return reading.uncertainty
    ? fromExact(reading.uncertainty).mm.toNumber()
    : uncertaintyOf(reading.instrument, own);
}

/** The readings of a dimension as one: which counts, their spread, the coarsest uncertainty. Null without any. */
export function summarise(
  dimension: Dimension,
  given: ModelReadings | null,
): ReadingSummary | null {
  const all = given?.readings.get(dimension.id) ?? [];
  const [first] = all;
  if (!first) return null;
  const values = all.map((reading) => fromExact(reading.value).mm);
  const low = values.reduce((a, b) => (b.compare(a) < 0 ? b : a));
  const high = values.reduce((a, b) => (b.compare(a) > 0 ? b : a));
  const mean = values.reduce((a, b) => a.plus(b)).over(Rational.of(values.length));
  const coarsest = all.reduce((a, b) =>
    uncertainty(b, given?.uncertainties) > uncertainty(a, given?.uncertainties) ? b : a,
  );
  return {
    value: dimension.counts === 'min' ? low : dimension.counts === 'max' ? high : mean,
    count: values.length,
    spread: high.minus(low).toNumber(),
    uncertainty: uncertainty(coarsest, given?.uncertainties),
    instrument: coarsest.instrument,
  };
}

/** ± of a reading in other figures: the larger of its uncertainty and half its spread. */
export const readTolerance = (summary: ReadingSummary): number =>
  Math.max(summary.uncertainty, summary.spread / 2);

import { useMemo } from 'react';
import { displayMm, displayValue, type DisplayPreference } from '../../shared/measure';
import { type PlanDocument } from '../../shared/plan/document';
import {
  createModel,
  type DimensionState,
  type ModelReadings,
  type PlanModel,
} from '../../shared/plan/model';
import { usePreferences } from '../data/preferences';
import { type FigureParts } from '../ui/figure';

/** A plan's values for this person: every figure in their units. */
export interface PlanValues {
  model: PlanModel;
  preference: DisplayPreference;
  /** A dimension's figure as its instrument reads; null while it cannot be worked out. */
  figure: (dimensionId: string) => FigureParts | null;
  /** A float in millimetres, for tape or rule. */
  length: (mm: number | null | undefined) => FigureParts | null;
}

/** What the display asks of an instrument. */
const shownAs = (instrument: string): DisplayPreference['instrument'] =>
  instrument === 'calipers' || instrument === 'micrometer'
    ? 'calipers'
    : instrument === 'rule'
      ? 'rule'
      : 'tape';

/**
 * A dimension's figure as it is spoken of: the grid of its instrument, calipers' digits only where it asks for
 * them. Null while it cannot be worked out.
 */
export function dimensionFigure(
  state: DimensionState | undefined,
  preference: DisplayPreference,
): FigureParts | null {
  if (!state?.value) return null;
  const { dimension, kind, value } = state;
  if (kind !== 'length') return displayValue(value.x, kind, preference);
  const instrument = shownAs(dimension.instrument);
  const fine = instrument === 'calipers' || (value.x < 3 && dimension.sense === 'form');
  return displayMm(value.exact ?? value.x, {
    ...preference,
    instrument: fine ? 'calipers' : instrument,
  });
}

/** The figures of a model as this preference shows them. */
export function valuesOf(model: PlanModel, preference: DisplayPreference): PlanValues {
  const length = (mm: number | null | undefined) =>
    mm === null || mm === undefined || !Number.isFinite(mm) ? null : displayMm(mm, preference);
  const figure = (dimensionId: string) =>
    dimensionFigure(model.dimensions.get(dimensionId), preference);
  return { model, preference, figure, length };
}

/** Evaluates the plan, with readings where there are some. */
export function usePlanValues(document: PlanDocument, readings?: ModelReadings): PlanValues {
  const [{ units, inchGrid }] = usePreferences();
  const model = useMemo(() => createModel(document, readings ?? null), [document, readings]);
  return useMemo(
    () => valuesOf(model, { system: units, instrument: 'tape', grid: inchGrid }),
    [model, units, inchGrid],
  );
}

import { useMemo } from 'react';
import { displayMm, type DisplayPreference } from '../../shared/measure';
import { type PlanDocument } from '../../shared/plan/document';
import { createModel, type ModelReadings, type PlanModel } from '../../shared/plan/model';
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

/** Evaluates the plan, with readings where there are some. */
export function usePlanValues(document: PlanDocument, readings?: ModelReadings): PlanValues {
  const [{ units, inchGrid }] = usePreferences();
  const model = useMemo(() => createModel(document, readings ?? null), [document, readings]);
  return useMemo(() => {
    const preference: DisplayPreference = { system: units, instrument: 'tape', grid: inchGrid };
    const length = (mm: number | null | undefined) =>
      mm === null || mm === undefined || !Number.isFinite(mm) ? null : displayMm(mm, preference);
    const figure = (dimensionId: string) => {
      const state = model.dimensions.get(dimensionId);
      if (!state?.value) return null;
      if (state.kind === 'angle')
        return { decimal: String(Math.round(state.value.x * 100) / 100), unit: '°' };
      if (state.kind !== 'length')
        return { decimal: String(Math.round(state.value.x * 1000) / 1000) };
      const { dimension } = state;
      // A figure as it is spoken of: the instrument's grid, but calipers only where the tolerance asks for them.
      const fine =
        shownAs(dimension.instrument) === 'calipers' ||
        (state.value.x < 3 && dimension.sense === 'form');
      return displayMm(state.value.exact ?? state.value.x, {
        ...preference,
        instrument: fine ? 'calipers' : shownAs(dimension.instrument),
      });
    };
    return { model, preference, figure, length };
  }, [model, units, inchGrid]);
}

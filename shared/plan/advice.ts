import { displayMm } from '../measure';
import { type Dimension } from './document';
import { type Advice, type PlanModel } from './model';

/** A change of the draft that makes a check hold, with the words for its button. */
export interface Mend {
  /** What it does, as an order: `Make base_w 9 3/8 in`. */
  label: string;
  dimension: Dimension;
}

const inch = 25.4;
/** Steps a figure is set in: a tenth of a millimetre, a 64th of an inch. */
const marks = { mm: 0.1, in: inch / 64 };
/** Steps of a tolerance: a hundredth of a millimetre, half a thousandth of an inch. */
const fine = { mm: 0.01, in: inch / 2000 };

const figureText = (mm: number, units: 'mm' | 'in') =>
  displayMm(mm, { system: units, instrument: units === 'mm' ? 'calipers' : 'tape', grid: 64 }).text;

/** Figures that are far enough, the nearest first. */
function moved(dimension: Dimension, x: number, by: number, units: 'mm' | 'in'): Mend[] {
  const mark = marks[units];
  const away = Math.sign(by);
  if (dimension.origin === 'given') {
    const nearest = away * Math.ceil((away * (x + by)) / mark - 1e-6);
    return [nearest, nearest + away].map((steps) => {
      const text = figureText(steps * mark, units);
      return {
        label: `Make ${dimension.symbol} ${text}`,
        dimension: { ...dimension, expression: text },
      };
    });
  }
  const least = Math.ceil(Math.abs(by) / mark - 1e-6);
  return [least, least + 1].map((steps) => {
    const text = figureText(steps * mark, units);
    return {
      label: `Make ${dimension.symbol} ${text} ${by > 0 ? 'larger' : 'smaller'}`,
      dimension: {
        ...dimension,
        expression: `${dimension.expression.trim()} ${by > 0 ? '+' : '-'} ${text}`,
      },
    };
  });
}

/** Tolerances that are tight enough, the widest first. */
function held(dimension: Dimension, tolerance: number, units: 'mm' | 'in'): Mend[] {
  const most = Math.floor(tolerance / fine[units] + 1e-6);
  return [most, most - 1]
    .filter((steps) => steps > 0)
    .map((steps) => {
      const by = tight(steps, units);
      return {
        label: `Hold ${dimension.symbol} to ± ${by}`,
        dimension: { ...dimension, tolerance: { form: 'plus-minus', by } },
      };
    });
}

/**
 * The advice on a check as a change of one dimension of the draft: a figure moved to the next mark that is far
 * enough, or a tolerance held tighter; tried on the model before it is offered. Null for what only the bench can
 * answer, for a reading (it is what it is), for kinds other than length, and where no mark mends the check.
 */
export function mendOf(model: PlanModel, checkId: string, advice: Advice): Mend | null {
  if (advice.do !== 'move' && advice.do !== 'hold') return null;
  const { document } = model;
  const state = model.dimensions.get(advice.dimensionId);
  if (!state?.value || state.kind !== 'length' || state.dimension.origin === 'taken') return null;
  const tries =
    advice.do === 'move'
      ? moved(state.dimension, state.value.x, advice.by, document.units)
      : held(state.dimension, advice.tolerance, document.units);
  const mends = ({ dimension }: Mend) => {
    const dimensions = document.dimensions.map((d) => (d.id === dimension.id ? dimension : d));
    const verdict = model.update({ ...document, dimensions }).checks.get(checkId)?.verdict;
    return advice.do === 'hold' ? verdict === 'holds' : verdict !== 'fails';
  };
  return tries.find(mends) ?? null;
}

const tight = (steps: number, units: 'mm' | 'in') =>
  units === 'mm'
    ? `${Number((steps * 0.01).toFixed(2))} mm`
    : `${Number((steps / 2000).toFixed(4))} in`;

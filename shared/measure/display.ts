import { type Tie, Rational } from './rational';
import { fractionWords, numberWords, thouWords } from './spoken';

export type Grid = 16 | 32 | 64;
/** How a person wants figures: their system, the instrument in hand, the finest mark on their tape. */
export interface DisplayPreference {
  system: 'mm' | 'in';
  instrument: 'tape' | 'rule' | 'calipers';
  /** Finest fraction of an inch on tape and rule. */
  grid: Grid;
  /** On a tie: away from zero (common practice, no source) or to even (ISO 80000-1). Default `up`. */
  tie?: Tie;
  /** Inches from a foot on as feet and inches. */
  feet?: boolean;
  /** Tolerance ± in mm: the rest is shown when it is more than a quarter of it. */
  tolerance?: number;
}

/** A figure ready to draw (it fits the parts of the screens' Figure), its text and its spoken form. */
export interface DisplayFigure {
  sign: '−' | '+' | '';
  /** Whole feet before the inches. */
  feet?: string;
  whole?: string;
  numerator?: string;
  denominator?: string;
  decimal?: string;
  unit: 'mm' | 'in';
  text: string;
  spoken: string;
  /** Exact value less what is shown, in mm. */
  restMm: number;
  /** The signed rest, when it is worth showing. */
  rest?: DisplayFigure;
  /** Beside a decimal inch: the nearest fraction of the grid. */
  near?: DisplayFigure;
}

const inch = Rational.of(127, 5);

interface Shown {
  figure: Omit<DisplayFigure, 'restMm' | 'sign'>;
  mm: Rational;
}

const fixed = (units: bigint, places: number): string => {
  const digits = units.toString().padStart(places + 1, '0');
  return `${digits.slice(0, -places)}.${digits.slice(-places)}`;
};

function metric(size: Rational, steps: number, tie: Tie): Shown {
  const units = size.times(Rational.of(steps)).round(tie);
  const mm = Rational.of(units, steps);
  const hundredths = mm.times(Rational.of(100)).round();
  const decimal = fixed(hundredths, 2).replace(/\.?0+$/, '');
  const one = decimal === '1';
  const said = /^\d\d?$/.test(decimal) ? numberWords(Number(decimal)) : decimal;
  const parts = decimal.includes('.') ? { decimal } : { whole: decimal };
  const spoken = `${said} ${one ? 'millimetre' : 'millimetres'}`;
  return { figure: { ...parts, unit: 'mm', text: `${decimal} mm`, spoken }, mm };
}

function inchWords(whole: bigint, top: number, bottom: number): string {
  const said = whole < 100n ? numberWords(Number(whole)) : String(whole);
  if (top === 0) return `${said} ${whole === 1n ? 'inch' : 'inches'}`;
  if (whole === 0n) return `${fractionWords(top, bottom)} of an inch`;
  return `${said} and ${fractionWords(top, bottom)} inches`;
}

function fractional(size: Rational, grid: Grid, tie: Tie, withFeet: boolean): Shown {
  const marks = size.over(inch).times(Rational.of(grid)).round(tie);
  const value = Rational.of(marks, grid);
  const inches = value.floor();
  const feet = withFeet && inches >= 12n ? inches / 12n : 0n;
  const whole = inches - feet * 12n;
  const fraction = value.minus(Rational.of(inches));
  const [top, bottom] = [Number(fraction.n), Number(fraction.d)];
  const showWhole = whole > 0n || top === 0 || feet > 0n;
  const words = [showWhole ? String(whole) : '', top ? `${top}/${bottom}` : ''];
  const text = `${feet ? `${feet} ft ` : ''}${words.filter(Boolean).join(' ')} in`;
  const said = inchWords(whole, top, bottom);
  const foot = feet ? `${feet < 100n ? numberWords(Number(feet)) : feet}` : '';
  return {
    figure: {
      ...(feet && { feet: String(feet) }),
      ...(showWhole && { whole: String(whole) }),
      ...(top && { numerator: String(top), denominator: String(bottom) }),
      unit: 'in',
      text,
      spoken: feet ? `${foot} ${feet === 1n ? 'foot' : 'feet'} ${said}` : said,
    },
    mm: value.times(inch),
  };
}

function decimalInch(size: Rational, tie: Tie): Shown {
  const thou = size.over(inch).times(Rational.of(1000)).round(tie);
  const decimal = fixed(thou, 3);
  const [whole, rest] = [thou / 1000n, Number(thou % 1000n)];
  const inches = `${whole < 100n ? numberWords(Number(whole)) : whole} ${whole === 1n ? 'inch' : 'inches'}`;
  const spoken =
    rest === 0 && whole > 0n ? inches : `${whole > 0n ? `${inches} ` : ''}${thouWords(rest)} thou`;
  return {
    figure: { decimal, unit: 'in', text: `${decimal} in`, spoken },
    mm: Rational.of(thou, 1000).times(inch),
  };
}

function show(size: Rational, pref: DisplayPreference): Shown {
  const tie = pref.tie ?? 'up';
  const calipers = pref.instrument === 'calipers';
  if (pref.system === 'mm') return metric(size, calipers ? 100 : 2, tie);
  return calipers ? decimalInch(size, tie) : fractional(size, pref.grid, tie, pref.feet ?? false);
}

function signed(shown: Shown, exact: Rational, plus: boolean): DisplayFigure {
  const negative = exact.sign() < 0 && shown.mm.sign() !== 0;
  const sign = negative ? '−' : plus && shown.mm.sign() !== 0 ? '+' : '';
  const value = negative ? shown.mm.negate() : shown.mm;
  const said = sign === '−' ? 'minus ' : sign === '+' ? 'plus ' : '';
  return {
    ...shown.figure,
    sign,
    text: sign + shown.figure.text,
    spoken: said + shown.figure.spoken,
    restMm: exact.minus(value).toNumber(),
  };
}

/**
 * A length as the instrument wanted shows it, rounded once from the exact value: tape and rule to 0.5 mm
 * or the grid's fraction in lowest terms with carry; calipers to 0.01 mm or 0.001 in with the nearest
 * fraction beside it.
 */
export function displayLength(mm: Rational, pref: DisplayPreference): DisplayFigure {
  const size = mm.abs();
  const figure = signed(show(size, pref), mm, false);
  if (pref.system === 'in' && pref.instrument === 'calipers')
    figure.near = signed(fractional(size, pref.grid, pref.tie ?? 'up', false), mm, false);
  if (pref.tolerance !== undefined && Math.abs(figure.restMm) > pref.tolerance / 4)
    figure.rest = displayDifference(Rational.fromNumber(figure.restMm), pref);
  return figure;
}

/** A difference, such as a rest or a margin: 0.01 mm or a thou whatever the instrument, with its sign. */
export function displayDifference(mm: Rational, pref: DisplayPreference): DisplayFigure {
  const fine = show(mm.abs(), { ...pref, instrument: 'calipers' });
  return signed(fine, mm, true);
}

/** The display for a float in millimetres; what is not finite has none and throws a RangeError. */
export function displayMm(mm: number | Rational, pref: DisplayPreference): DisplayFigure {
  return displayLength(typeof mm === 'number' ? Rational.fromNumber(mm) : mm, pref);
}

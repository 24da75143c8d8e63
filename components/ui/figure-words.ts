import { fractionWords, numberWords } from '../../shared/measure/spoken';

/**
 * A figure taken apart for drawing. The measure engine hands these out; `parseFigure` makes one
 * from a plain text such as `2 3/4 in`, `-0.4 mm`, `± 1/32`, `12:22`.
 */
export interface FigureParts {
  sign?: '−' | '+' | '±' | '-' | '';
  /** Whole feet before the inches. */
  feet?: string | number;
  /** Digits before a fraction, or the whole of a whole number. */
  whole?: string | number;
  numerator?: string | number;
  denominator?: string | number;
  /** The text of a decimal figure or a time, instead of `whole`: `564.8`, `12:22`. */
  decimal?: string;
  /** As written: `in`, `mm`, `°`, `%`, `min`. */
  unit?: string;
  /** What a screen reader says; worked out from the parts when left out. */
  spoken?: string;
}

const amount = [
  String.raw`(?<n>\d+)\s*\/\s*(?<d>\d+)`,
  String.raw`(?<whole>\d+)[\s-]+(?<wn>\d+)\s*\/\s*(?<wd>\d+)`,
  String.raw`(?<decimal>\d*[.:,]\d[\d.:,]*)`,
  String.raw`(?<only>\d+)`,
].join('|');
const shape = new RegExp(
  String.raw`^\s*(?<sign>[-−+±]?)\s*(?:${amount})(?:\s*(?<unit>[^\d\s.:,/].*))?$`,
);

/** Takes a plain figure apart; a text that is none comes back as `decimal`, drawn as it is. */
export function parseFigure(text: string): FigureParts {
  const g = shape.exec(text)?.groups;
  if (!g) return { decimal: text.trim() };
  const whole = g.whole ?? g.only;
  const numerator = g.n ?? g.wn;
  return {
    ...(g.sign && { sign: (g.sign === '-' ? '−' : g.sign) as FigureParts['sign'] }),
    ...(whole && { whole }),
    ...(numerator && { numerator, denominator: g.d ?? g.wd }),
    ...(g.decimal && { decimal: g.decimal }),
    ...(g.unit && { unit: g.unit.trim() }),
  };
}

const units: Record<string, [one: string, many: string]> = {
  in: ['inch', 'inches'],
  ft: ['foot', 'feet'],
  mm: ['millimetre', 'millimetres'],
  cm: ['centimetre', 'centimetres'],
  m: ['metre', 'metres'],
  s: ['second', 'seconds'],
  min: ['minute', 'minutes'],
  h: ['hour', 'hours'],
  d: ['day', 'days'],
  kg: ['kilogram', 'kilograms'],
  g: ['gram', 'grams'],
  lb: ['pound', 'pounds'],
  kB: ['kilobyte', 'kilobytes'],
  MB: ['megabyte', 'megabytes'],
  GB: ['gigabyte', 'gigabytes'],
  '°': ['degree', 'degrees'],
  '%': ['per cent', 'per cent'],
};

const signs: Record<string, string> = {
  '−': 'minus ',
  '-': 'minus ',
  '±': 'plus or minus ',
  '+': 'plus ',
};

/** The spoken form: `two and three quarters inches`, `minus 0.4 millimetres`, `one half of an inch`. */
export function speakFigure(f: FigureParts): string {
  if (f.spoken) return f.spoken;
  const sign = f.sign ? (signs[f.sign] ?? '') : '';
  const unit = f.unit ? (units[f.unit] ?? [f.unit, f.unit]) : undefined;
  const whole = f.whole === undefined || f.whole === '' ? undefined : Number(f.whole);
  if (f.numerator !== undefined && f.denominator !== undefined) {
    const fraction = fractionWords(Number(f.numerator), Number(f.denominator));
    if (whole !== undefined) {
      return `${sign}${numberWords(whole)} and ${fraction}${unit ? ` ${unit[1]}` : ''}`;
    }
    return `${sign}${fraction}${unit ? ` of ${/^[aeiou]/.test(unit[0]) ? 'an' : 'a'} ${unit[0]}` : ''}`;
  }
  const said = f.decimal ?? (whole === undefined ? '' : numberWords(whole));
  return `${sign}${said}${unit ? ` ${whole === 1 ? unit[0] : unit[1]}` : ''}`.trim();
}

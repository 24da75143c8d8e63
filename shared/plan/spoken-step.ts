import { fractionWords, numberWords, thouWords } from '../measure/spoken';
import { type PlanDocument, type Step } from './document';

const glyphs: Record<string, string> = {
  '½': '1/2',
  '¼': '1/4',
  '¾': '3/4',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
};
const units: Record<string, [one: string, many: string]> = {
  in: ['inch', 'inches'],
  ft: ['foot', 'feet'],
  mm: ['millimetre', 'millimetres'],
  cm: ['centimetre', 'centimetres'],
  m: ['metre', 'metres'],
  min: ['minute', 'minutes'],
  h: ['hour', 'hours'],
  s: ['second', 'seconds'],
  '°': ['degree', 'degrees'],
  '%': ['per cent', 'per cent'],
};
const marks: Record<string, string> = {
  '"': 'in',
  '″': 'in',
  '”': 'in',
  "'": 'ft',
  '′': 'ft',
  '’': 'ft',
};

const count = (digits: string) => (digits.length <= 2 ? numberWords(Number(digits)) : digits);

/** `3 1/2` with its unit as it is said: `three and one half inches`, `five eighths of an inch`. */
function mixedWords(whole: string | undefined, top: string, bottom: string, unit: string): string {
  const fraction = fractionWords(Number(top), Number(bottom));
  const name = units[unit];
  if (whole) return `${count(whole)} and ${fraction}${name ? ` ${name[1]}` : ''}`;
  return `${fraction}${name ? ` of ${/^[aeiou]/.test(name[0]) ? 'an' : 'a'} ${name[0]}` : ''}`;
}

/** A decimal as it is said: thousandths of an inch as machinists say them, the rest digit by digit after the point. */
function decimalWords(whole: string, rest: string, unit: string): string {
  const name = units[unit];
  if (unit === 'in' && rest.length === 3) {
    const thou = Number(rest);
    const inches =
      Number(whole) > 0 ? `${count(whole)} ${Number(whole) === 1 ? 'inch' : 'inches'}` : '';
    return [inches, thou > 0 || !inches ? `${thouWords(thou)} thou` : ''].filter(Boolean).join(' ');
  }
  const digits = [...rest].map((digit) => numberWords(Number(digit))).join(' ');
  return `${count(whole || '0')} point ${digits}${name ? ` ${name[1]}` : ''}`;
}

function plainWords(digits: string, unit: string): string {
  const name = units[unit];
  return `${count(digits)}${name ? ` ${Number(digits) === 1 ? name[0] : name[1]}` : ''}`;
}

const figure = new RegExp(
  [
    String.raw`(?<![\w.:])(?<sign>[±−+]\s?)?`,
    String.raw`(?:(?:(?<mixed>\d+)[\s-])?(?<top>\d+)[/⁄](?<bottom>\d+)|(?<before>\d*)\.(?<after>\d+)|(?<whole>\d+))`,
    String.raw`(?:\s?(?<mark>["″”'′’°%])|\s(?<unit>in|ft|mm|cm|m|min|h|s)\b|(?<close>mm|cm|in)\b)?(?![\w:])`,
  ].join(''),
  'gu',
);
const signs: Record<string, string> = { '±': 'plus or minus ', '−': 'minus ', '+': 'plus ' };

/**
 * Figures written in a sentence as a maker says them, the words left alone: `2 7/16 in` is `two and seven
 * sixteenths inches`, `0.742"` is `seven forty-two thou`, `18 mm` is `eighteen millimetres`, `#8 × 1 1/4"` is
 * `number eight by one and one quarter inches`. Common practice, no source.
 */
export function spoken(text: string): string {
  return text
    .replace(
      /(\d)?\s?([½¼¾⅛⅜⅝⅞])/gu,
      (_, whole: string | undefined, glyph: string) =>
        `${whole ? `${whole} ` : ''}${glyphs[glyph] ?? glyph}`,
    )
    .replace(/#(\d+)/g, 'number $1')
    .replace(/(["″”\w])\s?[×x]\s?(?=[\d.])/gu, (whole, before: string) =>
      /[\d"″”m]/.test(before) ? `${before} by ` : whole,
    )
    .replace(figure, (...found: unknown[]) => {
      const g = found.at(-1) as Record<string, string | undefined>;
      const unit = g.unit ?? g.close ?? (g.mark ? (marks[g.mark] ?? g.mark) : '');
      const sign = signs[g.sign?.trim() ?? ''] ?? '';
      if (g.top && g.bottom) return sign + mixedWords(g.mixed, g.top, g.bottom, unit);
      if (g.after !== undefined) return sign + decimalWords(g.before ?? '', g.after, unit);
      return sign + plainWords(g.whole ?? '', unit);
    });
}

/** How the dimensions of a plan are said to this builder; null for one that cannot be worked out. */
export type SayDimension = (dimensionId: string) => string | null;

/** Markdown without its marks, with what its references name. */
function sentence(text: string, document: PlanDocument, say: SayDimension): string {
  const plain = text.replace(/^[#>\-*]+\s+/gm, '').replace(/\[([^\]]*)\]\([^)]*\)/g, '$1');
  const pieces = plain.replace(/[*_`]/g, '').split(/(\{\{(?:dim|part):[0-9a-f-]{36}\}\})/);
  return pieces
    .map((piece) => {
      const named = /^\{\{(dim|part):(.*)\}\}$/.exec(piece);
      if (!named) return spoken(piece);
      if (named[1] === 'dim') return say(named[2] ?? '') ?? 'a figure that is not known yet';
      const part = document.parts.find((p) => p.id === named[2]);
      return part ? `${part.name.toLowerCase()} ${part.mark}` : 'a part that is gone';
    })
    .join('')
    .replace(/\s+/g, ' ')
    .trim();
}

const stop = (text: string) => (/[.!?]$/.test(text) || text === '' ? text : `${text}.`);

/**
 * A step as it is read aloud, one sentence an item: which it is and its title, what to mind, what to do, the
 * figures to measure and to hold in this builder's own numbers, the waits.
 */
export function spokenStep(step: Step, document: PlanDocument, say: SayDimension): string[] {
  const at = document.steps.findIndex((s) => s.id === step.id);
  const named = (ids: readonly string[]) =>
    ids.flatMap((id) => {
      const dimension = document.dimensions.find((d) => d.id === id);
      const said = dimension ? say(id) : null;
      return dimension ? [{ name: dimension.name, said }] : [];
    });
  const takes = named(step.takes).map(({ name }) => `Measure: ${name}`);
  const holds = named(step.holds).map(({ name, said }) => (said ? `${name}: ${said}` : `${name}`));
  const waits = step.waits.map(({ what, minutes }) => {
    const long =
      minutes % 60 === 0 && minutes > 0
        ? plainWords(String(minutes / 60), 'h')
        : plainWords(String(Math.round(minutes)), 'min');
    return `Wait ${long}${what ? `: ${spoken(what)}` : ''}`;
  });
  return [
    `Step ${numberWords(at + 1)} of ${numberWords(document.steps.length)}`,
    sentence(step.title, document, say),
    ...step.cautions.map((caution) => `Mind this: ${sentence(caution.text, document, say)}`),
    sentence(step.text, document, say),
    ...takes,
    ...holds,
    ...waits,
  ]
    .filter((text) => text !== '')
    .map(stop);
}

import { type Token } from '../tokens';

/** A number read from words: its value, how many tokens it took, and how it was said. */
export interface SpokenNumber {
  value: number;
  n: number;
  /**
   * whole: "twenty four" · hundreds: "two forty two" for 242 · decimal: "point six" · fraction: "three eighths"
   * · mixed: "two and a half" · written: digits
   */
  form: 'whole' | 'hundreds' | 'decimal' | 'fraction' | 'mixed' | 'written';
  /** Denominator of a fraction; digits after the point of a decimal. */
  part?: number;
}

const ones: Record<string, number> = {
  zero: 0,
  oh: 0,
  nought: 0,
  one: 1,
  two: 2,
  three: 3,
  four: 4,
  five: 5,
  six: 6,
  seven: 7,
  eight: 8,
  nine: 9,
  ten: 10,
  eleven: 11,
  twelve: 12,
  thirteen: 13,
  fourteen: 14,
  fifteen: 15,
  sixteen: 16,
  seventeen: 17,
  eighteen: 18,
  nineteen: 19,
};
const tens: Record<string, number> = {
  twenty: 20,
  thirty: 30,
  forty: 40,
  fourty: 40,
  fifty: 50,
  sixty: 60,
  seventy: 70,
  eighty: 80,
  ninety: 90,
};
const denominators: Record<string, number> = {
  half: 2,
  halves: 2,
  third: 3,
  thirds: 3,
  quarter: 4,
  quarters: 4,
  fourth: 4,
  fourths: 4,
  fifth: 5,
  fifths: 5,
  sixth: 6,
  sixths: 6,
  eighth: 8,
  eighths: 8,
  eights: 8,
  tenth: 10,
  tenths: 10,
  sixteenth: 16,
  sixteenths: 16,
  sixteens: 16,
  hundredth: 100,
  hundredths: 100,
};
const small = (w: string | undefined) =>
  w !== undefined && Object.hasOwn(ones, w) ? ones[w] : undefined;
const ten = (w: string | undefined) =>
  w !== undefined && Object.hasOwn(tens, w) ? tens[w] : undefined;
const digit = (w: string | undefined) => {
  const value = small(w);
  return value !== undefined && value >= 1 && value <= 9 ? value : undefined;
};

/** The denominator at a place: "sixteenths", "thirty second(s)", "sixty fourth(s)". */
export function readDenominator(
  tokens: readonly Token[],
  at: number,
): { value: number; n: number; plural: boolean } | null {
  const w = tokens[at]?.w;
  const next = tokens[at + 1]?.w;
  if (w === 'thirty' && (next === 'second' || next === 'seconds'))
    return { value: 32, n: 2, plural: next === 'seconds' };
  if (w === 'sixty' && (next === 'fourth' || next === 'fourths'))
    return { value: 64, n: 2, plural: next === 'fourths' };
  const one = w !== undefined && Object.hasOwn(denominators, w) ? denominators[w] : undefined;
  return one === undefined ? null : { value: one, n: 1, plural: w?.endsWith('s') ?? false };
}

/** Under a hundred: "twenty four", "seven", "sixteen". */
function below100(tokens: readonly Token[], at: number): { value: number; n: number } | null {
  const t = ten(tokens[at]?.w);
  if (t !== undefined) {
    const d = digit(tokens[at + 1]?.w);
    return d === undefined ? { value: t, n: 1 } : { value: t + d, n: 2 };
  }
  const value = small(tokens[at]?.w);
  return value === undefined ? null : { value, n: 1 };
}

/** "thirty" in "three thirty seconds" begins a denominator, not a number. */
const isDenominator = (tokens: readonly Token[], at: number) =>
  readDenominator(tokens, at) !== null;

function tailBelow100(tokens: readonly Token[], at: number): { value: number; n: number } | null {
  if (isDenominator(tokens, at)) return null;
  const tail = below100(tokens, at);
  // "a hundred and three eighths": the three belongs to the eighths.
  if (tail && isDenominator(tokens, at + tail.n)) return null;
  return tail && tail.value > 0 ? tail : null;
}

function hundreds(tokens: readonly Token[], at: number): (SpokenNumber & { open: boolean }) | null {
  const article = tokens[at]?.w === 'a' || tokens[at]?.w === 'an';
  const implied = tokens[at]?.w === 'hundred' || tokens[at]?.w === 'thousand';
  const head = implied ? { value: 1, n: 0 } : article ? { value: 1, n: 1 } : below100(tokens, at);
  if (!head) return null;
  const i = at + head.n;
  if (tokens[i]?.w === 'hundred' && head.value > 0) {
    const and = tokens[i + 1]?.w === 'and' ? 1 : 0;
    const tail = tailBelow100(tokens, i + 1 + and);
    if (tail)
      return {
        value: head.value * 100 + tail.value,
        n: head.n + 1 + and + tail.n,
        form: 'whole',
        open: false,
      };
    return { value: head.value * 100, n: head.n + 1, form: 'whole', open: true };
  }
  if (tokens[i]?.w === 'thousand') return { ...head, form: 'whole', open: true };
  if (article || implied) return null;
  return shorthand(tokens, at, head) ?? { ...head, form: 'whole', open: true };
}

/** "three eight nine" for 389, but not "one two three". */
function digitByDigit(tokens: readonly Token[], at: number): number | null {
  const [a, b, c] = [0, 1, 2].map((k) => digit(tokens[at + k]?.w));
  if (a === undefined || b === undefined || c === undefined) return null;
  if (tokens[at]?.comma || tokens[at + 1]?.comma || tokens[at]?.end || tokens[at + 1]?.end)
    return null;
  if (isDenominator(tokens, at + 3) || (b === a + 1 && c === b + 1)) return null;
  const next = tokens[at + 3]?.w;
  return next === 'point' || next === 'hundred' || next === 'by' ? null : a * 100 + b * 10 + c;
}

/** "two forty two", "five oh six", "seventeen fifty": hundreds without the word. */
function shorthand(
  tokens: readonly Token[],
  at: number,
  head: { value: number; n: number },
): (SpokenNumber & { open: boolean }) | null {
  const i = at + head.n;
  if (head.value < 1 || tokens[i - 1]?.comma || tokens[i - 1]?.end) return null;
  const digits = digitByDigit(tokens, at);
  if (digits !== null) return { value: digits, n: 3, form: 'hundreds', open: false };
  if (tokens[i]?.w === 'oh' && head.value < 100) {
    const d = digit(tokens[i + 1]?.w);
    if (d !== undefined && tokens[i + 2]?.w !== 'oh')
      return { value: head.value * 100 + d, n: head.n + 2, form: 'hundreds', open: false };
  }
  const tail = below100(tokens, i);
  if (!tail || tail.value < 10 || isDenominator(tokens, i) || isDenominator(tokens, i + tail.n))
    return null;
  return {
    value: head.value * 100 + tail.value,
    n: head.n + tail.n,
    form: 'hundreds',
    open: false,
  };
}

/** A whole number in words: "one thousand seven hundred and fifty", "a hundred", "two forty". */
export function readWhole(tokens: readonly Token[], at: number): SpokenNumber | null {
  const first = hundreds(tokens, at);
  if (!first) return null;
  if (tokens[at + first.n]?.w !== 'thousand' || first.value < 1) return plain(first);
  let i = at + first.n + 1;
  if (tokens[i]?.w === 'and') i += 1;
  const rest =
    i < tokens.length && tokens[i]?.w !== 'a' && tokens[i]?.w !== 'an' && tokens[i]?.w !== 'hundred'
      ? restAfterThousand(tokens, i)
      : null;
  if (!rest) return { value: first.value * 1000, n: first.n + 1, form: 'whole' };
  return { value: first.value * 1000 + rest.value, n: i - at + rest.n, form: 'whole' };
}

function restAfterThousand(
  tokens: readonly Token[],
  at: number,
): { value: number; n: number } | null {
  const more = hundreds(tokens, at);
  if (!more || more.value >= 1000 || more.value < 1 || isDenominator(tokens, at + more.n))
    return null;
  return more;
}

const plain = ({ value, n, form }: SpokenNumber): SpokenNumber => ({ value, n, form });

/** Digits after "point", spoken one by one or in pairs: "six one five", "twenty five", "two five oh oh". */
function readDecimals(tokens: readonly Token[], at: number): { text: string; n: number } | null {
  let text = '';
  let i = at;
  for (; i < tokens.length; i += 1) {
    const w = tokens[i]?.w;
    if (text !== '' && isDenominator(tokens, i)) break;
    const t = ten(w);
    if (t !== undefined) {
      if (tokens[i + 1]?.w === 'thousandths' && text === '') break;
      const d = digit(tokens[i + 1]?.w);
      text += String(t + (d ?? 0));
      if (d !== undefined) i += 1;
    } else if (small(w) !== undefined) text += String(small(w));
    else if (w === 'o') text += '0';
    else if (w !== undefined && /^\d+$/.test(w)) text += w;
    else break;
    if (tokens[i]?.end || tokens[i]?.comma) {
      i += 1;
      break;
    }
  }
  return text === '' ? null : { text, n: i - at };
}

function decimal(tokens: readonly Token[], at: number): SpokenNumber | null {
  const whole =
    tokens[at]?.w === 'point'
      ? { value: 0, n: 0 }
      : (readWhole(tokens, at) ?? writtenWhole(tokens, at));
  if (!whole || tokens[at + whole.n]?.w !== 'point') return null;
  const digits = readDecimals(tokens, at + whole.n + 1);
  if (!digits) return null;
  return {
    value: Number(`${whole.value}.${digits.text}`),
    n: whole.n + 1 + digits.n,
    form: 'decimal',
    part: digits.text.length,
  };
}

function writtenWhole(tokens: readonly Token[], at: number): SpokenNumber | null {
  const w = tokens[at]?.w;
  return w !== undefined && /^\d+$/.test(w) ? { value: Number(w), n: 1, form: 'written' } : null;
}

function written(tokens: readonly Token[], at: number): SpokenNumber | null {
  const w = tokens[at]?.w ?? '';
  const fraction = /^(\d+)\/(\d+)$/.exec(w);
  if (fraction) {
    const down = Number(fraction[2]);
    return down > 0
      ? { value: Number(fraction[1]) / down, n: 1, form: 'fraction', part: down }
      : null;
  }
  if (/^\d*\.\d+$/.test(w))
    return { value: Number(w), n: 1, form: 'decimal', part: w.split('.')[1]?.length ?? 0 };
  return writtenWhole(tokens, at);
}

/** A fraction of its own: "three quarters", "a sixteenth", "half", "fifteen sixty fourths". */
export function readFraction(tokens: readonly Token[], at: number): SpokenNumber | null {
  const w = written(tokens, at);
  if (w?.form === 'fraction') return w;
  const article = tokens[at]?.w === 'a' || tokens[at]?.w === 'an';
  if (article || isDenominator(tokens, at)) {
    const down = readDenominator(tokens, at + (article ? 1 : 0));
    if (!down || (down.plural && down.value !== 2)) return null;
    return {
      value: 1 / down.value,
      n: down.n + (article ? 1 : 0),
      form: 'fraction',
      part: down.value,
    };
  }
  const up = below100(tokens, at) ?? (w && w.value < 100 ? w : null);
  if (!up || up.value < 1) return null;
  const down = readDenominator(tokens, at + up.n);
  // "two quarter twenty bolts" are two of a quarter, not two quarters.
  const even =
    up.value % 2 === 0 &&
    down !== null &&
    (!down.plural || down.value === 4) &&
    down.value % 2 === 0;
  if (!down || up.value >= down.value || even) return null;
  return { value: up.value / down.value, n: up.n + down.n, form: 'fraction', part: down.value };
}

/** The fraction after a whole number or its unit: "and a half", "and seven sixteenths", "7/16". */
export function readAndFraction(tokens: readonly Token[], at: number): SpokenNumber | null {
  if (tokens[at]?.w !== 'and') return null;
  const fraction = readFraction(tokens, at + 1);
  return fraction && fraction.value < 1 ? { ...fraction, n: fraction.n + 1 } : null;
}

/** Any number at a place. */
export function readNumber(tokens: readonly Token[], at: number): SpokenNumber | null {
  const exact = decimal(tokens, at);
  if (exact) return exact;
  const fraction = readFraction(tokens, at);
  if (fraction) return fraction;
  const whole = readWhole(tokens, at) ?? written(tokens, at);
  if (!whole || whole.form === 'decimal') return whole;
  const next = at + whole.n;
  if (tokens[next - 1]?.end) return whole;
  const joined = readAndFraction(tokens, next) ?? juxtaposed(tokens, next, whole);
  if (!joined) return whole;
  return {
    value: whole.value + joined.value,
    n: whole.n + joined.n,
    form: 'mixed',
    part: joined.part ?? 2,
  };
}

/** "2 7/16", and "two seven sixteenths" spoken without its and. */
function juxtaposed(
  tokens: readonly Token[],
  at: number,
  whole: SpokenNumber,
): SpokenNumber | null {
  const fraction = readFraction(tokens, at);
  if (!fraction || fraction.value >= 1) return null;
  const isWritten = tokens[at]?.w.includes('/') ?? false;
  if (isWritten) return whole.form === 'written' ? fraction : null;
  const bare = isDenominator(tokens, at) || tokens[at]?.w === 'a' || tokens[at]?.w === 'an';
  return bare ? null : fraction;
}

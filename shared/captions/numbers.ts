const ones: Record<string, number> = {
  zero: 0,
  oh: 0,
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
  fifty: 50,
  sixty: 60,
  seventy: 70,
  eighty: 80,
  ninety: 90,
};
const parts: Record<string, number> = {
  half: 2,
  halves: 2,
  quarter: 4,
  quarters: 4,
  third: 3,
  thirds: 3,
  eighth: 8,
  eighths: 8,
  sixteenth: 16,
  sixteenths: 16,
  'thirty-second': 32,
  'thirty-seconds': 32,
  'sixty-fourth': 64,
  'sixty-fourths': 64,
  thirtysecond: 32,
};

/** A number read from words: its value and how many words it took. */
export interface ReadNumber {
  value: number;
  taken: number;
}

const digits = /^\d+(?:\.\d+)?$/;

/** Whole or decimal number words from a place: "twenty four", "three hundred and fifty", "point six one five", "18". */
export function readWhole(words: readonly string[], at: number): ReadNumber | null {
  const first = words[at];
  if (first === undefined) return null;
  if (digits.test(first)) return { value: Number(first), taken: 1 };
  if (first === 'point') return readDecimals(words, at, 0, 0);
  let total = 0;
  let part = 0;
  let taken = 0;
  let seen = false;
  for (let i = at; i < words.length; i += 1) {
    const word = words[i]!;
    if (word in tens && (part === 0 || part % 100 === 0)) part += tens[word]!;
    else if (
      word in ones &&
      (part === 0 || (part % 10 === 0 && part % 100 >= 20 && ones[word]! < 10) || part % 100 === 0)
    ) {
      if (seen && part % 100 === 0 && part === 0 && total === 0) break;
      part += ones[word]!;
    } else if (word === 'hundred' && part > 0 && part < 10) part *= 100;
    else if (word === 'thousand' && part > 0) {
      total += part * 1000;
      part = 0;
    } else if (
      word === 'and' &&
      part >= 100 &&
      part % 100 === 0 &&
      (words[i + 1]! in ones || words[i + 1]! in tens)
    )
      continue;
    else break;
    seen = true;
    taken = i - at + 1;
  }
  if (!seen) return null;
  const value = total + part;
  return words[at + taken] === 'point' ? readDecimals(words, at, value, taken) : { value, taken };
}

function readDecimals(
  words: readonly string[],
  at: number,
  whole: number,
  before: number,
): ReadNumber | null {
  let text = '';
  let i = at + before + 1;
  for (; i < words.length; i += 1) {
    const word = words[i]!;
    if (word in ones && ones[word]! < 20) text += String(ones[word]);
    else if (word in tens)
      text +=
        String(tens[word]! / 10) +
        (words[i + 1] !== undefined && words[i + 1]! in ones && ones[words[i + 1]!]! < 10
          ? ''
          : '0');
    else if (/^\d+$/.test(word)) text += word;
    else break;
  }
  return text === '' ? null : { value: Number(`${whole}.${text}`), taken: i - at };
}

/** A fraction's denominator at a place: one word, or "thirty second" as two. */
function readDenominator(
  words: readonly string[],
  at: number,
): { denominator: number; taken: number } | null {
  const two = `${words[at] ?? ''}-${words[at + 1] ?? ''}`;
  if (two in parts) return { denominator: parts[two]!, taken: 2 };
  const one = words[at];
  return one !== undefined && one in parts ? { denominator: parts[one]!, taken: 1 } : null;
}

/** A fraction alone: "three quarters", "a sixteenth", "half", "3/4". */
export function readFraction(words: readonly string[], at: number): ReadNumber | null {
  const written = /^(\d+)\/(\d+)$/.exec(words[at] ?? '');
  if (written && Number(written[2]) > 0)
    return { value: Number(written[1]) / Number(written[2]), taken: 1 };
  const lead =
    words[at] === 'a' || words[at] === 'an'
      ? { value: 1, taken: 1 }
      : words[at] === 'half'
        ? { value: 1, taken: 0 }
        : readOnes(words, at);
  if (!lead) return null;
  const down = readDenominator(words, at + lead.taken);
  return down && lead.value < down.denominator
    ? { value: lead.value / down.denominator, taken: lead.taken + down.taken }
    : null;
}

function readOnes(words: readonly string[], at: number): ReadNumber | null {
  const word = words[at];
  if (word === undefined) return null;
  if (word in ones) return { value: ones[word]!, taken: 1 };
  if (word in tens) {
    const next = words[at + 1];
    const one =
      next !== undefined && next in ones && ones[next]! > 0 && ones[next]! < 10 ? ones[next]! : 0;
    return { value: tens[word]! + one, taken: one ? 2 : 1 };
  }
  return /^\d+$/.test(word) ? { value: Number(word), taken: 1 } : null;
}

/** Any number: mixed ("two and seven sixteenths", "an inch and a half" is the caller's), fraction, whole, decimal. */
export function readNumber(words: readonly string[], at: number): ReadNumber | null {
  const fraction = readFraction(words, at);
  if (fraction) return fraction;
  const whole = readWhole(words, at);
  if (!whole) return null;
  const next = at + whole.taken;
  const joined = words[next] === 'and' ? readFraction(words, next + 1) : null;
  if (joined) return { value: whole.value + joined.value, taken: whole.taken + 1 + joined.taken };
  const close = readFraction(words, next);
  if (close && whole.value > 0)
    return { value: whole.value + close.value, taken: whole.taken + close.taken };
  return whole;
}

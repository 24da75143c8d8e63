const ones =
  'zero one two three four five six seven eight nine ten eleven twelve thirteen fourteen fifteen sixteen seventeen eighteen nineteen'.split(
    ' ',
  );
const tens = '- - twenty thirty forty fifty sixty seventy eighty ninety'.split(' ');

/** A whole number under ten thousand in words, with or without "and". */
export function wholeWords(n: number, and = true): string {
  if (n < 20) return ones[n] ?? '';
  if (n < 100) return [tens[Math.floor(n / 10)], n % 10 > 0 ? ones[n % 10] : ''].join(' ').trim();
  if (n < 1000)
    return [
      `${wholeWords(Math.floor(n / 100))} hundred`,
      n % 100 > 0 ? `${and ? 'and ' : ''}${wholeWords(n % 100)}` : '',
    ]
      .join(' ')
      .trim();
  const rest = n % 1000;
  return [
    `${wholeWords(Math.floor(n / 1000))} thousand`,
    rest > 0 ? `${rest < 100 ? 'and ' : ''}${wholeWords(rest, and)}` : '',
  ]
    .join(' ')
    .trim();
}

/** "two forty two", "seventeen fifty", "three oh five": hundreds without the word; null when nobody says it so. */
export function shortWords(n: number): string | null {
  const [head, tail] = [Math.floor(n / 100), n % 100];
  if (n < 100 || tail === 0 || (head % 10 === 0 && head > 0)) return null;
  if (tail < 10) return head < 20 ? `${wholeWords(head)} oh ${wholeWords(tail)}` : null;
  return `${wholeWords(head)} ${wholeWords(tail)}`;
}

const parts: Record<number, [string, string]> = {
  2: ['half', 'halves'],
  4: ['quarter', 'quarters'],
  8: ['eighth', 'eighths'],
  16: ['sixteenth', 'sixteenths'],
  32: ['thirty second', 'thirty seconds'],
  64: ['sixty fourth', 'sixty fourths'],
};

function lowest(up: number, down: number): [number, number] {
  return up % 2 === 0 && down > 1 ? lowest(up / 2, down / 2) : [up, down];
}

/** 64ths of an inch, under one inch, as a fraction in words: "three eighths", "a sixteenth". */
function fractionWords(sixtyFourths: number, article: 'a' | 'one'): string {
  const [up, down] = lowest(sixtyFourths, 64);
  const [one, many] = parts[down] ?? ['', ''];
  if (up > 1) return `${wholeWords(up)} ${many}`;
  return article === 'a' ? `${down === 8 ? 'an' : 'a'} ${one}` : `one ${one}`;
}

/** Several ways to say 64ths of an inch with the unit. */
export function inchWays(sixtyFourths: number): string[] {
  const whole = Math.floor(sixtyFourths / 64);
  const rest = sixtyFourths % 64;
  if (rest === 0)
    return whole === 1
      ? ['one inch', 'an inch']
      : [`${wholeWords(whole)} inches`, `${whole} inches`, `${whole}"`];
  const [up, down] = lowest(rest, 64);
  const spoken = fractionWords(rest, 'a');
  if (whole === 0) return [`${spoken} of an inch`, `${up}/${down} inch`, `${up}/${down}"`];
  const ways = [
    `${wholeWords(whole)} and ${spoken} inches`,
    `${whole} ${up}/${down} inches`,
    `${whole}-${up}/${down}"`,
  ];
  if (whole === 1) ways.push(`an inch and ${spoken}`, `inch and ${spoken}`);
  else ways.push(`${wholeWords(whole)} inches and ${spoken}`);
  return ways;
}

/** Several ways to say whole millimetres with the unit. */
export function millimetreWays(n: number): string[] {
  const short = shortWords(n);
  return [
    `${wholeWords(n)} mil`,
    `${wholeWords(n, false)} millimetres`,
    `${n}mm`,
    `${n} millimeters`,
    ...(short === null ? [] : [`${short} mil`]),
    ...(n % 100 === 0 && n > 1000 && n < 2000 ? [`${wholeWords(n / 100)} hundred mil`] : []),
  ];
}

const upToNineteen =
  'zero one two three four five six seven eight nine ten eleven twelve thirteen fourteen fifteen sixteen seventeen eighteen nineteen'.split(
    ' ',
  );
const tens = ',ten,twenty,thirty,forty,fifty,sixty,seventy,eighty,ninety'.split(',');

/** A whole number in words below 100 (`twenty-three`), digits from there on. */
export function numberWords(n: number): string {
  if (!Number.isInteger(n) || n < 0 || n > 99) return String(n);
  if (n < 20) return upToNineteen[n] ?? String(n);
  const ten = tens[Math.floor(n / 10)] ?? '';
  return n % 10 === 0 ? ten : `${ten}-${upToNineteen[n % 10] ?? ''}`;
}

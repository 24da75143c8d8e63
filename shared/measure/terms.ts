/** Words that differ between American and British shops: the key is the American one. */
const terms = {
  rabbet: 'rebate',
  dado: 'housing',
  miter: 'mitre',
  'router bit': 'router cutter',
  lumber: 'timber',
  clamp: 'cramp',
  jointer: 'planer',
  planer: 'thicknesser',
  'board feet': 'cubic metres',
  vise: 'vice',
  caliper: 'calliper',
  calipers: 'callipers',
  color: 'colour',
  millimeter: 'millimetre',
  center: 'centre',
} as const;

export type Term = keyof typeof terms;
export type TermSide = 'us' | 'uk';

/** The word for a thing on one side of the water. */
export function term(word: Term, side: TermSide): string {
  return side === 'us' ? word : terms[word];
}
export const termList: readonly Term[] = Object.keys(terms) as Term[];

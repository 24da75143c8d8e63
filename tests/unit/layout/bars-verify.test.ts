import { type BarAnswer, type BarJob, solveBars, verifyBars } from '../../../shared/layout/bars';

const job: BarJob = {
  stock: [{ length: 1000, quantity: 2, cost: 5 }],
  items: [
    { length: 400, quantity: 2 },
    { length: 300, quantity: 1 },
  ],
  kerf: 4,
  trim: { start: 10, end: 5 },
};

/** A right answer, spoilt. */
function spoilt(spoil: (answer: BarAnswer) => void): string {
  const answer = structuredClone(solveBars(job));
  spoil(answer);
  return verifyBars(job, answer).join('\n');
}
const first = (answer: BarAnswer) => {
  const [bar] = answer.bars;
  if (!bar) throw new Error('No bar.');
  return bar;
};

describe('the verifier of bars', () => {
  it('lets a right answer pass', () => {
    expect(spoilt(() => undefined)).toBe('');
  });
  it.each<[string, string, (answer: BarAnswer) => void]>([
    ['a piece a unit too long', 'long', (a) => first(a).placements.forEach((p) => (p.length += 1))],
    ['a piece in the trim', 'begins before', (a) => first(a).placements.forEach((p) => (p.x = 9))],
    [
      'a piece over the end',
      'runs over the end',
      (a) => first(a).placements.forEach((p) => (p.x = 900)),
    ],
    ['a piece too few', 'cut and 0 left out', (a) => first(a).placements.pop()],
    ['a bar too many', 'used, there are', (a) => a.bars.push(first(a), first(a))],
    ['a cut left out', 'does not come off', (a) => first(a).cuts.splice(1, 1)],
    [
      'a stop set wrongly',
      'from the end, not',
      (a) => ((first(a).cuts[1] ?? first(a).cuts[0])!.setting += 1),
    ],
    ['a kerf too thin', 'wide', (a) => first(a).cuts.forEach((c) => (c.kerf = 3))],
    [
      'an offcut that is not there',
      'does not come off',
      (a) => first(a).offcuts.push({ x: 10, length: 50 }),
    ],
    ['a cost that is not', 'cost', (a) => (a.cost -= 1)],
    ['a bound above the cost', 'above the cost', (a) => (a.lowerBound += 1)],
    ['a stock that is not', 'no such stock', (a) => (first(a).stock = 7)],
    [
      'a part called too long',
      'not too long',
      (a) => a.leftOut.push({ item: 0, quantity: 0, because: 'too-long' }),
    ],
    ['an empty bar', 'nothing is cut', (a) => (first(a).placements = [])],
  ])('finds %s', (_, words, spoil) => {
    expect(spoilt(spoil)).toContain(words);
  });
});

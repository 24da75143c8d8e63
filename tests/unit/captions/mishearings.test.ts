import { jot } from '../../../shared/captions';
import { mishearings, type Mishearing } from '../../../shared/captions/mishearings';
import { captionsOf } from './captions-of';

/** Words that no entry takes for evidence. */
const idle = 'anyway somebody wrote';

function offered(line: string, entry: Mishearing): boolean {
  return jot(captionsOf([line])).corrections.some(
    (correction) => correction.heard === entry.heard.join(' ') && correction.meant === entry.meant,
  );
}

/** The entry's words with one word of its evidence where it is asked for. */
function supported(entry: Mishearing): string {
  const heard = entry.heard.join(' ');
  const [after] = entry.next;
  const [before] = entry.before;
  const [close] = entry.near;
  if (after !== undefined) return `${idle} ${entry.noun ? 'a ' : ''}${heard} ${after}`;
  if (before !== undefined) return `${idle} ${before} ${heard} ${close ?? ''}`;
  return `${close ?? ''} ${idle} ${entry.noun ? 'a ' : ''}${heard}`;
}

/** The same words with nothing that speaks for the shop, or with what speaks against it. */
function unsupported(entry: Mishearing): string {
  if (entry.always) return `${idle} ${entry.meant}`;
  return `${idle} ${entry.heard.join(' ')} ${idle}`;
}

const named = mishearings.map((entry) => ({
  name: `${entry.heard.join(' ')} → ${entry.meant}`,
  entry,
}));

test('every entry has words, a meaning and evidence', () => {
  expect(mishearings.length).toBeGreaterThan(150);
  for (const { always, near, next, before, meant, heard } of mishearings) {
    expect(meant).not.toBe('');
    expect(heard.every((word) => /^[a-z']+$/.test(word))).toBe(true);
    expect(always || near.size + next.size + before.size > 0).toBe(true);
  }
});

test.each(named)('$name fires beside its evidence', ({ entry }) =>
  expect(offered(supported(entry), entry)).toBe(true),
);
test.each(named)('$name keeps still without it', ({ entry }) =>
  expect(offered(unsupported(entry), entry)).toBe(false),
);

test.each(named.filter(({ entry }) => !entry.always && entry.against.size > 0))(
  '$name keeps still beside what speaks against it',
  ({ entry }) => {
    const [against] = entry.against;
    expect(offered(`${supported(entry)} ${against ?? ''}`, entry)).toBe(false);
  },
);

test('sentences of the shop where the word is right', () => {
  const right = [
    'plug it in and play the gig tonight with the band',
    'just a plain old hole with no chamfer',
    'the tendon in my wrist hurts',
    'i keep the data in a spreadsheet on my computer',
    'wipe your hands on a paper towel',
    'cut along the curve with the template',
    'the cat came home with a bird from the house next door',
    'draw a line with white chalk on the board',
    'roll the cart to the front and i will call you',
    'we drove to the travel agent and booked a trip',
  ];
  expect(
    right
      .map((line) => jot(captionsOf([line])).corrections.map((c) => `${c.heard} → ${c.meant}`))
      .flat(),
  ).toEqual([]);
});

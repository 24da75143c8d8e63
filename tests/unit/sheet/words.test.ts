import { board, found, steps } from './planted.data';

const says = (rule: string, text: string) => found(rule, steps({ 2: { text } })).length;

describe('guards/power reads the words of a step', () => {
  it.each([
    'Fit the 6 mm cutter in the collet.',
    'Change the blade for a rip blade.',
    'Take the riving knife out.',
    'Remove the blade guard.',
    'Swap the router bit.',
  ])('asks for the plug: %s', (text) => {
    expect(says('guards/power', text)).toBe(1);
    expect(says('guards/power', `Pull the plug. ${text}`)).toBe(0);
    expect(says('guards/power', `With the saw unplugged: ${text}`)).toBe(0);
  });
  it.each([
    'Remove the offcut once the blade has stopped.',
    'Raise the blade to the height of the groove.',
    'Lower the blade below the table when you are done.',
    'The tongue fits the groove beside the blade.',
    'Never remove the riving knife.',
    'Put the plane back on its side and seat the fence against the blade of the square.',
    'Fit a 3 mm drill bit and drill the pilot.',
    'Fit the blade guide to the fence.',
  ])('stays quiet: %s', (text) => {
    expect(says('guards/power', text)).toBe(0);
  });
});

describe('guards/open reads the words of a step', () => {
  it.each(['Take the guard off.', 'With the riving knife removed, cut on.', 'Lift the hood away.'])(
    'misses what is not put back: %s',
    (text) => {
      expect(says('guards/open', text)).toBe(1);
      expect(says('guards/open', `${text} Afterwards put it back.`)).toBe(0);
    },
  );
  it.each([
    'The blade guard stays on.',
    'Do not take the guard off.',
    'Check that the guard is on and moves freely.',
    'Take the clamp off and stand the guard rail up.',
  ])('stays quiet: %s', (text) => {
    expect(says('guards/open', text)).toBe(0);
  });
});

it('finds nothing to do with guards on the clean board', () => {
  for (const rule of ['guards/open', 'guards/power', 'guards/exit'])
    expect(found(rule, board)).toEqual([]);
});

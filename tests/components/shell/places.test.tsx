import { frameOf, placeOf, placesFor } from '../../../components/shell/places';
import { type ShellPerson, type ShellRole } from '../../../components/shell/shell-person';

const person = (...roles: ShellRole[]): ShellPerson => ({
  displayName: 'Tilda',
  shopName: null,
  roles,
});
const labels = (who: ShellPerson | null | undefined) => placesFor(who).map((p) => p.label);

describe('who sees which places', () => {
  test.each([
    ['nobody signed in', null, ['Plans', 'Bench', 'Shop card', 'You']],
    ['not known yet', undefined, ['Plans', 'Bench', 'Shop card', 'You']],
    ['a viewer', person('viewer'), ['Plans', 'Bench', 'Shop card', 'You']],
    ['a creator', person('viewer', 'creator'), ['Plans', 'Bench', 'Drafting', 'Shop card', 'You']],
    ['a moderator', person('moderator'), ['Plans', 'Bench', 'Shop card', 'You', 'Cases']],
    ['an admin', person('admin'), ['Plans', 'Bench', 'Drafting', 'Shop card', 'You', 'Cases']],
  ])('%s', (_, who, expected) => {
    expect(labels(who)).toEqual(expected);
  });
});

test.each([
  ['/', 'plans'],
  ['/plans/shooting-board', 'plans'],
  ['/plans/shooting-board/layout', 'plans'],
  ['/bench', 'bench'],
  ['/bench/0198', 'bench'],
  ['/benches', undefined],
  ['/drafting/x/dimensions', 'drafting'],
  ['/you/sessions', 'you'],
  ['/sign-in', 'you'],
  ['/cases/214', 'cases'],
  ['/shop-card', 'shop-card'],
])('%s belongs to %s', (path, place) => {
  expect(placeOf(path)).toBe(place);
});

test.each([
  ['/', 'full'],
  ['/bench', 'full'],
  ['/bench/[copyId]', 'bare'],
  ['/bench/0198/report', 'bare'],
  ['/drafting', 'full'],
  ['/drafting/0198/dimensions', 'narrow'],
])('%s gets the %s frame', (path, frame) => {
  expect(frameOf(path)).toBe(frame);
});

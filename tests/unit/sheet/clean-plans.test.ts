import { buildPlan } from '../../../server/demo/build-plan';
import { planFacts } from '../../../shared/plan/facts';
import { checkSheet } from '../../../shared/plan/sheet';
import { benchDrawer } from './clean-drawer.data';
import { ashShelf } from './clean-shelf.data';

it.each([benchDrawer, ashShelf])('is quiet on $title', (rows) => {
  const { document } = buildPlan(rows);
  expect(checkSheet(document, undefined, 'publish').rows).toEqual([]);
});

it('adds the waits up along the longest chain', () => {
  const { document } = buildPlan(ashShelf);
  expect(planFacts(document)).toMatchObject({ handsOn: 175, elapsed: 175 + 1440 + 720 });
});

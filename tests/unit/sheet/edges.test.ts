import { rules } from '../../../shared/plan/sheet/rules';
import { more } from './planted-more.data';
import { planted } from './planted-plans.data';
import { found, table } from './planted.data';

it.each(more)('%s: %s finds it, and is quiet when it is mended', (_, rule, trips, quiet) => {
  const rows = found(rule, trips);
  expect(rows.length).toBeGreaterThan(0);
  for (const row of rows) expect([row.message, row.cure]).not.toContain('');
  expect(found(rule, quiet)).toEqual([]);
});

it('plants a fault for every rule there is', () => {
  const tried = new Set([...table, ...more].map(([, rule]) => rule));
  for (const [rule] of planted) tried.add(rule);
  expect(rules.map((r) => r.id).filter((rule) => !tried.has(rule))).toEqual([]);
});

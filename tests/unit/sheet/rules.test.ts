import { builtDemoPlans } from '../../../server/demo';
import { type PlanDocument } from '../../../shared/plan/document';
import { checkSheet } from '../../../shared/plan/sheet';
import { planted, step } from './planted-plans.data';

const clean = builtDemoPlans().map(({ key, built }) => [key, built.document] as const);
const rowsOf = (document: PlanDocument, rule: string) =>
  checkSheet(document).rows.filter((r) => r.rule === rule);
describe('the check sheet', () => {
  it.each(clean)('is quiet on the clean plan %s', (_, document) => {
    expect(checkSheet(document).rows).toEqual([]);
  });

  it.each(planted)('finds a planted fault by %s and leads to its place', (rule, document) => {
    const rows = rowsOf(document, rule);
    expect(rows.length).toBeGreaterThan(0);
    expect(rows[0]!.message).not.toBe('');
    expect(rows[0]!.cure).not.toBe('');
  });

  it('leaves out a should that was switched off with a reason, never a must', () => {
    const long = step(2, { text: 'word '.repeat(91) });
    const off = { ...long, switchedOff: [{ rule: 'text/long', reason: 'It is a list.' }] };
    expect(rowsOf(off, 'text/long')).toEqual([]);
    const must = {
      ...step(1, { parts: [] }),
      switchedOff: [{ rule: 'parts/made', reason: 'No.' }],
    };
    expect(rowsOf(must, 'parts/made').length).toBeGreaterThan(0);
  });
});

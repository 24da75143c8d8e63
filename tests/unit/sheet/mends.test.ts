import { importPlan } from '../../../shared/plan/interchange';
import { type PlanDocument } from '../../../shared/plan/document';
import { applyMend, checkSheet, mendLabel } from '../../../shared/plan/sheet';
import { board, found, id, steps } from './planted.data';

const text = 'Cut it to 12 in, then to 3 5/8 in. Keep hands 6 in away; use the 12 in rule.';
const typed = steps({ 1: { text } });
const mendsOf = (document: PlanDocument, rule: string) =>
  found(rule, document).flatMap((row) => row.mends ?? []);
const named = (document: PlanDocument, rule: string, label: string) =>
  mendsOf(document, rule).find((m) => mendLabel(m, document) === label)!;
const base = board.dimensions.find((d) => d.symbol === 'base_w')!;

it('refers to the dimension of the same value', () => {
  const next = applyMend(typed, named(typed, 'dims/loose-figure', 'Refer to base_w'), id());
  expect(next.steps[1]!.text).toBe(text.replace('12 in', `{{dim:${base.id}}}`));
  expect(found('dims/loose-figure', next)).toHaveLength(1);
});

it('makes a dimension of a figure that has none', () => {
  const made = id();
  const next = applyMend(typed, named(typed, 'dims/loose-figure', 'Make a dimension of it'), made);
  expect(next.steps[1]!.text).toContain(`then to {{dim:${made}}}.`);
  expect(next.dimensions.at(-1)).toMatchObject({
    id: made,
    symbol: 'size_1',
    expression: '3 5/8 in',
  });
  expect(importPlan(next).ok).toBe(true);
  expect(checkSheet(next).rows.filter((r) => r.rule.startsWith('dims/'))).toHaveLength(1);
});

it('takes a figure for a name from then on, once', () => {
  const mend = { do: 'name', text: '12 in' } as const;
  const next = applyMend(applyMend(typed, mend, id()), mend, id());
  expect(next.names).toEqual(['12 in']);
  expect(found('dims/loose-figure', next)).toHaveLength(1);
});

it('rules on words that the clip says otherwise', () => {
  const heard = {
    id: id(),
    at: 30,
    words: 'thirteen',
    value: { text: '13 in', mm: '1651/5' },
    unit: '',
    dimensionId: base.id,
    ruling: 'say' as const,
  };
  const said = steps({ 1: { heard: [heard] } });
  expect(found('media/says-otherwise', said)).toHaveLength(1);
  for (const label of ['Mute the words', 'Right on my machine']) {
    const next = applyMend(said, named(said, 'media/says-otherwise', label), id());
    expect(found('media/says-otherwise', next)).toEqual([]);
    expect(next.steps[1]!.heard[0]!.words).toBe('thirteen');
  }
});

it('changes nothing when the figure is gone meanwhile', () => {
  const mend = named(typed, 'dims/loose-figure', 'Refer to base_w');
  expect(applyMend(board, mend, id())).toEqual(board);
});

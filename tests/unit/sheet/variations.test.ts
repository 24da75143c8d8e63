import { builtDemoPlans } from '../../../server/demo';
import { type PlanDocument } from '../../../shared/plan/document';
import { renameSymbol } from '../../../shared/plan/rename';
import { checkSheet } from '../../../shared/plan/sheet';

const plans = builtDemoPlans().map(({ key, built }) => [key, built.document] as const);
const set = (document: PlanDocument, symbol: string, expression: string): PlanDocument => ({
  ...document,
  dimensions: document.dimensions.map((d) => (d.symbol === symbol ? { ...d, expression } : d)),
});
const [board, cart, cabinet] = plans.map(([, document]) => document) as [
  PlanDocument,
  PlanDocument,
  PlanDocument,
];

/** Clean plans changed the way other makers and other shops would have them; all of them stay right. */
const variations: [what: string, document: PlanDocument][] = [
  ...plans.map(([key, d]): [string, PlanDocument] => [
    `${key} with a symbol renamed`,
    renameSymbol(d, d.dimensions[2]!.symbol, 'another_name'),
  ]),
  ...plans.map(([key, d]): [string, PlanDocument] => [
    `${key} with its dimensions in another order`,
    { ...d, dimensions: [...d.dimensions].reverse() },
  ]),
  ...plans.map(([key, d]): [string, PlanDocument] => [
    `${key} with its parts in another order`,
    { ...d, parts: [...d.parts].reverse() },
  ]),
  ...plans.map(([key, d]): [string, PlanDocument] => [
    `${key} with a longer last wait`,
    {
      ...d,
      steps: d.steps.map((s) => ({
        ...s,
        waits: s.waits.map((w) => ({ ...w, minutes: w.minutes + 15 })),
      })),
    },
  ]),
  ['a wider board', set(board, 'base_w', '12 1/2 in')],
  ['a longer board', set(board, 'board_l', '22 in')],
  ['another plane', set(board, 'plane_body', '2 1/4 in')],
  ['thinner ply', set(board, 'sheet_t', '0.69 in')],
  ['a taller saw', set(cart, 'saw_h', '36 in')],
  ['smaller castors', set(cart, 'castor_h', '3 1/4 in')],
  ['a metric sheet under an inch cart', set(cart, 'ply_t', '18 mm')],
  ['a shorter cabinet', set(cabinet, 'height', '760 mm')],
  ['a wider cabinet', set(cabinet, 'width', '640 mm')],
  ['a cabinet of full eighteen', set(cabinet, 'sheet_t', '18 mm')],
  ['a cabinet written in inches', set(cabinet, 'cleat_w', '2 3/4 in')],
];

it.each(variations)('stays silent on %s', (_, document) => {
  expect(checkSheet(document).rows).toEqual([]);
});

it('has at least twenty of them', () => {
  expect(variations.length).toBeGreaterThanOrEqual(20);
});

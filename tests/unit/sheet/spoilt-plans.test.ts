import { buildPlan, type PlanRows, type StepRow } from '../../../server/demo/build-plan';
import { checkSheet } from '../../../shared/plan/sheet';
import { benchDrawer } from './clean-drawer.data';
import { ashShelf } from './clean-shelf.data';

type Act = Record<string, unknown>;
const step = (rows: PlanRows, n: number, change: (row: StepRow) => Partial<StepRow>): PlanRows => ({
  ...rows,
  steps: rows.steps.map((row, i) => (i + 1 === n ? { ...row, ...change(row) } : row)),
});
const acts = (rows: PlanRows, n: number, change: (action: Act, i: number) => Act[]) =>
  step(rows, n, (row) => ({ actions: (row.actions ?? []).flatMap(change) }));
const set = (rows: PlanRows, symbol: string, expression: string): PlanRows => ({
  ...rows,
  dimensions: rows.dimensions.map((d) =>
    d[0] === symbol ? ([d[0], d[1], d[2], expression, d[4], d[5]] as typeof d) : d,
  ),
});
const move = (rows: PlanRows, from: number, to: number): PlanRows => {
  const steps = [...rows.steps];
  steps.splice(to - 1, 0, ...steps.splice(from - 1, 1));
  return { ...rows, steps };
};
const hardware = (
  rows: PlanRows,
  key: string,
  more: Partial<NonNullable<PlanRows['hardware']>[number]>,
) => ({
  ...rows,
  hardware: (rows.hardware ?? []).map((h) => (h.key === key ? { ...h, ...more } : h)),
});
const parts = (
  rows: PlanRows,
  mark: string,
  more: Partial<PlanRows['parts'][number]>,
): PlanRows => ({
  ...rows,
  parts: rows.parts.map((p) => (p.mark === mark ? { ...p, ...more } : p)),
});

/** Plans that no rule was written against, each spoilt in one place. */
const spoilt: [what: string, rule: string, rows: PlanRows][] = [
  [
    'the guard stays off',
    'guards/open',
    acts(benchDrawer, 4, (a) => (a.to === 'back-on' && a.item === 'blade-guard' ? [] : [a])),
  ],
  [
    'the knife stays low for the next rip',
    'guards/open',
    acts(benchDrawer, 4, (a) => (a.to === 'back-on' && a.item === 'riving-knife' ? [] : [a])),
  ],
  [
    'the knife comes off for a groove',
    'guards/open',
    acts(benchDrawer, 4, (a) => [a.to === 'lowered' ? { ...a, to: 'off' } : a]),
  ],
  [
    'nothing in the guard’s place',
    'guards/open',
    acts(benchDrawer, 4, (a) => [
      a.kind === 'groove' ? { ...a, heldBy: ['fence', 'push-stick'] } : a,
    ]),
  ],
  [
    'guards off with the plug in',
    'guards/power',
    step(benchDrawer, 4, (row) => ({
      text: 'Take guard and knife off and groove.',
      actions: (row.actions ?? []).filter((a) => a.do !== 'power'),
    })),
  ],
  [
    'guards back with the plug in',
    'guards/power',
    step(benchDrawer, 4, (row) => ({
      text: 'Groove them.',
      actions: (row.actions ?? []).filter((a, i) => a.do !== 'power' || i === 0),
    })),
  ],
  [
    'rip fence as a stop',
    'safety/length-stop',
    acts(benchDrawer, 3, (a) => [{ ...a, lengthStop: 'rip-fence' }]),
  ],
  [
    'a narrow rip by hand',
    'safety/small-work',
    acts(benchDrawer, 2, (a) => [{ ...a, width: '3 in', heldBy: ['hand', 'fence'] }]),
  ],
  [
    'a rip across',
    'safety/confined',
    acts(benchDrawer, 5, (a) => [{ ...a, length: '12 in', width: '18 in' }]),
  ],
  ['a jig open behind', 'guards/exit', acts(benchDrawer, 3, (a) => [{ ...a, heldBy: ['jig'] }])],
  ['measured too late', 'dims/untaken', move(benchDrawer, 1, 4)],
  [
    'loaded too soon',
    'time/cure',
    step(benchDrawer, 6, () => ({
      waits: [{ minutes: 5, what: 'in clamps', kind: 'clamp', nextMayStart: false }],
    })),
  ],
  ['loaded with no wait', 'time/cure', step(ashShelf, 5, () => ({ waits: [], minutes: 1 }))],
  ['too few screws', 'parts/quantity', hardware(benchDrawer, 's', { quantity: 8 })],
  ['one side too many in words', 'parts/quantity', parts(benchDrawer, 'A', { quantity: 3 })],
  [
    'drilled by hand',
    'safety/workholding',
    acts(benchDrawer, 7, (a) => [{ ...a, heldBy: ['hand'] }]),
  ],
  ['no room for the bottom', 'checks/fails', set(benchDrawer, 'groove_w', '0.2 in')],
  ['too wide for the bench', 'checks/fails', set(benchDrawer, 'drawer_w', 'opening_w + 1/8 in')],
  ['eighteen inch ply', 'dims/unlikely', set(benchDrawer, 'side_t', '18 in')],
  ['a loop', 'dims/loop', set(benchDrawer, 'drawer_w', 'front_l + 2 * side_t')],
  ['a bare number', 'dims/kind', set(benchDrawer, 'drawer_w', 'opening_w - 1')],
  [
    'a typed size',
    'dims/loose-figure',
    step(benchDrawer, 3, () => ({
      text: 'Cut {{part:A}}, {{part:B}} and {{part:T}}; the fronts are 17 1/8 in.',
    })),
  ],
  ['one sheet too few', 'layout/enough', parts(benchDrawer, 'B', { quantity: 14 })],
  ['a bottom larger than its sheet', 'parts/fits-stock', set(benchDrawer, 'drawer_d', '25 in')],
  [
    'a side sized twice',
    'parts/made',
    step(benchDrawer, 5, () => ({ parts: ['C:sized', 'A:sized'] })),
  ],
  ['a bottom never cut', 'parts/made', step(benchDrawer, 5, () => ({ parts: [] }))],
  ['screws out of the shelf', 'fasteners/through', hardware(ashShelf, 's', { length: '45 mm' })],
  ['screws too short', 'fasteners/bite', hardware(ashShelf, 's', { length: '25 mm' })],
  [
    'a pilot as thick as the screw',
    'fasteners/pilot',
    acts(ashShelf, 6, (a) => [{ ...a, pilot: '4 mm' }]),
  ],
  [
    'tight holes across the grain',
    'movement/season',
    step(ashShelf, 6, () => ({
      text: 'Clamp {{part:B}} across below and drive the screws home into {{part:A}}.',
    })),
  ],
  [
    'short pieces over the cutters',
    'safety/minimum-length',
    acts(ashShelf, 3, (a) => [{ ...a, length: '180 mm' }]),
  ],
  ['no word on the rags', 'safety/finish', step(ashShelf, 7, () => ({ cautions: [] }))],
  [
    'no word on pipes',
    'safety/overhead',
    step(ashShelf, 8, () => ({
      text: 'Fix both brackets, {{dim:span}} apart.',
      actions: [{ do: 'mount', kg: 20, intoStructure: true }],
    })),
  ],
  [
    'no load given',
    'safety/overhead',
    step(ashShelf, 8, () => ({
      text: 'Look for pipes. Fix into studs, {{dim:span}} apart.',
      actions: [{ do: 'mount' }],
    })),
  ],
  [
    'half of it falls',
    'safety/workholding',
    acts(ashShelf, 4, (a) => [{ ...a, offcutHeld: false }]),
  ],
  ['a piece caught', 'safety/confined', acts(ashShelf, 4, (a) => [{ ...a, trapped: true }])],
  [
    'a cleaner lifted off while it runs',
    'safety/coast',
    acts(ashShelf, 2, (a) => [{ ...a, waitsForBlade: false }]),
  ],
  [
    'a dado head and nothing else',
    'machine/region',
    {
      ...acts(benchDrawer, 4, (a) => [a.kind === 'groove' ? { ...a, dadoHead: true } : a]),
      tools: benchDrawer.tools.map((t) => ({ ...t, instead: '' })),
    },
  ],
  ['an empty step', 'text/empty', step(ashShelf, 1, () => ({ text: '', takes: [] }))],
];

it.each(spoilt)('%s: %s', (_, rule, rows) => {
  const { document } = buildPlan(rows);
  const found = checkSheet(document, undefined, 'publish').rows.map((r) => r.rule);
  expect(found).toContain(rule);
});

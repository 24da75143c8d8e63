import { builtDemoPlans } from '../../../server/demo';
import { type PlanDocument, type Step } from '../../../shared/plan/document';
import { act, board, cut, guard, id, off, type Row, screw, steps } from './planted.data';

const cabinet = builtDemoPlans()[2]!.built.document;
const gone = '00000000-0000-7000-8000-ffffffffffff';
const partId = (mark: string, plan = board) => plan.parts.find((p) => p.mark === mark)!.id;
const dimId = (symbol: string, plan = board) =>
  plan.dimensions.find((d) => d.symbol === symbol)!.id;
const at = (n: number) => board.steps[n]!;
const actions = (...list: Step['actions']) => steps({ 1: { actions: list } });
const says = (text: string, ...list: Step['actions']) => steps({ 1: { text, actions: list } });
const rod = (more: Partial<PlanDocument['hardware'][number]>): PlanDocument => ({
  ...board,
  hardware: [{ ...board.hardware[0]!, ...more }],
});
const alternatives = (groups: string[][]): PlanDocument['flow'] => [
  {
    id: id(),
    kind: 'alternatives',
    name: 'Two ways',
    groups: groups.map((stepIds, i) => ({ id: id(), name: `Way ${i + 1}`, stepIds })),
  },
];
const sized = (...numbers: number[]) =>
  Object.fromEntries(
    numbers.map((n) => [
      n,
      { parts: [...at(n).parts, { partId: partId('A'), to: 'sized' as const }] },
    ]),
  );
const unsized = { 1: { parts: at(1).parts.filter((p) => p.partId !== partId('A')) } };
const heard = (dimensionId: string, text: string, mm: string, ruling: 'say' | 'muted' = 'say') =>
  steps({
    1: {
      heard: [
        { id: id(), at: 30, words: text, value: { text, mm }, unit: '', dimensionId, ruling },
      ],
    },
  });
const clipped = (starts: number[]): PlanDocument => ({
  ...board,
  clip: { source: 'upload', media: 'a'.repeat(64), captions: 'b'.repeat(64), duration: 300 },
  steps: board.steps.map((s, i) => {
    const start = starts[i];
    return { ...s, stretches: start === undefined ? [] : [{ start, end: start + 20 }] };
  }),
});
const oak = (more: Partial<Step>): PlanDocument => ({
  ...steps({
    3: { actions: [act({ do: 'glue', partIds: [partId('A')], acrossGrain: true })], ...more },
  }),
  stock: board.stock.map((s) => ({
    ...s,
    form: 'board' as const,
    name: 'Boards',
    material: 'red oak',
  })),
});
const label = { ...board.consumables[0]!, clamp: 90 };

/** Second table: the finer edges of the rules, each found and each quiet when it is mended. */
export const more: Row[] = [
  ['a tool that is gone', 'plan/references', steps({ 1: { toolIds: [gone] } }), board],
  [
    'a step before what it needs',
    'plan/order',
    steps({ 1: { after: [at(4).id] } }),
    steps({ 4: { after: [at(1).id] } }),
  ],
  [
    'an unknown symbol in a stock',
    'dims/unknown',
    { ...board, stock: board.stock.map((s) => ({ ...s, thickness: 'sheet_thick' })) },
    board,
  ],
  [
    'an unknown symbol in a check for the bench',
    'dims/unknown',
    {
      ...board,
      checks: board.checks.map((c, i) =>
        i ? c : { ...c, asked: 'bench', expression: 'runwy > 1 in' },
      ),
    },
    board,
  ],
  [
    'an unknown symbol in a cut',
    'dims/unknown',
    actions(cut({ length: 'nowhere' })),
    actions(cut({})),
  ],
  [
    'unlike kinds in a screw',
    'dims/kind',
    rod({ length: 'screw_l * 2 in' }),
    rod({ length: 'screw_l * 2' }),
  ],
  [
    'cut before it is measured',
    'dims/untaken',
    steps({ 0: { takes: [] }, 1: { text: 'Cut them.', holds: [] }, 2: { takes: at(0).takes } }),
    steps({ 0: { takes: [] }, 1: { text: 'Cut them.', holds: [], takes: at(0).takes } }),
  ],
  [
    'a kerf in the wrong unit',
    'dims/unlikely',
    { ...board, stock: board.stock.map((s) => ({ ...s, kerf: '1/8 mm' })) },
    board,
  ],
  [
    'a bit in the wrong unit',
    'dims/unlikely',
    actions(cut({ machine: 'router', kind: 'routing', heldBy: ['clamp'], bitDiameter: '6 in' })),
    actions(cut({ machine: 'router', kind: 'routing', heldBy: ['clamp'], bitDiameter: '6 mm' })),
  ],
  [
    'a should check that fails',
    'checks/should',
    {
      ...board,
      checks: board.checks.map((c) => ({
        ...c,
        level: 'should',
        expression: c.name === 'Fence is held' ? 'screw_l > 3 in' : c.expression,
      })),
    },
    board,
  ],
  [
    'sized twice in one of two ways',
    'parts/made',
    {
      ...steps({ ...unsized, ...sized(2, 3, 5) }),
      flow: alternatives([[at(2).id, at(3).id], [at(5).id]]),
    },
    {
      ...steps({ ...unsized, ...sized(2, 5) }),
      flow: alternatives([[at(2).id, at(3).id], [at(5).id]]),
    },
  ],
  [
    'sized in one of two ways only',
    'parts/made',
    { ...steps({ ...unsized, ...sized(2) }), flow: alternatives([[at(2).id], [at(5).id]]) },
    { ...steps({ ...unsized, ...sized(2, 5) }), flow: alternatives([[at(2).id], [at(5).id]]) },
  ],
  [
    'two cut where one is listed',
    'parts/quantity',
    steps({ 1: { text: `Cut two {{part:${partId('A')}}}.` } }),
    steps({ 1: { text: `Cut one {{part:${partId('A')}}}.` } }),
  ],
  [
    'a part thinner than its sheet',
    'parts/thickness',
    { ...board, parts: board.parts.map((p, i) => (i ? p : { ...p, thickness: '1/2 in' })) },
    board,
  ],
  [
    'wide parts that take a sheet each',
    'layout/enough',
    {
      ...board,
      parts: board.parts.map((p, i) =>
        i ? p : { ...p, length: '25 in', width: '13 in', quantity: 2 },
      ),
    },
    {
      ...board,
      parts: board.parts.map((p, i) => (i ? p : { ...p, length: '25 in', width: '11 in' })),
    },
  ],
  [
    'the thinnest sheet and the longest screw',
    'fasteners/through',
    rod({ length: '1.69 in' }),
    rod({ length: '1.6 in' }),
  ],
  [
    'a pilot as wide as the screw',
    'fasteners/pilot',
    actions(screw({ pilot: '5/32 in' })),
    actions(screw({ pilot: '3/32 in' })),
  ],
  [
    'a pilot like a needle',
    'fasteners/pilot',
    actions(screw({ pilot: '1/32 in' })),
    actions(screw({ pilot: '5/64 in' })),
  ],
  [
    'a clearance that binds',
    'fasteners/pilot',
    actions(screw({ pilot: 'none-needed', clearance: '1/8 in' })),
    actions(screw({ pilot: 'none-needed', clearance: '11/64 in' })),
  ],
  [
    'a countersink under a round head',
    'fasteners/pilot',
    {
      ...actions(screw({ countersink: true })),
      hardware: [{ ...board.hardware[0]!, head: 'round' }],
    },
    actions(screw({ countersink: true })),
  ],
  [
    'a guard taken off in words',
    'guards/open',
    says('Unplug the saw and take the blade guard off. Cut the groove.'),
    says(
      'Unplug the saw and take the blade guard off. Cut the groove, then put the guard back on.',
    ),
  ],
  [
    'a dado against the gauge alone',
    'guards/open',
    actions(cut({ kind: 'dado', heldBy: ['mitre-gauge'] })),
    actions(cut({ kind: 'dado', heldBy: ['mitre-gauge', 'hold-down'] })),
  ],
  [
    'power off after the guard',
    'guards/power',
    actions(guard('blade-guard', 'off'), off, guard('blade-guard', 'back-on')),
    actions(off, guard('blade-guard', 'off'), guard('blade-guard', 'back-on')),
  ],
  [
    'another machine’s plug',
    'guards/power',
    actions(
      act({ do: 'power', machine: 'router', isolated: true }),
      guard('blade-guard', 'off'),
      guard('blade-guard', 'back-on'),
    ),
    actions(off, guard('blade-guard', 'off'), guard('blade-guard', 'back-on')),
  ],
  [
    'a cut between plug and guard',
    'guards/power',
    actions(off, cut({}), guard('blade-guard', 'off'), guard('blade-guard', 'back-on')),
    actions(off, guard('blade-guard', 'off'), guard('blade-guard', 'back-on'), cut({})),
  ],
  [
    'an offcut flicked away',
    'safety/coast',
    says('Rip it and brush the offcut away.', cut({})),
    says('Rip it. When the blade has stopped brush the offcut away.', cut({})),
  ],
  [
    'the fence as a stop, in words',
    'safety/length-stop',
    says(
      'Set the rip fence as a stop and crosscut all four.',
      cut({ kind: 'through-crosscut', heldBy: ['mitre-gauge'] }),
    ),
    says(
      'Never use the fence as a stop. Crosscut all four.',
      cut({ kind: 'through-crosscut', heldBy: ['mitre-gauge'] }),
    ),
  ],
  [
    'a short end held by hand',
    'safety/small-work',
    actions(
      cut({
        machine: 'mitre-saw',
        kind: 'through-crosscut',
        length: '4 in',
        width: '2 in',
        heldBy: ['hand', 'fence'],
      }),
    ),
    actions(
      cut({
        machine: 'mitre-saw',
        kind: 'through-crosscut',
        length: '30 in',
        width: '2 in',
        heldBy: ['hand', 'fence'],
      }),
    ),
  ],
  [
    'a short rip',
    'safety/minimum-length',
    actions(cut({ length: '6 in', width: '5 in' })),
    actions(cut({ length: '14 in', width: '5 in' })),
  ],
  [
    'a short piece through the planer',
    'safety/minimum-length',
    actions(cut({ machine: 'planer', kind: 'planing', length: '8 in', width: '2 in', heldBy: [] })),
    actions(
      cut({ machine: 'planer', kind: 'planing', length: '20 in', width: '2 in', heldBy: [] }),
    ),
  ],
  [
    'full depth in one pass',
    'safety/router',
    says(
      'Rout it.',
      cut({
        machine: 'router',
        kind: 'routing',
        heldBy: ['clamp'],
        bitDiameter: '6 mm',
        depth: '12 mm',
      }),
    ),
    says(
      'Rout it in three passes.',
      cut({
        machine: 'router',
        kind: 'routing',
        heldBy: ['clamp'],
        bitDiameter: '6 mm',
        depth: '12 mm',
      }),
    ),
  ],
  [
    'gloves at the saw',
    'safety/loose-clothing',
    says('With gloves on, rip it.', cut({})),
    says('Never wear gloves at the saw. Rip it.', cut({})),
  ],
  [
    'an oil that is only named',
    'safety/finish',
    {
      ...steps({
        8: {
          text: 'Oil it.',
          actions: [act({ do: 'finish', consumableId: board.consumables[1]!.id })],
        },
      }),
      consumables: [board.consumables[0]!, { ...board.consumables[1]!, name: 'Linseed oil' }],
    },
    steps({
      8: {
        text: 'Wax it.',
        actions: [act({ do: 'finish', consumableId: board.consumables[1]!.id })],
      },
    }),
  ],
  [
    'treated timber',
    'safety/material',
    {
      ...board,
      stock: board.stock.map((s) => ({ ...s, material: 'pressure-treated pine' })),
      steps: board.steps.map((s) => ({ ...s, cautions: [] })),
    },
    { ...board, stock: board.stock.map((s) => ({ ...s, material: 'pressure-treated pine' })) },
  ],
  [
    'a heavy thing lifted alone',
    'safety/overhead',
    {
      ...cabinet,
      steps: cabinet.steps.map((s) => ({
        ...s,
        people: 1,
        actions: s.actions.map((a) => (a.do === 'mount' ? { ...a, liftingHelp: false } : a)),
      })),
    },
    cabinet,
  ],
  [
    'a base that the clip gives otherwise',
    'media/says-otherwise',
    heard(dimId('base_w'), '13 in', '1651/5'),
    heard(dimId('base_w'), '12 in', '1524/5'),
  ],
  [
    'a muted one',
    'media/says-otherwise',
    heard(dimId('base_w'), '13 in', '1651/5'),
    heard(dimId('base_w'), '13 in', '1651/5', 'muted'),
  ],
  [
    'what each builder measures',
    'media/says-otherwise',
    heard(dimId('base_w'), '13 in', '1651/5'),
    heard(dimId('plane_body'), '3 in', '381/5'),
  ],
  ['a stretch before the one above', 'media/stretch', clipped([0, 60, 30]), clipped([0, 30, 60])],
  [
    'sooner than the glue’s label',
    'time/cure',
    { ...steps({ 3: { waits: [] }, 4: { loadsJoint: true } }), consumables: [label] },
    {
      ...steps({
        3: { waits: [{ ...at(3).waits[0]!, minutes: 90, nextMayStart: false }] },
        4: { loadsJoint: true },
      }),
      consumables: [label],
    },
  ],
  [
    'not told to wait',
    'time/cure',
    steps({ 4: { loadsJoint: true } }),
    steps({ 4: { loadsJoint: true, after: [at(3).id] } }),
  ],
  [
    'oak glued across',
    'movement/season',
    oak({}),
    oak({ text: 'Glue it at the middle only, so that it is free to move.' }),
  ],
  [
    'narrow oak',
    'movement/season',
    oak({}),
    oak({ actions: [act({ do: 'glue', partIds: [partId('C'), partId('D')], acrossGrain: true })] }),
  ],
];

import { builtDemoPlans } from '../../../server/demo';
import { actionSchema, type PlanDocument, type Step } from '../../../shared/plan/document';
import { checkSheet } from '../../../shared/plan/sheet';

export const board = builtDemoPlans()[0]!.built.document;
const cart = builtDemoPlans()[1]!.built.document;
let next = 0;
export const id = () => `00000000-0000-7000-8000-${(next += 1).toString(16).padStart(12, '0')}`;
export const act = (input: Record<string, unknown>) => actionSchema.parse({ id: id(), ...input });
export const cut = (more: Record<string, unknown>) =>
  act({
    do: 'cut',
    machine: 'table-saw',
    kind: 'through-rip',
    length: '40 in',
    width: '12 in',
    heldBy: ['push-stick', 'fence'],
    ...more,
  });
export const guard = (item: string, to: string) =>
  act({ do: 'guard', machine: 'table-saw', item, to });
export const off = act({ do: 'power', machine: 'table-saw', isolated: true });
/** The board with actions (and other things) in some of its steps. */
export const steps = (
  changes: Record<number, Partial<Step>>,
  base: PlanDocument = board,
): PlanDocument => ({
  ...base,
  steps: base.steps.map((s, i) => ({ ...s, ...changes[i] })),
});
export const found = (rule: string, document: PlanDocument) =>
  checkSheet(document).rows.filter((r) => r.rule === rule);
export const screw = (more: Record<string, unknown>) =>
  act({
    do: 'fasten',
    hardwareId: board.hardware[0]!.id,
    quantity: 1,
    throughThickness: '0.7 in',
    intoThickness: '1 in',
    pilot: 'pilot',
    ...more,
  });

export type Row = [what: string, rule: string, trips: PlanDocument, quiet: PlanDocument];
export const table: Row[] = [
  [
    'through rip with the guard off',
    'guards/open',
    steps({
      1: { actions: [off, guard('blade-guard', 'off'), cut({}), guard('blade-guard', 'back-on')] },
    }),
    steps({
      1: { actions: [off, guard('blade-guard', 'off'), guard('blade-guard', 'back-on'), cut({})] },
    }),
  ],
  [
    'guard never put back',
    'guards/open',
    steps({
      1: {
        actions: [
          off,
          guard('blade-guard', 'off'),
          cut({ kind: 'groove', heldBy: ['feather-board'] }),
        ],
      },
    }),
    steps({
      1: {
        actions: [
          off,
          guard('blade-guard', 'off'),
          cut({ kind: 'groove', heldBy: ['feather-board'] }),
        ],
      },
      2: { actions: [off, guard('blade-guard', 'back-on')] },
    }),
  ],
  [
    'groove with nothing in the guard’s place',
    'guards/open',
    steps({
      1: {
        actions: [
          off,
          guard('blade-guard', 'off'),
          cut({ kind: 'groove', heldBy: ['fence'] }),
          guard('blade-guard', 'back-on'),
        ],
      },
    }),
    steps({
      1: {
        actions: [
          off,
          guard('blade-guard', 'off'),
          cut({ kind: 'groove', heldBy: ['fence'], guardInstead: 'a tunnel on the jig' }),
          guard('blade-guard', 'back-on'),
        ],
      },
    }),
  ],
  [
    'riving knife off for a groove',
    'guards/open',
    steps({
      1: {
        actions: [
          off,
          guard('riving-knife', 'off'),
          cut({ kind: 'groove', heldBy: ['hold-down'] }),
          guard('riving-knife', 'back-on'),
        ],
      },
    }),
    steps({
      1: {
        actions: [
          off,
          guard('riving-knife', 'lowered'),
          cut({ kind: 'groove', heldBy: ['hold-down'] }),
          guard('riving-knife', 'back-on'),
        ],
      },
    }),
  ],
  [
    'a jig without a covered exit',
    'guards/exit',
    steps({ 1: { actions: [cut({ kind: 'through-crosscut', heldBy: ['jig'] })] } }),
    steps({
      1: {
        actions: [
          cut({
            kind: 'through-crosscut',
            heldBy: ['jig'],
            exitCover: 'block behind the fence',
            exitStop: 'stop on the table',
          }),
        ],
      },
    }),
  ],
  [
    'guard touched with the plug in',
    'guards/power',
    steps({ 1: { actions: [guard('blade-guard', 'off'), guard('blade-guard', 'back-on')] } }),
    steps({ 1: { actions: [off, guard('blade-guard', 'off'), guard('blade-guard', 'back-on')] } }),
  ],
  [
    'cutter changed with the plug in',
    'guards/power',
    steps({ 1: { text: 'Fit the new cutter in the collet.' } }),
    steps({ 1: { text: 'Pull the plug. Fit the new cutter in the collet.' } }),
  ],
  [
    'reaching past a turning blade',
    'safety/coast',
    steps({ 1: { actions: [cut({ waitsForBlade: false })] } }),
    steps({ 1: { actions: [cut({ waitsForBlade: true })] } }),
  ],
  [
    'rip wider than long',
    'safety/confined',
    steps({ 1: { actions: [cut({ length: '6 in', width: '20 in' })] } }),
    steps({ 1: { actions: [cut({ length: '20 in', width: '6 in' })] } }),
  ],
  [
    'piece caught',
    'safety/confined',
    steps({ 1: { actions: [cut({ trapped: true })] } }),
    steps({ 1: { actions: [cut({})] } }),
  ],
  [
    'rip fence as a stop',
    'safety/length-stop',
    steps({
      1: {
        actions: [
          cut({ kind: 'through-crosscut', heldBy: ['mitre-gauge'], lengthStop: 'rip-fence' }),
        ],
      },
    }),
    steps({
      1: {
        actions: [
          cut({ kind: 'through-crosscut', heldBy: ['mitre-gauge'], lengthStop: 'stand-off-block' }),
        ],
      },
    }),
  ],
  [
    'narrow rip by hand',
    'safety/small-work',
    steps({ 1: { actions: [cut({ width: '2 in', heldBy: ['hand', 'fence'] })] } }),
    steps({ 1: { actions: [cut({ width: '2 in' })] } }),
  ],
  [
    'short piece on the jointer',
    'safety/minimum-length',
    steps({
      1: {
        actions: [
          cut({
            machine: 'jointer',
            kind: 'jointing',
            length: '8 in',
            width: '5 in',
            heldBy: ['push-block'],
          }),
        ],
      },
    }),
    steps({
      1: {
        actions: [
          cut({
            machine: 'jointer',
            kind: 'jointing',
            length: '20 in',
            width: '5 in',
            heldBy: ['push-block'],
          }),
        ],
      },
    }),
  ],
  [
    'drill press by hand',
    'safety/workholding',
    steps({
      1: { actions: [cut({ machine: 'drill-press', kind: 'drilling', heldBy: ['hand'] })] },
    }),
    steps({
      1: { actions: [cut({ machine: 'drill-press', kind: 'drilling', heldBy: ['clamp'] })] },
    }),
  ],
  [
    'climb cut',
    'safety/router',
    steps({
      1: {
        actions: [
          cut({
            machine: 'router',
            kind: 'routing',
            heldBy: ['clamp'],
            feedAgainstRotation: false,
          }),
        ],
      },
    }),
    steps({
      1: {
        actions: [
          cut({ machine: 'router', kind: 'routing', heldBy: ['clamp'], feedAgainstRotation: true }),
        ],
      },
    }),
  ],
  [
    'large bit at full speed',
    'safety/router',
    steps({
      1: {
        actions: [
          cut({
            machine: 'router',
            kind: 'routing',
            heldBy: ['clamp'],
            bitDiameter: '60 mm',
            rpm: 24000,
          }),
        ],
      },
    }),
    steps({
      1: {
        actions: [
          cut({
            machine: 'router',
            kind: 'routing',
            heldBy: ['clamp'],
            bitDiameter: '12 mm',
            rpm: 24000,
          }),
        ],
      },
    }),
  ],
  [
    'standing line taken out',
    'safety/eye-ear-dust',
    steps({ 1: { withoutLines: ['safety/eye-ear-dust'] } }),
    steps({ 1: { withoutLines: [] } }),
  ],
  [
    'gloves at the saw',
    'safety/loose-clothing',
    steps({ 1: { text: 'Wear gloves and rip it.', actions: [cut({})] } }),
    steps({ 1: { text: 'Gloves off, then rip it.', actions: [cut({})] } }),
  ],
  [
    'oily rags',
    'safety/finish',
    steps({ 8: { text: 'Oil it.', cautions: [], actions: [act({ do: 'finish', oily: true })] } }),
    steps({
      8: {
        text: 'Oil it. Lay the rags flat outdoors.',
        cautions: [],
        actions: [act({ do: 'finish', oily: true })],
      },
    }),
  ],
  [
    'reclaimed boards',
    'safety/material',
    {
      ...board,
      stock: board.stock.map((s, i) => (i === 0 ? { ...s, material: 'reclaimed pine' } : s)),
    },
    {
      ...steps({ 1: { text: 'Look for nails first.' } }),
      stock: board.stock.map((s, i) => (i === 0 ? { ...s, material: 'reclaimed pine' } : s)),
    },
  ],
  [
    'hung without structure',
    'safety/overhead',
    steps({ 7: { actions: [act({ do: 'mount', kg: 10 })] } }),
    steps({
      7: { actions: [act({ do: 'mount', kg: 10, intoStructure: true, servicesLookedFor: true })] },
    }),
  ],
  [
    'castors nobody locks',
    'safety/overhead',
    steps(
      Object.fromEntries(cart.steps.map((_, i) => [i, { text: 'Do it.', cautions: [] }])),
      cart,
    ),
    cart,
  ],
  [
    'dado head only',
    'machine/region',
    steps({ 1: { actions: [cut({ kind: 'dado', dadoHead: true, guardInstead: 'hold-downs' })] } }),
    {
      ...steps({
        1: { actions: [cut({ kind: 'dado', dadoHead: true, guardInstead: 'hold-downs' })] },
      }),
      tools: [{ ...board.tools[0]!, machine: 'table-saw', instead: 'A router along a fence.' }],
    },
  ],
  [
    'screw out the far side',
    'fasteners/through',
    steps({ 7: { actions: [screw({ intoThickness: '0.5 in' })] } }),
    steps({ 7: { actions: [screw({})] } }),
  ],
  [
    'screw too short',
    'fasteners/bite',
    steps({ 7: { actions: [screw({ throughThickness: '1.1 in' })] } }),
    steps({ 7: { actions: [screw({})] } }),
  ],
  [
    'no word on the pilot',
    'fasteners/pilot',
    steps({ 7: { actions: [screw({ pilot: '' })] } }),
    steps({ 7: { actions: [screw({ pilot: 'none-needed' })] } }),
  ],
  [
    'screw in the saw path',
    'fasteners/in-cut',
    steps({ 7: { actions: [screw({ x: '5 in', clearOfCut: '5.1 in' })] } }),
    steps({ 7: { actions: [screw({ x: '5 in', clearOfCut: '6 in' })] } }),
  ],
  [
    'more screws used than listed',
    'parts/quantity',
    steps({ 7: { actions: [screw({ quantity: 99 })] } }),
    board,
  ],
  [
    'part larger than the sheet',
    'parts/fits-stock',
    { ...board, parts: board.parts.map((p, i) => (i === 0 ? { ...p, length: '60 in' } : p)) },
    board,
  ],
  [
    'part thicker than its stock',
    'parts/thickness',
    { ...board, parts: board.parts.map((p, i) => (i === 0 ? { ...p, thickness: '1 in' } : p)) },
    board,
  ],
  [
    'not enough sheet',
    'layout/enough',
    { ...board, parts: board.parts.map((p, i) => (i === 0 ? { ...p, quantity: 9 } : p)) },
    board,
  ],
  [
    'eighteen inch plywood',
    'dims/unlikely',
    { ...board, stock: board.stock.map((s, i) => (i === 0 ? { ...s, thickness: '18 in' } : s)) },
    board,
  ],
  [
    'a figure typed in prose',
    'dims/loose-figure',
    steps({ 1: { text: 'Cut it to 12 in.' } }),
    steps({ 1: { text: 'Drill with a 5/64 in bit, about 1/2 in deep. Sand to 120 grit.' } }),
  ],
  [
    'wide solid wood glued across',
    'movement/season',
    {
      ...steps({
        3: { actions: [act({ do: 'glue', partIds: [board.parts[0]!.id], acrossGrain: true })] },
      }),
      stock: board.stock.map((s) => ({
        ...s,
        form: 'board' as const,
        material: 'red oak',
        name: 'Boards',
      })),
    },
    steps({
      3: { actions: [act({ do: 'glue', partIds: [board.parts[0]!.id], acrossGrain: true })] },
    }),
  ],
];

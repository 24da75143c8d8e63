import {
  actionSchema,
  cutKinds,
  guardItems,
  machineClasses,
  type Action,
  type Cut,
  type Fasten,
  type Glue,
  type GuardChange,
  type PlanDocument,
  type PowerState,
} from '../../../shared/plan/document';
import { fieldsOf, type ListField, type ListFields } from '../fields/list-field';
import {
  amount,
  choice,
  flag,
  maybe,
  measured,
  one,
  options,
  several,
  text,
  whole,
} from '../fields/makers';
import { actionLine } from './action-line';

type Did<K extends Action['do']> = Extract<Action, { do: K }>;
const is =
  <K extends Action['do']>(kind: K) =>
  (action: Action): action is Did<K> =>
    action.do === kind;

const holds = [
  'hand',
  'push-stick',
  'push-block',
  'feather-board',
  'hold-down',
  'clamp',
  'jig',
  'fence',
  'mitre-gauge',
  'vice',
  'tunnel',
  'tape',
  'helper-person',
];

const partOptions = (document: PlanDocument) =>
  document.parts.map((p) => ({ value: p.id, label: `${p.mark} ${p.name}` }));
const named = (list: readonly { id: string; name: string }[]) =>
  list.map(({ id, name }) => ({ value: id, label: name }));

const turns = new Set<Cut['machine']>(['router', 'router-table', 'drill', 'drill-press']);

function cutFields(document: PlanDocument, cut: Cut): readonly ListField<Cut>[] {
  return [
    choice('machine', 'Machine', machineClasses),
    choice('kind', 'Cut', cutKinds),
    several('partIds', 'Parts cut', partOptions(document)),
    measured(document, 'length', 'Length on the machine, if not the part’s'),
    measured(document, 'width', 'Width on the machine, if not the part’s'),
    measured(document, 'depth', 'Depth'),
    several('heldBy', 'Held and fed by', options(holds)),
    choice('lengthStop', 'Length set by', ['none', 'rip-fence', 'stand-off-block', 'stop-block']),
    flag('trapped', 'The piece touches something on both sides of the blade'),
    text('guardInstead', 'What guards the cut where the machine’s guard cannot pass'),
    text('exitCover', 'What covers the place where the blade comes out'),
    text('exitStop', 'What stops the travel there'),
    maybe('waitsForBlade', 'Waits until the blade stands still'),
    maybe('feedAgainstRotation', 'Fed against the rotation'),
    maybe('offcutHeld', 'The piece cut free is held too'),
    ...(turns.has(cut.machine)
      ? [
          measured<Cut, 'bitDiameter'>(document, 'bitDiameter', 'Diameter of the bit'),
          measured<Cut, 'depthPerPass'>(document, 'depthPerPass', 'Depth of one pass'),
          amount<Cut, 'rpm'>('rpm', 'Speed, revolutions a minute', 60_000),
        ]
      : []),
    ...(cut.kind === 'dado' || cut.kind === 'groove'
      ? [flag<Cut, 'dadoHead'>('dadoHead', 'With a dado head')]
      : []),
  ];
}

const guardFields: readonly ListField<GuardChange>[] = [
  choice('machine', 'Machine', machineClasses),
  choice('item', 'What', guardItems),
  choice('to', 'Is', ['off', 'lowered', 'back-on']),
];

const powerFields: readonly ListField<PowerState>[] = [
  choice('machine', 'Machine', machineClasses),
  flag('isolated', 'Unplugged, or its battery out'),
  choice('touches', 'Hands at the', ['blade', 'bit', 'guard', 'setting']),
];

function fastenFields(document: PlanDocument): readonly ListField<Fasten>[] {
  return [
    {
      key: 'hardwareId',
      label: 'With',
      options: named(document.hardware),
      get: (a) => a.hardwareId,
      set: (a, hardwareId) => ({ ...a, hardwareId }),
    },
    whole('quantity', 'How many', 1000),
    one('throughPartId', 'Through part', partOptions(document)),
    one('intoPartId', 'Into part', partOptions(document)),
    measured(document, 'throughThickness', 'Thickness it goes through, if not the part’s'),
    measured(document, 'intoThickness', 'Depth it may bite in, if not the part’s'),
    text('pilot', 'Pilot hole', {
      mono: true,
      help: 'A diameter, or none-needed.',
    }),
    measured(document, 'clearance', 'Clearance hole'),
    flag('countersink', 'Countersunk'),
    measured(document, 'x', 'From the part’s left end'),
    measured(document, 'y', 'From its lower edge'),
    measured(document, 'clearOfCut', 'Stays clear of a saw’s path by'),
    flag('acrossGrain', 'Holds solid wood across its grain'),
  ];
}

const glueFields = (document: PlanDocument): readonly ListField<Glue>[] => [
  one('consumableId', 'Glue', named(document.consumables.filter((c) => c.kind === 'glue'))),
  several('partIds', 'Parts glued', partOptions(document)),
  flag('acrossGrain', 'Solid wood glued across its grain'),
];

const finishFields = (document: PlanDocument): readonly ListField<Did<'finish'>>[] => [
  one('consumableId', 'Finish', named(document.consumables.filter((c) => c.kind === 'finish'))),
  flag('oily', 'An oil that dries', 'Its rags can catch fire by themselves.'),
  flag('solvent', 'With a solvent'),
];

const mountFields: readonly ListField<Did<'mount'>>[] = [
  amount('kg', 'Load on the wall, kilograms', 10_000),
  flag('intoStructure', 'Fixed into the wall’s structure'),
  flag('servicesLookedFor', 'Wires and pipes looked for first'),
  flag('liftingHelp', 'Lifted by two, or with a support'),
];

function fieldsFor(document: PlanDocument, action: Action): readonly ListField<Action>[] {
  switch (action.do) {
    case 'cut':
      return fieldsOf(is('cut'), cutFields(document, action));
    case 'guard':
      return fieldsOf(is('guard'), guardFields);
    case 'power':
      return fieldsOf(is('power'), powerFields);
    case 'fasten':
      return fieldsOf(is('fasten'), fastenFields(document));
    case 'glue':
      return fieldsOf(is('glue'), glueFields(document));
    case 'finish':
      return fieldsOf(is('finish'), finishFields(document));
    case 'mount':
      return fieldsOf(is('mount'), mountFields);
  }
}

/** What is done in a step, as the check sheet reads it: cuts, guards, power, fastenings, glue, finish, hanging. */
export function actionFields(document: PlanDocument): ListFields<Action> {
  const hardware = document.hardware[0];
  const machine = document.tools.find((t) => t.machine !== 'hand-tool')?.machine ?? 'table-saw';
  const make = (label: string, start: object) => ({
    label,
    make: (id: string) => actionSchema.parse({ id, ...start }),
  });
  return {
    make: [
      make('A cut', { do: 'cut', machine, kind: 'through-crosscut' }),
      make('A guard', { do: 'guard', machine, item: 'blade-guard', to: 'off' }),
      make('The plug', { do: 'power', machine, isolated: true }),
      ...(hardware ? [make('A fastening', { do: 'fasten', hardwareId: hardware.id })] : []),
      make('Glue', { do: 'glue' }),
      make('Finish', { do: 'finish' }),
      make('Hanging', { do: 'mount' }),
    ],
    name: (action) => actionLine(action, document),
    fields: (action) => fieldsFor(document, action),
  };
}

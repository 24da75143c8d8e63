import {
  consumableSchema,
  creditSchema,
  disclosures,
  hardwareSchema,
  linkSchema,
  machineClasses,
  stockSchema,
  toolSchema,
  type Consumable,
  type Credit,
  type Hardware,
  type PlanDocument,
  type PlanLink,
  type Stock,
  type Tool,
} from '../../../shared/plan/document';
import { ListEditor } from './list-editor';
import { type ListFields } from './list-field';
import {
  addressField,
  amount,
  choice,
  flag,
  measured,
  one,
  options,
  said,
  text,
  whole,
} from './makers';

type Size = Stock['sizes'][number];

const sizeFields = (document: PlanDocument): ListFields<Size> => ({
  make: (id) => ({ id, length: '', width: '' }),
  name: (s) => [s.length, s.width].filter(Boolean).join(' × '),
  fields: [
    measured(document, 'length', 'Length', { needed: true }),
    measured(document, 'width', 'Width'),
    amount('price', 'Price', 1_000_000),
  ],
});

/** Sheets, boards, strips and rods. */
export const stockFields = (document: PlanDocument): ListFields<Stock> => ({
  make: (id) => stockSchema.parse({ id, name: '', form: 'sheet', thickness: '' }),
  name: (s) => s.name,
  fields: [
    text('name', 'Name'),
    choice('form', 'Form', ['sheet', 'board', 'strip', 'rod']),
    text('material', 'Material'),
    measured(document, 'thickness', 'Actual thickness', { needed: true }),
    whole('quantity', 'How many'),
    measured(document, 'kerf', 'Kerf it is cut with'),
    flag('grained', 'Its grain shows'),
    text('note', 'Note'),
    {
      key: 'sizes',
      draw: (stock, change) => (
        <ListEditor
          level={3}
          title="Sizes on sale"
          fields={sizeFields(document)}
          items={stock.sizes}
          onChange={(fn) => change((s) => ({ ...s, sizes: fn(s.sizes) }))}
        />
      ),
    },
  ],
});

const drivenIn = new Set<Hardware['kind']>(['screw', 'brad', 'bolt']);

/** Screws, bolts, hinges and the like. */
export const hardwareFields = (document: PlanDocument): ListFields<Hardware> => ({
  make: (id) => hardwareSchema.parse({ id, kind: 'screw', name: '' }),
  name: (h) => h.name,
  fields: (h) => [
    text('name', 'Name'),
    choice('kind', 'Kind', [
      'screw',
      'bolt',
      'brad',
      'hinge',
      'slide',
      'castor',
      'magnet',
      'other',
    ]),
    whole('quantity', 'How many'),
    ...(drivenIn.has(h.kind)
      ? [
          one<Hardware, 'series'>('series', 'Series', [
            { value: 'us', label: 'American gauge' },
            { value: 'british', label: 'British gauge' },
            { value: 'metric', label: 'metric' },
          ]),
          text<Hardware, 'gauge'>('gauge', 'Gauge', { set: emptied('gauge') }),
          measured<Hardware, 'diameter'>(document, 'diameter', 'Diameter', {
            set: emptied('diameter'),
          }),
          measured<Hardware, 'length'>(document, 'length', 'Length', { set: emptied('length') }),
          text<Hardware, 'head'>('head', 'Head', { set: emptied('head') }),
          flag<Hardware, 'through'>('through', 'Comes out the far side on purpose'),
        ]
      : []),
    amount('packOf', 'Sold in packs of', 10_000),
    amount('price', 'Price of a pack', 1_000_000),
    text('note', 'Note'),
  ],
});

/** An empty text of an optional field is no field. */
const emptied =
  (key: 'gauge' | 'diameter' | 'length' | 'head') =>
  (item: Hardware, value: string): Hardware => ({
    ...item,
    [key]: value === '' ? undefined : value,
  });

/** Glue, finish, abrasives. */
export const consumableFields: ListFields<Consumable> = {
  make: (id) => consumableSchema.parse({ id, kind: 'glue', name: '' }),
  name: (c) => c.name,
  fields: (c) => [
    text('name', 'Name'),
    choice('kind', 'Kind', ['glue', 'finish', 'abrasive', 'other']),
    text('amount', 'How much'),
    ...(c.kind === 'glue' || c.kind === 'finish'
      ? [
          amount<Consumable, 'open'>('open', 'Open time on its label, minutes', 100_000),
          amount<Consumable, 'clamp'>('clamp', 'Clamp time on its label, minutes', 100_000),
          amount<Consumable, 'cure'>('cure', 'Full cure on its label, minutes', 100_000),
        ]
      : []),
    text('note', 'As its label says'),
  ],
};

type Need = Tool['needs'][number] & { id: string };
const needs = ['depth-of-cut', 'rip', 'crosscut', 'throat', 'reach', 'slot-width'] as const;

const needFields = (document: PlanDocument): ListFields<Need> => ({
  make: (_, count) => ({ id: String(count), limit: 'depth-of-cut', atLeast: '' }),
  name: (n) => `${said(n.limit)}, at least ${n.atLeast || '…'}`,
  fields: [
    choice('limit', 'What', needs),
    measured(document, 'atLeast', 'At least', { needed: true }),
  ],
});

/** A need has no id of its own in the plan; its place in the list is one while it is edited. */
const numbered = (list: Tool['needs']): Need[] => list.map((n, i) => ({ ...n, id: String(i) }));
const bare = (list: readonly Need[]): Tool['needs'] =>
  list.map(({ limit, atLeast }) => ({ limit, atLeast }));

/** Machines and hand tools. */
export const toolFields = (document: PlanDocument): ListFields<Tool> => ({
  make: (id) => toolSchema.parse({ id, machine: 'hand-tool', name: '' }),
  name: (t) => t.name,
  fields: [
    text('name', 'Name'),
    choice('machine', 'Machine or hand tool', machineClasses),
    flag('needed', 'Needed'),
    text('instead', 'Instead you can'),
    {
      key: 'needs',
      draw: (tool, change) => (
        <ListEditor
          level={3}
          title="What it must be able to do"
          fields={needFields(document)}
          items={numbered(tool.needs)}
          onChange={(fn) => change((t) => ({ ...t, needs: bare(fn(numbered(t.needs))) }))}
        />
      ),
    },
  ],
});

/** Pages the plan leads to. */
export const linkFields: ListFields<PlanLink> = {
  make: (id) => linkSchema.parse({ id, title: '', url: 'https://example.org/' }),
  name: (l) => l.title,
  fields: [
    text('title', 'Title'),
    addressField('url', 'Address', false),
    flag('onSale', 'Leads to something on sale'),
    {
      key: 'disclosure',
      label: 'What it earns you',
      options: [{ value: 'unsaid', label: 'not said yet' }, ...options(disclosures)],
      get: (l) => l.disclosure ?? 'unsaid',
      set: (l, v) => ({
        ...l,
        disclosure: v === 'unsaid' ? undefined : (v as PlanLink['disclosure']),
      }),
    },
    text('note', 'Note'),
  ],
};

/** Whose work a plan builds on. */
export const creditFields: ListFields<Credit> = {
  make: (id) => creditSchema.parse({ id, text: '' }),
  name: (c) => c.text,
  fields: [
    text('text', 'Whose method or design it builds on'),
    addressField('url', 'Address', true),
  ],
};

import { v7 as uuid } from 'uuid';
import { parseCheck, parseExpression, parseLength, reservedWords } from '../../shared/measure';
import {
  disclosures,
  grains,
  hardwareSchema,
  instruments,
  kinds,
  linkSchema,
  machineClasses,
  origins,
  partSchema,
  senses,
  stockSchema,
  symbolPattern,
  toolSchema,
  checkSchema,
  consumableSchema,
  creditSchema,
  type Check,
  type Consumable,
  type Credit,
  type Dimension,
  type Hardware,
  type Part,
  type PlanDocument,
  type PlanLink,
  type Stock,
  type Tool,
} from '../../shared/plan/document';
import { type PlanModel, verdictWord } from '../../shared/plan/model';
import { limits } from '../../shared/api/limits';
import { nextLetter } from '../../shared/plan/facts';
import { type ListField, type ListFields } from './list-editor';

const options = (values: readonly string[]) =>
  values.map((value) => ({ value, label: value.replace(/-/g, ' ') }));

const long: Record<string, number> = {
  where: limits.note,
  why: limits.note,
  how: limits.note,
  note: limits.note,
  instead: limits.note,
  text: limits.note,
  expression: limits.expression,
  url: limits.url,
  symbol: limits.symbol,
  mark: 4,
};
/** The most characters a field of an element holds. */
const mostOf = (key: string): number => long[key] ?? limits.name;

/** A text field of an element. */
function text<T, K extends keyof T & string>(
  key: K,
  label: string,
  more: Partial<ListField<T>> = {},
): ListField<T> {
  return {
    key,
    label,
    get: (item) => String(item[key] ?? ''),
    set: (item, value) => ({ ...item, [key]: value.slice(0, mostOf(key)) }),
    ...more,
  };
}
const choice = <T, K extends keyof T & string>(key: K, label: string, values: readonly string[]) =>
  text<T, K>(key, label, { options: options(values) });
/** A whole number of at least one; typed to its end before it counts. */
const whole = <T, K extends keyof T & string>(key: K, label: string, most = 9999) =>
  text<T, K>(key, label, {
    lazy: true,
    set: (item, value) => ({ ...item, [key]: Number(value) }),
    fault: (value) =>
      /^[1-9]\d{0,3}$/.test(value.trim()) && Number(value) <= most
        ? undefined
        : `A whole number from 1 to ${most}.`,
  });
const address = /^https?:\/\/[^\s/]+\.[^\s]+$/;

/** A figure alone takes the plan's unit; anything else is an expression. */
const expressionFault = (document: PlanDocument) => (value: string) => {
  if (value.trim() === '') return 'Give a figure or an expression.';
  const figure = parseLength(value, { unit: document.units });
  if (figure.ok) return undefined;
  if (/^[\d\s./'"-]+(?:mm|in|ft|cm|m)?$/.test(value))
    return `Column ${figure.at + 1}: ${figure.message} ${figure.cure ?? ''}`.trim();
  const parsed = parseExpression(value);
  return parsed.ok
    ? undefined
    : `Column ${parsed.fault.at + 1}: ${parsed.fault.message} ${parsed.fault.cure ?? ''}`.trim();
};
const optionalFault = (document: PlanDocument) => (value: string) =>
  value.trim() === '' ? undefined : expressionFault(document)(value);

/** A dimension's fields beside its figure and its tolerance, which have their own. */
export const dimensionFields = (document: PlanDocument): readonly ListField<Dimension>[] => [
  text('name', 'Name'),
  text('symbol', 'Symbol', {
    mono: true,
    lazy: true,
    fault: (v, d) => {
      if (!symbolPattern.test(v)) return 'A letter first, then letters, digits and _.';
      if (reservedWords.has(v)) return `${v} is a word of the expressions. Choose another.`;
      const other = document.dimensions.find((x) => x.symbol === v && x.id !== d.id);
      return other ? `${other.name} has this symbol already.` : undefined;
    },
  }),
  choice('origin', 'Origin', origins),
  choice('kind', 'Kind', kinds),
  choice('sense', 'Sense', senses),
  choice('instrument', 'Measured with', instruments),
  whole('places', 'Readings asked for', 12),
  choice('counts', 'Of several readings counts', ['mean', 'min', 'max']),
  text('setting', 'Cut at one stop setting with others of this name', {
    set: (d, v) => ({ ...d, setting: v === '' ? undefined : v.slice(0, limits.name) }),
  }),
  text('where', 'Where and how to measure'),
];

const stockChoices = (document: PlanDocument) => [
  { value: 'none', label: 'not said' },
  ...document.stock.map((s) => ({ value: s.id, label: s.name })),
];

export const partFields = (document: PlanDocument): ListFields<Part> => ({
  make: (id) =>
    partSchema.parse({
      id,
      mark: nextLetter(document.parts[document.parts.length - 1]?.mark ?? null),
      name: '',
      length: '',
      width: '',
    }),
  name: (p) => `${p.mark} ${p.name}`,
  fields: [
    text('mark', 'Mark'),
    text('name', 'Name'),
    whole('quantity', 'How many'),
    text('length', 'Length', { mono: true, fault: expressionFault(document) }),
    text('width', 'Width', { mono: true, fault: expressionFault(document) }),
    text('thickness', 'Thickness, if not the stock’s', {
      mono: true,
      fault: optionalFault(document),
    }),
    {
      key: 'stock',
      label: 'Cut from',
      options: stockChoices(document),
      get: (p) => p.stockId ?? 'none',
      set: (p, v) => ({ ...p, stockId: v === 'none' ? undefined : v }),
    },
    choice('grain', 'Grain', grains),
    choice('role', 'Role', ['part', 'spare', 'test-piece', 'helper']),
  ],
});

export const stockFields = (document: PlanDocument): ListFields<Stock> => ({
  make: (id) => stockSchema.parse({ id, name: '', form: 'sheet', thickness: '' }),
  name: (s) => s.name,
  fields: [
    text('name', 'Name'),
    choice('form', 'Form', ['sheet', 'board', 'strip', 'rod']),
    text('material', 'Material'),
    text('thickness', 'Actual thickness', { mono: true, fault: expressionFault(document) }),
    {
      key: 'length',
      label: 'Length on sale',
      mono: true,
      fault: optionalFault(document),
      get: (s) => s.sizes[0]?.length ?? '',
      set: (s, length) => ({
        ...s,
        sizes: [
          {
            id: s.sizes[0]?.id ?? uuid(),
            width: s.sizes[0]?.width ?? '',
            price: s.sizes[0]?.price,
            length,
          },
          ...s.sizes.slice(1),
        ],
      }),
    },
    {
      key: 'width',
      label: 'Width on sale',
      mono: true,
      fault: optionalFault(document),
      get: (s) => s.sizes[0]?.width ?? '',
      set: (s, width) => ({
        ...s,
        sizes: [
          {
            id: s.sizes[0]?.id ?? uuid(),
            length: s.sizes[0]?.length ?? '',
            price: s.sizes[0]?.price,
            width,
          },
          ...s.sizes.slice(1),
        ],
      }),
    },
    whole('quantity', 'How many'),
  ],
});

export const hardwareFields: ListFields<Hardware> = {
  make: (id) => hardwareSchema.parse({ id, kind: 'screw', name: '' }),
  name: (h) => h.name,
  fields: [
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
    text('note', 'Note'),
  ],
};

export const toolFields: ListFields<Tool> = {
  make: (id) => toolSchema.parse({ id, machine: 'hand-tool', name: '' }),
  name: (t) => t.name,
  fields: [
    text('name', 'Name'),
    choice('machine', 'Machine or hand tool', machineClasses),
    {
      key: 'needed',
      label: 'Needed',
      flag: true,
      get: (t) => (t.needed ? 'yes' : 'no'),
      set: (t, v) => ({ ...t, needed: v === 'yes' }),
    },
    text('instead', 'Instead you can'),
  ],
};

export const linkFields: ListFields<PlanLink> = {
  make: (id) => linkSchema.parse({ id, title: '', url: 'https://example.org/' }),
  name: (l) => l.title,
  fields: [
    text('title', 'Title'),
    text('url', 'Address', {
      lazy: true,
      fault: (v) => (address.test(v) ? undefined : 'An address begins with https://'),
    }),
    {
      key: 'onSale',
      label: 'Leads to something on sale',
      flag: true,
      get: (l) => (l.onSale ? 'yes' : 'no'),
      set: (l, v) => ({ ...l, onSale: v === 'yes' }),
    },
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
  ],
};

export const checkFields = (model: PlanModel): ListFields<Check> => ({
  make: (id) => checkSchema.parse({ id, name: '', expression: '' }),
  name: (c) => {
    const state = model.checks.get(c.id);
    return state ? `${c.name}: ${verdictWord(state)}` : c.name;
  },
  fields: [
    text('name', 'What must be true, in a few words'),
    text('expression', 'As a statement', {
      mono: true,
      help: 'left < right · left = right within 1 mm · between(x, low, high) · fit(inner, outer, from, to)',
      fault: (value, check) => {
        if (value.trim() === '') return 'Say it as a statement.';
        const parsed = parseCheck(value);
        if (!parsed.ok)
          return `Column ${parsed.fault.at + 1}: ${parsed.fault.message} ${parsed.fault.cure ?? ''}`.trim();
        const error = model.checks.get(check.id)?.error;
        return error
          ? `Column ${error.at + 1}: ${error.message} ${error.cure ?? ''}`.trim()
          : undefined;
      },
    }),
    text('why', 'Why'),
    choice('level', 'Weight', ['must', 'should']),
    choice('asked', 'Asked', ['design', 'bench', 'both']),
    text('how', 'For a trial or a look: what to do'),
  ],
});

export const consumableFields: ListFields<Consumable> = {
  make: (id) => consumableSchema.parse({ id, kind: 'glue', name: '' }),
  name: (c) => c.name,
  fields: [
    text('name', 'Name'),
    choice('kind', 'Kind', ['glue', 'finish', 'abrasive', 'other']),
    text('amount', 'How much'),
    text('note', 'As its label says'),
  ],
};

export const creditFields: ListFields<Credit> = {
  make: (id) => creditSchema.parse({ id, text: '' }),
  name: (c) => c.text,
  fields: [
    text('text', 'Whose method or design it builds on'),
    text('url', 'Address', {
      lazy: true,
      fault: (v) => (v === '' || address.test(v) ? undefined : 'An address begins with https://'),
    }),
  ],
};

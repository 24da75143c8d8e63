import { v5 } from 'uuid';
import {
  planDocumentSchema,
  type PlanDocument,
  type PlanDocumentInput,
} from '../../shared/plan/document';

type Input = PlanDocumentInput;
type Dimension = NonNullable<Input['dimensions']>[number];
type Part = NonNullable<Input['parts']>[number];
type StepInput = NonNullable<Input['steps']>[number];

/** symbol, name, origin, expression, tolerance (or ''), and the rest. */
export type DimensionRow = [
  symbol: string,
  name: string,
  origin: 'given' | 'taken' | 'derived',
  expression: string,
  by: string,
  more?: Partial<Dimension>,
];

export interface StepRow extends Omit<
  Partial<StepInput>,
  'parts' | 'takes' | 'holds' | 'cautions' | 'waits' | 'actions' | 'toolIds' | 'heard' | 'checks'
> {
  title: string;
  /** Seconds of the clip. */
  seconds: number;
  minutes: number;
  text: string;
  /** `A:sized` and the like. */
  parts?: string[];
  takes?: string[];
  holds?: string[];
  checks?: string[];
  cautions?: string[];
  waits?: Omit<NonNullable<StepInput['waits']>[number], 'id'>[];
  actions?: Record<string, unknown>[];
  tools?: string[];
  /** What the clip says: words, exact millimetres and the dimension it speaks of. */
  heard?: { words: string; mm: string; text: string; dimension: string }[];
  /** What is said in the stretch, for the captions. */
  says: string;
}

export interface PlanRows extends Omit<
  Input,
  | 'scantling'
  | 'id'
  | 'dimensions'
  | 'parts'
  | 'steps'
  | 'stock'
  | 'hardware'
  | 'tools'
  | 'checks'
  | 'consumables'
  | 'links'
  | 'credits'
  | 'clip'
> {
  key: string;
  dimensions: DimensionRow[];
  checks?: [
    name: string,
    expression: string,
    why: string,
    level?: 'must' | 'should',
    more?: Partial<Omit<NonNullable<Input['checks']>[number], 'id'>>,
  ][];
  stock: (Omit<NonNullable<Input['stock']>[number], 'id' | 'sizes'> & {
    key: string;
    sizes: { length: string; width?: string; price?: number }[];
  })[];
  parts: (Omit<Part, 'id' | 'stockId' | 'features'> & {
    stock: string;
    features?: Omit<NonNullable<Part['features']>[number], 'id'>[];
  })[];
  hardware?: (Omit<NonNullable<Input['hardware']>[number], 'id'> & { key: string })[];
  consumables?: (Omit<NonNullable<Input['consumables']>[number], 'id'> & { key: string })[];
  tools: (Omit<NonNullable<Input['tools']>[number], 'id'> & { key: string })[];
  links?: Omit<NonNullable<Input['links']>[number], 'id'>[];
  credits?: Omit<NonNullable<Input['credits']>[number], 'id'>[];
  steps: StepRow[];
}

export interface BuiltPlan {
  document: PlanDocument;
  captions: { start: number; end: number; text: string }[];
  duration: number;
}

const namespace = '6f1c1f3e-3a52-4d0e-9a52-5c7b3a0a4b11';

/** Splits what is said into captions of about ten words over the stretch. */
function captionsOf(says: string, start: number, seconds: number) {
  const words = says.split(/\s+/);
  const chunks: string[] = [];
  for (let i = 0; i < words.length; i += 10) chunks.push(words.slice(i, i + 10).join(' '));
  const each = (seconds - 1) / chunks.length;
  return chunks.map((text, i) => ({
    start: start + i * each,
    end: start + (i + 1) * each - 0.05,
    text,
  }));
}

type Id = (kind: string, name: string | number) => string;

/** The ids an action's short names stand for. */
function linksOf(action: Record<string, unknown>, id: Id): Record<string, unknown> {
  const links: Record<string, unknown> = {};
  if ('parts' in action) links.partIds = (action.parts as string[]).map((p) => id('part', p));
  if ('screw' in action) links.hardwareId = id('hardware', action.screw as string);
  if ('glueOf' in action) links.consumableId = id('consumable', action.glueOf as string);
  if ('through' in action) links.throughPartId = id('part', action.through as string);
  if ('into' in action) links.intoPartId = id('part', action.into as string);
  return links;
}

const resolveText = (text: string, id: Id) =>
  text.replace(
    /\{\{(dim|part):([^}]+)\}\}/g,
    (_, kind: string, name: string) => `{{${kind}:${id(kind, name)}}}`,
  );

function buildStep(row: StepRow, s: number, start: number, id: Id): StepInput {
  const {
    seconds,
    minutes,
    says: _says,
    parts,
    takes,
    holds,
    checks,
    cautions,
    waits,
    actions,
    tools,
    heard,
    ...rest
  } = row;
  const at = (kind: string, i: number) => id(kind, `${s}/${i}`);
  return {
    ...rest,
    id: id('step', s),
    text: resolveText(row.text, id),
    stretches: [{ start, end: start + seconds }],
    handsOn: minutes,
    parts: (parts ?? []).map((p) => ({
      partId: id('part', p.split(':')[0]!),
      to: p.split(':')[1] as 'sized',
    })),
    takes: (takes ?? []).map((d) => id('dim', d)),
    holds: (holds ?? []).map((d) => id('dim', d)),
    checks: (checks ?? []).map((c) => id('check', c)),
    cautions: (cautions ?? []).map((text, i) => ({ id: at('caution', i), text })),
    waits: (waits ?? []).map((wait, i) => ({ ...wait, id: at('wait', i) })),
    actions: (actions ?? []).map((action, i) => ({
      ...action,
      id: at('action', i),
      ...linksOf(action, id),
    })) as StepInput['actions'],
    toolIds: (tools ?? []).map((t) => id('tool', t)),
    heard: (heard ?? []).map((h, i) => ({
      id: at('heard', i),
      at: start + 2,
      words: h.words,
      value: { text: h.text, mm: h.mm },
      dimensionId: id('dim', h.dimension),
    })),
  };
}

function buildLists(rows: PlanRows, id: Id) {
  const keyed = <T extends { key: string }>(kind: string, list: T[] | undefined) =>
    (list ?? []).map(({ key, ...item }) => ({ ...item, id: id(kind, key) }));
  return {
    dimensions: rows.dimensions.map(([symbol, name, origin, expression, by, more]) => ({
      id: id('dim', symbol),
      symbol,
      name,
      origin,
      expression,
      tolerance: by === '' ? { form: 'none' as const } : { form: 'plus-minus' as const, by },
      ...more,
    })),
    checks: (rows.checks ?? []).map(([name, expression, why, level, more]) => ({
      id: id('check', name),
      name,
      expression,
      why,
      level: level ?? ('must' as const),
      ...more,
    })),
    stock: keyed('stock', rows.stock).map((item) => ({
      ...item,
      sizes: item.sizes.map((size, i) => ({ ...size, id: id('size', `${item.id}/${i}`) })),
    })),
    parts: rows.parts.map(({ stock, features, ...part }) => ({
      ...part,
      id: id('part', part.mark),
      stockId: id('stock', stock),
      features: (features ?? []).map((f, i) => ({ ...f, id: id('feature', `${part.mark}/${i}`) })),
    })),
    hardware: keyed('hardware', rows.hardware),
    consumables: keyed('consumable', rows.consumables),
    tools: keyed('tool', rows.tools),
    links: (rows.links ?? []).map((link, i) => ({ ...link, id: id('link', i) })),
    credits: (rows.credits ?? []).map((credit, i) => ({ ...credit, id: id('credit', i) })),
  };
}

/** Turns rows as a person writes them into a plan document with stable ids. */
export function buildPlan(rows: PlanRows): BuiltPlan {
  const id: Id = (kind, name) => v5(`${rows.key}/${kind}/${name}`, namespace);
  let clock = 0;
  const captions: BuiltPlan['captions'] = [];
  const steps = rows.steps.map((row, s) => {
    const step = buildStep(row, s, clock, id);
    captions.push(...captionsOf(row.says, clock, row.seconds));
    clock += row.seconds;
    return step;
  });
  const document = planDocumentSchema.parse({
    ...rows,
    ...buildLists(rows, id),
    scantling: 1,
    id: v5(rows.key, namespace),
    steps,
  });
  return { document, captions, duration: clock };
}

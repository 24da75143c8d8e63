import { type Kind, type PlanDocument } from '../document';
import { type Subject } from './types';

/** An element laid out flat: its own fields, without the elements that are compared by themselves. */
export interface Element {
  key: string;
  subject: Subject;
  id: string;
  stepId: string | null;
  name: string;
  fields: Readonly<Record<string, unknown>>;
  /** Kind of its expressions. */
  kind: Kind;
}

const words = (text: string) => (text.length > 60 ? `${text.slice(0, 57)}…` : text);

function element(
  subject: Subject,
  given: { id: string },
  name: string,
  without: readonly string[] = [],
  stepId: string | null = null,
  kind: Kind = 'length',
): Element {
  const fields = Object.fromEntries(
    Object.entries(given).filter(([key]) => key !== 'id' && !without.includes(key)),
  );
  if (stepId !== null) fields.step = stepId;
  return { key: `${subject}/${given.id}`, subject, id: given.id, stepId, name, fields, kind };
}

/** A plan's own fields: everything that is no list of elements. */
const lists = [
  'scantling',
  'dimensions',
  'checks',
  'stock',
  'parts',
  'hardware',
  'consumables',
  'tools',
  'links',
  'credits',
  'photos',
  'steps',
  'flow',
];

function stepElements(step: PlanDocument['steps'][number], at: number): Element[] {
  const actionName = (action: (typeof step.actions)[number]) =>
    action.do === 'cut' ? `${action.kind} (${action.machine})` : action.do;
  return [
    element('step', step, `step ${at + 1}: ${step.title}`, ['cautions', 'waits', 'actions']),
    ...step.cautions.map((c) => element('caution', c, words(c.text), [], step.id)),
    ...step.waits.map((w) => element('wait', w, w.what || w.kind, [], step.id)),
    ...step.actions.map((a) => element('action', a, actionName(a), [], step.id)),
  ];
}

/** Every element of a plan once, by key; of two with one id the first counts. */
export function elementsOf(document: PlanDocument): Map<string, Element> {
  const all = [
    element('plan', document, document.title, lists),
    ...document.dimensions.map((d) =>
      element('dimension', d, d.name || d.symbol, [], null, d.kind),
    ),
    ...document.parts.map((p) => element('part', p, `${p.mark} ${p.name}`.trim())),
    ...document.stock.map((s) => element('stock', s, s.name)),
    ...document.hardware.map((h) => element('hardware', h, h.name)),
    ...document.consumables.map((c) => element('consumable', c, c.name)),
    ...document.tools.map((t) => element('tool', t, t.name)),
    ...document.checks.map((c) => element('check', c, c.name)),
    ...document.steps.flatMap(stepElements),
    ...document.flow.map((f) => element('flow', f, f.kind === 'repeat' ? 'repeat' : f.name)),
    ...document.links.map((l) => element('link', l, l.title)),
    ...document.credits.map((c) => element('credit', c, words(c.text))),
    ...document.photos.map((p) => element('photo', p, words(p.alt))),
  ];
  const byKey = new Map<string, Element>();
  for (const one of all) if (!byKey.has(one.key)) byKey.set(one.key, one);
  return byKey;
}

const quietFields: ReadonlySet<string> = new Set([
  'name',
  'symbol',
  'mark',
  'price',
  'photoId',
  'photoIds',
  'at',
  'stretches',
  'heard',
  'packOf',
]);
const quietSubjects: ReadonlySet<Subject> = new Set(['plan', 'link', 'credit', 'photo']);

/** Nobody at a bench has to do anything about this field of this element. */
export const isQuiet = (subject: Subject, field: string): boolean =>
  quietSubjects.has(subject) || quietFields.has(field);

const safetyCutFields = new Set([
  'heldBy',
  'exitCover',
  'exitStop',
  'guardInstead',
  'lengthStop',
  'trapped',
  'waitsForBlade',
  'feedAgainstRotation',
  'depthPerPass',
  'rpm',
  'offcutHeld',
  'dadoHead',
]);

/** Whether a change of an element bears on fingers; `fields` is empty for one that came or went. */
export function bearsOnSafety(one: Element, fields: readonly string[]): boolean {
  if (one.subject === 'caution')
    return fields.length === 0 || fields.includes('text') || fields.includes('level');
  if (one.subject === 'step') return fields.includes('withoutLines');
  if (one.subject !== 'action') return false;
  const act = one.fields.do;
  if (act === 'guard' || act === 'power') return true;
  return act === 'cut' && (fields.length === 0 || fields.some((f) => safetyCutFields.has(f)));
}

import { type PlanDocument } from '../document';
import { createModel, type ModelReadings, type PlanModel } from '../model';
import { bearsOnSafety, elementsOf, isQuiet, type Element } from './elements';
import { dimensionFigures, movedFigures, partFigures } from './figures';
import { meaningOf, type Meaning } from './meaning';
import { movedIds } from './order';
import { type Change, type Comparison, type FieldChange, type FigureChange } from './types';

export * from './types';
export { sameFigure } from './figures';

const shown = (value: unknown): string => {
  if (typeof value === 'string') return value;
  return value === undefined || value === null ? '' : JSON.stringify(value);
};

interface Side {
  document: PlanDocument;
  elements: Map<string, Element>;
  meaning: Meaning;
  model: PlanModel;
}

const sideOf = (document: PlanDocument, readings: ModelReadings | null): Side => ({
  document,
  elements: elementsOf(document),
  meaning: meaningOf(document),
  model: createModel(document, readings),
});

function textOf(side: Side, one: Element, field: string): string {
  const value = one.fields[field];
  return one.subject === 'check' && field === 'expression'
    ? side.meaning.check(shown(value))
    : side.meaning.value(value, field, one.kind);
}

/** A builder's own reading stands where the creator's did: the stand-in means nothing to them. */
function standsAside(one: Element, field: string, model: PlanModel): boolean {
  if (one.subject !== 'dimension' || (field !== 'expression' && field !== 'tolerance'))
    return false;
  return one.fields.origin === 'taken' && model.dimensions.get(one.id)?.readings !== null;
}

function fieldChanges(a: Side, b: Side, before: Element, after: Element): FieldChange[] {
  const names = [...new Set([...Object.keys(after.fields), ...Object.keys(before.fields)])];
  return names
    .filter((field) => textOf(a, before, field) !== textOf(b, after, field))
    .filter((field) => !(standsAside(before, field, a.model) && standsAside(after, field, b.model)))
    .map((field) => ({
      field,
      before: shown(before.fields[field]),
      after: shown(after.fields[field]),
      quiet: isQuiet(after.subject, field),
    }));
}

function figureChanges(a: Side, b: Side, one: Element): FigureChange[] {
  if (one.subject === 'dimension')
    return movedFigures(dimensionFigures(a.model, one.id), dimensionFigures(b.model, one.id));
  if (one.subject !== 'part') return [];
  const partOf = ({ document }: Side) => document.parts.find((p) => p.id === one.id);
  return movedFigures(partFigures(a.model, partOf(a)), partFigures(b.model, partOf(b)));
}

function verdictChange(a: Side, b: Side, id: string): Change['verdict'] {
  const before = a.model.checks.get(id)?.verdict;
  const after = b.model.checks.get(id)?.verdict;
  return before && after && before !== after ? { before, after } : null;
}

function changeOf(a: Side, b: Side, key: string, moved: ReadonlySet<string>): Change | null {
  const before = a.elements.get(key);
  const after = b.elements.get(key);
  const one = after ?? before;
  if (!one) return null;
  const fields = before && after ? fieldChanges(a, b, before, after) : [];
  if (one.subject === 'step' && moved.has(one.id)) {
    const place = (side: Side) => String(side.document.steps.findIndex((s) => s.id === one.id) + 1);
    fields.push({ field: 'place', before: place(a), after: place(b), quiet: false });
  }
  const figures = figureChanges(a, b, one);
  const verdict = one.subject === 'check' && before && after ? verdictChange(a, b, one.id) : null;
  const own = !before || !after || fields.length > 0;
  if (!own && figures.length === 0 && !verdict) return null;
  return {
    key,
    subject: one.subject,
    elementId: one.id,
    stepId: one.stepId,
    name: one.name,
    how: !before ? 'added' : !after ? 'removed' : own ? 'changed' : 'follows',
    fields,
    figures,
    verdict,
    because: [],
    safety:
      own &&
      bearsOnSafety(
        one,
        fields.map((f) => f.field),
      ),
  };
}

/** What each own change of a dimension or of stock moves, as keys. */
function reachOf(change: Change, a: Side, b: Side): Set<string> {
  const reached = new Set<string>();
  if (change.subject === 'stock' || change.subject === 'part') {
    for (const { document } of [a, b])
      for (const part of document.parts)
        if (part.stockId === change.elementId) reached.add(`part/${part.id}`);
    return reached;
  }
  if (change.subject !== 'dimension') return reached;
  const open = [change.elementId];
  const seen = new Set(open);
  for (let id = open.pop(); id !== undefined; id = open.pop())
    for (const { model } of [a, b]) {
      const users = model.usedBy(id);
      for (const part of users.parts) reached.add(`part/${part}`);
      for (const check of users.checks) reached.add(`check/${check}`);
      for (const next of users.dimensions)
        if (!seen.has(next)) {
          seen.add(next);
          reached.add(`dimension/${next}`);
          open.push(next);
        }
    }
  return reached;
}

/** Says of what follows where it comes from; features may hang on any dimension, so they name all that changed. */
function withCauses(changes: Change[], a: Side, b: Side): Change[] {
  const causes = changes.filter((c) => c.how !== 'follows');
  const reach = causes.map((c) => ({ key: c.key, reached: reachOf(c, a, b) }));
  return changes.map((change) => {
    if (change.how !== 'follows') return change;
    const because = reach.filter((r) => r.reached.has(change.key)).map((r) => r.key);
    const any = causes.filter(
      (c) => c.subject === 'dimension' || c.subject === 'stock' || c.key.startsWith('plan/'),
    );
    return { ...change, because: because.length > 0 ? because : any.map((c) => c.key) };
  });
}

/**
 * Compares two revisions of a plan by meaning: elements by id; expressions by what they say, not by how they are
 * spelt; the order of steps by the fewest moves; computed figures, part sizes and verdicts that follow from a change
 * elsewhere. With a bench copy's readings the figures are that builder's, and a stand-in they have replaced is silent.
 */
export function compareRevisions(
  before: PlanDocument,
  after: PlanDocument,
  readings: ModelReadings | null = null,
): Comparison {
  const a = sideOf(before, readings);
  const b = sideOf(after, readings);
  const moved = movedIds(
    before.steps.map((s) => s.id),
    after.steps.map((s) => s.id),
  );
  const keys = [...new Set([...b.elements.keys(), ...a.elements.keys()])];
  const changes = keys.flatMap((key) => changeOf(a, b, key, moved) ?? []);
  return { changes: withCauses(changes, a, b), before: a.model, after: b.model };
}

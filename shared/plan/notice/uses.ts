import { type PlanDocument, type Step } from '../document';
import { type PlanModel } from '../model';
import { actionExpressions } from '../sheet/expressions';

/** Steps of a plan that use an element, and those after which it is cut. By key `dimension/ID`. */
export interface Uses {
  used: ReadonlyMap<string, ReadonlySet<string>>;
  cut: ReadonlyMap<string, ReadonlySet<string>>;
}

class Table {
  readonly rows = new Map<string, Set<string>>();
  add(key: string, stepId: string): void {
    const row = this.rows.get(key);
    if (row) row.add(stepId);
    else this.rows.set(key, new Set([stepId]));
  }
}

const reference = /\{\{(dim|part):([0-9a-f-]{36})\}\}/g;
const words = /[A-Za-z][A-Za-z0-9_]*/g;

function useWords(step: Step, model: PlanModel, used: Table): void {
  for (const [, kind, id] of step.text.matchAll(reference))
    used.add(`${kind === 'dim' ? 'dimension' : 'part'}/${id ?? ''}`, step.id);
  for (const text of actionExpressions(step))
    for (const [symbol] of text.matchAll(words)) {
      const id = model.symbols.get(symbol)?.id;
      if (id) used.add(`dimension/${id}`, step.id);
    }
}

function useThings(step: Step, used: Table): void {
  used.add(`step/${step.id}`, step.id);
  for (const id of step.checks) used.add(`check/${id}`, step.id);
  for (const id of step.toolIds) used.add(`tool/${id}`, step.id);
  for (const one of step.cautions) used.add(`caution/${one.id}`, step.id);
  for (const one of step.waits) used.add(`wait/${one.id}`, step.id);
  for (const one of step.actions) {
    used.add(`action/${one.id}`, step.id);
    if (one.do === 'cut' || one.do === 'glue')
      for (const id of one.partIds) used.add(`part/${id}`, step.id);
    if (one.do === 'fasten') {
      used.add(`hardware/${one.hardwareId}`, step.id);
      for (const id of [one.throughPartId, one.intoPartId]) if (id) used.add(`part/${id}`, step.id);
    }
    if ((one.do === 'glue' || one.do === 'finish') && one.consumableId)
      used.add(`consumable/${one.consumableId}`, step.id);
  }
}

/** A part's step uses what its sizes and features are worked out from; sized or shaped, that is cut. */
function useParts(model: PlanModel, used: Table, cut: Table): void {
  const { document } = model;
  const inputs = new Map<string, string[]>();
  for (const { id } of document.dimensions)
    for (const part of model.usedBy(id).parts)
      inputs.set(part, [...(inputs.get(part) ?? []), `dimension/${id}`]);
  for (const step of document.steps)
    for (const { partId, to } of step.parts) {
      const stockId = document.parts.find((p) => p.id === partId)?.stockId;
      const keys = [`part/${partId}`, ...(inputs.get(partId) ?? [])];
      if (stockId) used.add(`stock/${stockId}`, step.id);
      for (const key of keys) used.add(key, step.id);
      if (to === 'sized' || to === 'shaped') {
        for (const key of keys) cut.add(key, step.id);
        if (stockId) cut.add(`stock/${stockId}`, step.id);
      }
    }
}

function useFlow(document: PlanDocument, used: Table): void {
  const index = new Map(document.steps.map((s, i) => [s.id, i]));
  for (const one of document.flow) {
    const steps =
      one.kind === 'repeat'
        ? document.steps.slice(index.get(one.fromStepId) ?? 0, (index.get(one.toStepId) ?? -1) + 1)
        : one.groups.flatMap((g) => g.stepIds.map((id) => ({ id })));
    for (const { id } of steps) used.add(`flow/${one.id}`, id);
  }
}

/** Where a plan's elements are used, and where they are cut. Taken dimensions are never cut: they are found. */
export function usesOf(model: PlanModel): Uses {
  const used = new Table();
  const cut = new Table();
  for (const step of model.document.steps) {
    useWords(step, model, used);
    useThings(step, used);
    for (const id of step.takes) used.add(`dimension/${id}`, step.id);
    for (const id of step.holds) {
      used.add(`dimension/${id}`, step.id);
      cut.add(`dimension/${id}`, step.id);
    }
  }
  useParts(model, used, cut);
  useFlow(model.document, used);
  for (const { id, origin } of model.document.dimensions)
    if (origin === 'taken') cut.rows.delete(`dimension/${id}`);
  return { used: used.rows, cut: cut.rows };
}

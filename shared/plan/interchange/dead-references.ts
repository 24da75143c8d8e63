import { type Action, type Flow, type PlanDocument, type Step } from '../document';
import { pathText } from './path-text';

/** A reference by id that leads nowhere, with the element it stands in. */
export interface DeadReference {
  path: string;
  /** What should be there. */
  what:
    | 'dimension'
    | 'part'
    | 'check'
    | 'stock'
    | 'step'
    | 'hardware'
    | 'consumable'
    | 'tool'
    | 'photo';
  list: 'dimensions' | 'parts' | 'photos' | 'steps' | 'flow';
  index: number;
}

type What = DeadReference['what'];
type Need = (what: What, id: string | undefined, ...path: PropertyKey[]) => void;

const ids = (list: readonly { id: string }[]): ReadonlySet<string> =>
  new Set(list.map((e) => e.id));

function actionReferences(action: Action, need: Need): void {
  if (action.do === 'cut' || action.do === 'glue')
    action.partIds.forEach((id, n) => need('part', id, 'partIds', n));
  if (action.do === 'glue' || action.do === 'finish')
    need('consumable', action.consumableId, 'consumableId');
  if (action.do !== 'fasten') return;
  need('hardware', action.hardwareId, 'hardwareId');
  need('part', action.throughPartId, 'throughPartId');
  need('part', action.intoPartId, 'intoPartId');
}

function stepReferences(step: Step, need: Need): void {
  step.takes.forEach((id, n) => need('dimension', id, 'takes', n));
  step.holds.forEach((id, n) => need('dimension', id, 'holds', n));
  step.checks.forEach((id, n) => need('check', id, 'checks', n));
  step.parts.forEach(({ partId }, n) => need('part', partId, 'parts', n, 'partId'));
  step.photoIds.forEach((id, n) => need('photo', id, 'photoIds', n));
  step.toolIds.forEach((id, n) => need('tool', id, 'toolIds', n));
  step.after.forEach((id, n) => need('step', id, 'after', n));
  step.heard.forEach((h, n) => need('dimension', h.dimensionId, 'heard', n, 'dimensionId'));
  step.actions.forEach((action, n) =>
    actionReferences(action, (what, id, ...path) => need(what, id, 'actions', n, ...path)),
  );
  for (const [, kind, id] of step.text.matchAll(/\{\{(dim|part):([0-9a-f-]{36})\}\}/g))
    need(kind === 'dim' ? 'dimension' : 'part', id, 'text');
}

function flowReferences(flow: Flow, need: Need): void {
  if (flow.kind === 'repeat') {
    need('step', flow.fromStepId, 'fromStepId');
    need('step', flow.toStepId, 'toStepId');
    need('check', flow.untilCheckId, 'untilCheckId');
  } else
    flow.groups.forEach((group, g) =>
      group.stepIds.forEach((id, n) => need('step', id, 'groups', g, 'stepIds', n)),
    );
}

/** Every reference of a plan that leads nowhere. */
export function deadReferences(document: PlanDocument): DeadReference[] {
  const known: Record<What, ReadonlySet<string>> = {
    dimension: ids(document.dimensions),
    part: ids(document.parts),
    check: ids(document.checks),
    stock: ids(document.stock),
    step: ids(document.steps),
    hardware: ids(document.hardware),
    consumable: ids(document.consumables),
    tool: ids(document.tools),
    photo: ids(document.photos),
  };
  const dead: DeadReference[] = [];
  const needIn =
    (list: DeadReference['list'], index: number): Need =>
    (what, id, ...path) => {
      if (id !== undefined && !known[what].has(id))
        dead.push({ path: pathText([list, index, ...path]), what, list, index });
    };
  document.dimensions.forEach((d, i) => needIn('dimensions', i)('photo', d.photoId, 'photoId'));
  document.parts.forEach((p, i) => needIn('parts', i)('stock', p.stockId, 'stockId'));
  document.photos.forEach((photo, i) =>
    photo.marks.forEach((mark, n) =>
      needIn('photos', i)('dimension', mark.dimensionId, 'marks', n, 'dimensionId'),
    ),
  );
  document.steps.forEach((step, i) => stepReferences(step, needIn('steps', i)));
  document.flow.forEach((flow, i) => flowReferences(flow, needIn('flow', i)));
  return dead;
}

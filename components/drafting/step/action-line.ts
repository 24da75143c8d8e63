import { type Action, type PlanDocument } from '../../../shared/plan/document';
import { said } from '../fields/makers';

const marks = (document: PlanDocument, ids: readonly string[]) =>
  ids.flatMap((id) => document.parts.find((p) => p.id === id)?.mark ?? []).join(', ');

const ofParts = (document: PlanDocument, ids: readonly string[]) =>
  ids.length > 0 ? ` of ${marks(document, ids)}` : '';

const to = { off: 'taken off', lowered: 'lowered', 'back-on': 'put back on' } as const;

/** What is done, in a line: `Table saw, through rip of A, B`. */
export function actionLine(action: Action, document: PlanDocument): string {
  const name = (list: readonly { id: string; name: string }[], id: string | undefined) =>
    list.find((x) => x.id === id)?.name ?? '';
  switch (action.do) {
    case 'cut':
      return `${said(action.machine)}, ${said(action.kind)}${ofParts(document, action.partIds)}`;
    case 'guard':
      return `${said(action.item)} of the ${said(action.machine)} ${to[action.to]}`;
    case 'power':
      return `${said(action.machine)} ${action.isolated ? 'unplugged' : 'plugged in'}, hands at the ${action.touches}`;
    case 'fasten':
      return `${action.quantity} × ${name(document.hardware, action.hardwareId) || 'a fastening'}`;
    case 'glue':
      return `glue${ofParts(document, action.partIds)}${action.acrossGrain ? ', across the grain' : ''}`;
    case 'finish':
      return `finish${action.consumableId ? ` with ${name(document.consumables, action.consumableId)}` : ''}`;
    case 'mount':
      return `hung${action.kg === undefined ? '' : ` with a load of ${action.kg} kg`}`;
  }
}

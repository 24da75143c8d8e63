import { type PlanDocument } from '../../../shared/plan/document';

export interface ListedId {
  id: string;
  path: (string | number)[];
}

const lists = [
  'credits',
  'dimensions',
  'checks',
  'stock',
  'parts',
  'hardware',
  'consumables',
  'tools',
  'links',
  'photos',
  'steps',
  'flow',
] as const;

/** The ids of all elements of a plan with where they stand. */
export function listedIds(document: PlanDocument): ListedId[] {
  const found: ListedId[] = [];
  for (const list of lists)
    document[list].forEach((item, i) => found.push({ id: item.id, path: [list, i, 'id'] }));
  document.steps.forEach((step, s) => {
    for (const list of ['cautions', 'waits', 'actions', 'heard'] as const) {
      step[list].forEach((item, i) =>
        found.push({ id: item.id, path: ['steps', s, list, i, 'id'] }),
      );
    }
  });
  return found;
}

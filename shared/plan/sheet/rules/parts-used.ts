import { type PlanDocument } from '../../document';
import { type Rule } from '../rule';

/** Ids of parts that some step puts to use: beyond cutting them, in its text, in a joint or a fastening. */
function putToUse(document: PlanDocument): ReadonlySet<string> {
  const used = new Set<string>();
  for (const step of document.steps) {
    const cutHere = new Set(step.parts.map((p) => p.partId));
    for (const { partId, to } of step.parts) if (to === 'shaped' || to === 'used') used.add(partId);
    // A part that is only cut in a step is named there, but not put to use.
    for (const [, id] of step.text.matchAll(/\{\{part:([0-9a-f-]+)\}\}/g))
      if (id && !cutHere.has(id)) used.add(id);
    for (const action of step.actions) {
      if (action.do === 'glue') for (const id of action.partIds) used.add(id);
      if (action.do !== 'fasten') continue;
      for (const id of [action.throughPartId, action.intoPartId]) if (id) used.add(id);
    }
  }
  return used;
}

export const partsUsed: Rule = {
  id: 'parts/used',
  level: 'should',
  source: 'plan model §5: what is made is used',
  run: ({ document }) => {
    const used = putToUse(document);
    return document.parts.flatMap((part) =>
      part.role !== 'part' || used.has(part.id)
        ? []
        : [
            {
              place: { in: 'parts' as const, elementId: part.id },
              message: `Part ${part.mark}, ${part.name}, is cut but no step puts it into the piece.`,
              cure: 'Name it in the step that fits it, or call it a helper, spare or test piece.',
            },
          ],
    );
  },
};

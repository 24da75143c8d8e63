import { type Part, type PlanDocument } from '../../document';
import { overPaths } from '../paths';
import { type Finding, type Rule } from '../rule';

const words: Readonly<Record<string, number>> = {
  one: 1,
  two: 2,
  both: 2,
  three: 3,
  four: 4,
  five: 5,
  six: 6,
  seven: 7,
  eight: 8,
  nine: 9,
  ten: 10,
  twelve: 12,
};
/** "Cut four {{part}}": a count right before a reference, in a sentence that cuts. */
const counted =
  /\b(?:cut|rip|crosscut|saw|make)\b[^.]*?\b(\d+|one|two|both|three|four|five|six|seven|eight|nine|ten|twelve)\s+(?:of\s+)?\{\{part:([0-9a-f-]+)\}\}/gi;
/** A part of them only: nothing can be said. */
const some = /\b(?:more|other|first|second|last|remaining|spare|at a time|left|right|each)\b/i;

function hardwareShort(document: PlanDocument): Finding[] {
  const used = overPaths(document, (step) =>
    step.actions.flatMap((a) => (a.do === 'fasten' ? [[a.hardwareId, a.quantity] as const] : [])),
  );
  return document.hardware.flatMap((item): Finding[] => {
    const most = used.get(item.id)?.most ?? 0;
    return most > item.quantity
      ? [
          {
            place: { in: 'hardware', elementId: item.id },
            message: `The steps use ${most} of ${item.name}; the list has ${item.quantity}.`,
            cure: `List ${most}, or correct the steps.`,
          },
        ]
      : [];
  });
}

function miscounted(document: PlanDocument): Finding[] {
  const parts = new Map<string, Part>(document.parts.map((p) => [p.id, p]));
  return document.steps.flatMap((step, i): Finding[] => {
    const sized = new Set(step.parts.filter((p) => p.to === 'sized').map((p) => p.partId));
    return [...step.text.matchAll(counted)].flatMap(([all, count, id]): Finding[] => {
      const part = parts.get(id ?? '');
      const n = words[(count ?? '').toLowerCase()] ?? Number(count);
      if (!part || !sized.has(part.id) || n === part.quantity || some.test(all)) return [];
      return [
        {
          place: { in: 'steps', elementId: step.id },
          message: `Step ${i + 1} cuts ${n} of part ${part.mark}, ${part.name}; the list has ${part.quantity}.`,
          cure: 'Make the step and the list agree.',
        },
      ];
    });
  });
}

export const partsQuantity: Rule = {
  id: 'parts/quantity',
  level: 'must',
  source: 'counting: parts, steps and hardware agree',
  run: ({ document }) => [...hardwareShort(document), ...miscounted(document)],
};

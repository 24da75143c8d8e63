import { overPaths } from '../paths';
import { type Finding, type Rule } from '../rule';

export const partsMade: Rule = {
  id: 'parts/made',
  level: 'must',
  source: 'plan model §7: a part is sized exactly once, whichever of the alternatives is taken',
  run: ({ document }) => {
    const sized = overPaths(document, (step) => {
      const here = new Set(step.parts.filter((p) => p.to === 'sized').map((p) => p.partId));
      return [...here].map((id) => [id, 1] as const);
    });
    return document.parts.flatMap((part): Finding[] => {
      const name = `Part ${part.mark}, ${part.name},`;
      const { least, most } = sized.get(part.id) ?? { least: 0, most: 0 };
      const found = (message: string, cure: string): Finding[] => [
        { place: { in: 'parts', elementId: part.id }, message, cure },
      ];
      if (most === 0)
        return found(
          `${name} is not cut to size in any step.`,
          'Mark the step in which it is sized.',
        );
      if (most > 1)
        return found(
          `${name} is cut to size in ${most} steps.`,
          'Leave it sized in one of them; call the others roughed or shaped.',
        );
      // A helper may belong to one of the ways only.
      return least === 0 && part.role === 'part'
        ? found(
            `${name} is cut to size in one of the alternatives and not in the other.`,
            'Mark the step in which it is sized in each of them.',
          )
        : [];
    });
  },
};

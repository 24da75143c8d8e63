import { type Rule } from '../rule';

export const partsUsed: Rule = {
  id: 'parts/used',
  level: 'should',
  source: 'plan model §5: what is made is used',
  run: ({ document }) =>
    document.parts.flatMap((part) => {
      if (part.role !== 'part') return [];
      const named = document.steps.some(
        (s) =>
          s.parts.some((p) => p.partId === part.id && p.to !== 'roughed' && p.to !== 'sized') ||
          // A part that is only cut in a step is named there, but not put to use.
          (s.text.includes(`{{part:${part.id}}}`) && !s.parts.some((p) => p.partId === part.id)) ||
          s.actions.some(
            (a) =>
              ('partIds' in a && a.do !== 'cut' && a.partIds.includes(part.id)) ||
              (a.do === 'fasten' && (a.throughPartId === part.id || a.intoPartId === part.id)),
          ),
      );
      return named
        ? []
        : [
            {
              place: { in: 'parts' as const, elementId: part.id },
              message: `Part ${part.mark}, ${part.name}, is cut but no step puts it into the piece.`,
              cure: 'Name it in the step that fits it, or call it a helper, spare or test piece.',
            },
          ];
    }),
};

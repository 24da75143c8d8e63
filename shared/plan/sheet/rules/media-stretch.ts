import { type Finding, type Rule } from '../rule';
import { stepName } from '../rule';

export const mediaStretch: Rule = {
  id: 'media/stretch',
  level: 'should',
  source: 'plan model §7: stretches lie inside the clip, in order',
  run: ({ document }) => {
    if (document.clip.source === 'none') return [];
    const { duration } = document.clip;
    return document.steps.flatMap((step): Finding[] => {
      const place = { in: 'steps' as const, elementId: step.id };
      const bad = step.stretches.find((s) => s.end <= s.start || s.end > duration + 0.5);
      if (!bad) return [];
      return [
        {
          place,
          message: `The stretch of ${stepName(document, step.id)} ${bad.end <= bad.start ? 'ends before it begins' : 'runs past the end of the clip'}.`,
          cure: 'Set its in and out marks again.',
        },
      ];
    });
  },
};

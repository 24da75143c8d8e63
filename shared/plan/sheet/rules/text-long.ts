import { type Rule } from '../rule';

const most = 90;

export const textLong: Rule = {
  id: 'text/long',
  level: 'should',
  source: 'common practice, no source: over 90 words is more than can be held at a bench',
  run: ({ document }) =>
    document.steps.flatMap((step, i) => {
      const words = step.text.split(/\s+/).filter((w) => /\w/.test(w)).length;
      return words <= most
        ? []
        : [
            {
              place: { in: 'steps' as const, elementId: step.id },
              message: `Step ${i + 1} runs to ${words} words.`,
              cure: 'Split it into two steps, or cut what the clip shows anyway.',
            },
          ];
    }),
};

import { type Rule } from '../rule';

export const mediaCaptions: Rule = {
  id: 'media/captions',
  level: 'should',
  source: 'WCAG 2.2, 1.2.2 Captions (prerecorded)',
  run: ({ document }) =>
    document.clip.source !== 'none' && document.clip.captions === undefined
      ? [
          {
            place: { in: 'clip' as const, elementId: null },
            message: 'The clip has no captions.',
            cure: 'Add the caption file; it also fills in the steps.',
          },
        ]
      : [],
};

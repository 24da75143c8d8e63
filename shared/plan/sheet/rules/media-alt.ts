import { type Rule } from '../rule';

export const mediaAlt: Rule = {
  id: 'media/alt',
  level: 'should',
  source: 'WCAG 2.2, 1.1.1 Non-text content',
  run: ({ document }) => [
    ...document.photos.flatMap((photo, i) =>
      photo.alt.trim() === ''
        ? [
            {
              place: { in: 'photos' as const, elementId: photo.id },
              message: `Photo ${i + 1} has no words for those who cannot see it.`,
              cure: 'Say in a sentence what it shows.',
            },
          ]
        : [],
    ),
    ...(document.cover !== undefined && document.coverAlt.trim() === ''
      ? [
          {
            place: { in: 'plan' as const, elementId: null },
            message: 'The cover picture has no words for those who cannot see it.',
            cure: 'Say in a sentence what it shows.',
          },
        ]
      : []),
  ],
};

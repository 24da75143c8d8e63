import { type Rule } from '../rule';

export const linksDisclosure: Rule = {
  id: 'links/disclosure',
  level: 'must',
  source: '16 CFR 255.5 (2023): a connection the audience does not expect is disclosed',
  run: ({ document }) =>
    document.links.flatMap((link) =>
      link.onSale && link.disclosure === undefined
        ? [
            {
              place: { in: 'links' as const, elementId: link.id },
              message: `The link “${link.title}” does not say what it earns you.`,
              cure: 'Say none, affiliate, sponsored or own product.',
            },
          ]
        : [],
    ),
};

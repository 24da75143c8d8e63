import { deadReferences } from '../../interchange';
import { type Finding, type Place, type Rule } from '../rule';

const listWords = {
  dimensions: 'A dimension',
  parts: 'A part',
  photos: 'A photo',
  flow: 'The order of the steps',
};

/** What was taken out of the plan is not referred to any more. */
export const planReferences: Rule = {
  id: 'plan/references',
  level: 'must',
  source: 'plan model §8: text and lists refer by id; an id leads to an element',
  run: ({ document }) => {
    const seen = new Set<string>();
    return deadReferences(document).flatMap(({ list, index, what }): Finding[] => {
      const key = `${list}/${index}/${what}`;
      if (seen.has(key)) return [];
      seen.add(key);
      const place: Place =
        list === 'flow'
          ? { in: 'plan', elementId: null }
          : { in: list, elementId: document[list][index]?.id ?? null };
      const who = list === 'steps' ? `Step ${index + 1}` : listWords[list];
      return [
        {
          place,
          message: `${who} refers to a ${what} that is not in the plan any more.`,
          cure: `Take the reference out, or name another ${what}.`,
        },
      ];
    });
  },
};

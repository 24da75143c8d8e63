import { type Rule } from '../rule';

export const planSteps: Rule = {
  id: 'plan/steps',
  level: 'must',
  source: 'a plan is its steps in order',
  run: ({ document }) => {
    const place = { in: 'plan' as const, elementId: null };
    const faults = [];
    if (document.title.trim() === '')
      faults.push({
        place,
        message: 'The plan has no title.',
        cure: 'Name the thing that is built.',
      });
    if (document.steps.length === 0) {
      faults.push({
        place,
        message: 'The plan has no steps.',
        cure: 'Import the captions of your clip, or write the first step.',
      });
    }
    if (document.parts.length === 0) {
      faults.push({
        place,
        message: 'The plan has no parts.',
        cure: 'List what is cut, with its size and stock.',
      });
    }
    return faults;
  },
};

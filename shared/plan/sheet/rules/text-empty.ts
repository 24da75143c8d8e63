import { type Rule } from '../rule';

export const textEmpty: Rule = {
  id: 'text/empty',
  level: 'must',
  source: 'common practice, no source: a step that says nothing cannot be followed',
  run: ({ document }) =>
    document.steps.flatMap((step, i) =>
      step.title.trim() !== '' &&
      (step.text.trim() !== '' ||
        step.actions.length > 0 ||
        step.takes.length + step.holds.length > 0)
        ? []
        : [
            {
              place: { in: 'steps' as const, elementId: step.id },
              message:
                step.title.trim() === ''
                  ? `Step ${i + 1} has no title.`
                  : `Step ${i + 1}, “${step.title}”, says nothing.`,
              cure: 'Write what to do, or take the step out.',
            },
          ],
    ),
};

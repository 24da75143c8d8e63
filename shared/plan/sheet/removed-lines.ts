import { atStep } from './actions';
import { type Finding, type Rule } from './rule';

/** Findings where a standing line was taken out of a step that cuts. */
export const removedLine =
  (id: string, what: string): Rule['run'] =>
  ({ document }) =>
    document.steps.flatMap((step, i): Finding[] => {
      if (!step.withoutLines.includes(id) || !step.actions.some((a) => a.do === 'cut')) return [];
      return [
        atStep(
          step,
          `The standing line on ${what} was taken out of step ${i + 1}.`,
          'Put it back: somebody may start with this step.',
        ),
      ];
    });

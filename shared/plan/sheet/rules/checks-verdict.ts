import { describeCheck } from '../../model';
import { type Finding, type Rule } from '../rule';

/** The plan's own must checks hold with the creator's figures. */
export const checksVerdict: Rule = {
  id: 'checks/fails',
  level: 'must',
  source: 'plan model §4: checks are statements the plan makes about itself',
  run: ({ document, model }) => {
    const worked = model();
    const preference = {
      system: document.units,
      instrument: 'calipers' as const,
      grid: 64 as const,
    };
    return document.checks.flatMap((check): Finding[] => {
      const state = worked.checks.get(check.id);
      if (!state || check.level !== 'must' || check.asked === 'bench') return [];
      const place = { in: 'checks' as const, elementId: check.id };
      if (state.error)
        return [
          {
            place,
            message: `Check “${check.name}”: ${state.error.message}`,
            cure: state.error.cure ?? 'Mend its expression.',
          },
        ];
      if (state.verdict !== 'fails') return [];
      return [
        {
          place,
          message: `Check “${check.name}” fails. ${describeCheck(worked, state, preference)}`,
          cure: check.why || 'Change a dimension so that it holds.',
        },
      ];
    });
  },
};

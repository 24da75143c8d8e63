import { type Check } from '../../document';
import { describeCheck } from '../../model';
import { type Finding, type Rule, type RuleContext } from '../rule';

function failing({ document, model }: RuleContext, level: Check['level']): Finding[] {
  const worked = model();
  const preference = {
    system: document.units,
    instrument: 'calipers' as const,
    grid: 64 as const,
  };
  return document.checks.flatMap((check): Finding[] => {
    const state = worked.checks.get(check.id);
    if (check.level !== level || check.asked === 'bench' || state?.verdict !== 'fails') return [];
    return [
      {
        place: { in: 'checks', elementId: check.id },
        message: `Check “${check.name}” fails. ${describeCheck(worked, state, preference)}`,
        cure: check.why || 'Change a dimension so that it holds.',
      },
    ];
  });
}

/** The plan's own must checks hold with the creator's figures. */
export const checksVerdict: Rule = {
  id: 'checks/fails',
  level: 'must',
  source: 'plan model §4: checks are statements the plan makes about itself',
  run: (context) => failing(context, 'must'),
};

/** The plan's own should checks hold with the creator's figures. */
export const checksShould: Rule = {
  id: 'checks/should',
  level: 'should',
  source: 'plan model §4: checks are statements the plan makes about itself',
  run: (context) => failing(context, 'should'),
};

import { type ModelFault } from '../../model';
import { type Finding, type Rule, type RuleContext } from '../rule';

/** Which of the three rules a fault of an expression belongs to. */
export function ruleOf(fault: ModelFault): 'dims/loop' | 'dims/kind' | 'dims/unknown' {
  if (fault.loop) return 'dims/loop';
  return /kind/.test(fault.code) ? 'dims/kind' : 'dims/unknown';
}

/** Faults that only follow from another dimension's are not told again. */
const follows = (fault: ModelFault): boolean =>
  fault.code === 'input' || /^Mend /.test(fault.cure ?? '');

function faults({ document, model }: RuleContext, rule: ReturnType<typeof ruleOf>): Finding[] {
  const worked = model();
  const of = (
    fault: ModelFault | null | undefined,
    place: Finding['place'],
    name: string,
  ): Finding[] =>
    fault && ruleOf(fault) === rule && !follows(fault)
      ? [
          {
            place,
            message: `${name}: ${fault.message}`,
            cure: fault.cure ?? 'Mend its expression.',
          },
        ]
      : [];
  return [
    ...document.dimensions.flatMap((d) =>
      of(worked.dimensions.get(d.id)?.error, { in: 'dimensions', elementId: d.id }, d.name),
    ),
    ...document.parts.flatMap((part) => {
      const state = worked.parts.get(part.id);
      const fault = state?.length.error ?? state?.width.error ?? state?.thickness.error;
      return of(fault, { in: 'parts', elementId: part.id }, `Part ${part.mark}, ${part.name}`);
    }),
  ];
}

const rule = (id: ReturnType<typeof ruleOf>, source: string): Rule => ({
  id,
  level: 'must',
  source,
  run: (context) => faults(context, id),
});

export const dimsUnknown = rule(
  'dims/unknown',
  'plan model §2: every symbol names a dimension, every expression can be read',
);
export const dimsLoop = rule('dims/loop', 'plan model §2: no dimension depends on itself');
export const dimsKind = rule('dims/kind', 'plan model §1: unlike kinds are not added');

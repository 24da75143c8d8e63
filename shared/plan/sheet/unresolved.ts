import { type ModelFault } from '../model';
import { otherExpressions } from './expressions';
import { type Finding, type RuleContext } from './rule';

export type ResolveRule = 'dims/loop' | 'dims/kind' | 'dims/unknown';

/** Which of the three rules a fault of an expression belongs to. */
export function ruleOf(fault: ModelFault): ResolveRule {
  if (fault.loop) return 'dims/loop';
  return /kind/.test(fault.code) ? 'dims/kind' : 'dims/unknown';
}

/** Faults that only follow from another dimension's are not told again. */
const follows = (fault: ModelFault): boolean =>
  fault.code === 'input' || /^Mend /.test(fault.cure ?? '');

/** Every expression of the plan that cannot be worked out for one of the three reasons. */
export function unresolved({ document, model }: RuleContext, rule: ResolveRule): Finding[] {
  const worked = model();
  const found: Finding[] = [];
  const look = (fault: ModelFault | null | undefined, place: Finding['place'], name: string) => {
    if (!fault || ruleOf(fault) !== rule || follows(fault)) return;
    found.push({
      place,
      message: `${name}: ${fault.message}`,
      cure: fault.cure ?? 'Mend its expression.',
    });
  };
  for (const d of document.dimensions)
    look(worked.dimensions.get(d.id)?.error, { in: 'dimensions', elementId: d.id }, d.name);
  for (const part of document.parts) {
    const state = worked.parts.get(part.id);
    const fault = state?.length.error ?? state?.width.error ?? state?.thickness.error;
    look(fault, { in: 'parts', elementId: part.id }, `Part ${part.mark}, ${part.name}`);
  }
  for (const check of document.checks)
    look(
      worked.checks.get(check.id)?.error,
      { in: 'checks', elementId: check.id },
      `Check “${check.name}”`,
    );
  for (const { text, kind, place, name } of otherExpressions(document))
    look(worked.evaluate(text, kind).error, place, name);
  return found;
}

import { type PlanDocument } from '../document';
import { createModel, type PlanModel } from '../model';
import { type Finding, type RuleLevel } from './rule';
import { rules } from './rules';

/** One row of the check sheet. */
export interface SheetRow extends Finding {
  rule: string;
  level: RuleLevel;
  verdict: 'holds' | 'at-risk' | 'fails' | 'needs-a-reading';
  source: string;
}

export interface CheckSheet {
  rows: SheetRow[];
  /** How many rules found nothing. */
  quiet: number;
}

/**
 * Runs the check sheet's rules over a plan; give the model where it is there already. A failing *must* is `fails`, a *should* `at-risk`, a note
 * `needs-a-reading`. Rules that the creator switched off (never a must) are left out.
 */
export function checkSheet(document: PlanDocument, given?: PlanModel): CheckSheet {
  let made = given;
  const model = () => (made ??= createModel(document));
  const off = (rule: string, level: RuleLevel, elementId: string | null) =>
    level !== 'must' &&
    document.switchedOff.some(
      (s) => s.rule === rule && (s.elementId === undefined || s.elementId === elementId),
    );
  const rows: SheetRow[] = [];
  let quiet = 0;
  for (const rule of rules) {
    const found = rule
      .run({ document, model })
      .filter((f) => !off(rule.id, rule.level, f.place.elementId));
    if (found.length === 0) quiet += 1;
    const verdict =
      rule.level === 'must' ? 'fails' : rule.level === 'should' ? 'at-risk' : 'needs-a-reading';
    for (const finding of found)
      rows.push({ ...finding, rule: rule.id, level: rule.level, source: rule.source, verdict });
  }
  const order = { fails: 0, 'at-risk': 1, 'needs-a-reading': 2, holds: 3 };
  return { rows: rows.sort((a, b) => order[a.verdict] - order[b.verdict]), quiet };
}

export { type Finding, type Rule, type RuleLevel, type Place } from './rule';

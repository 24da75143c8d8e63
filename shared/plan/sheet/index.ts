import { type PlanDocument } from '../document';
import { createModel, type PlanModel } from '../model';
import { type AskLayout } from './layout-port';
import { type Finding, type Rule, type RuleLevel } from './rule';
import { rules } from './rules';
import { layoutEnough, layoutFinding } from './rules/layout-enough';

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

export type Purpose = 'draft' | 'publish';

const verdicts = { must: 'fails', should: 'at-risk', note: 'needs-a-reading' } as const;
const order = { fails: 0, 'at-risk': 1, 'needs-a-reading': 2, holds: 3 };
const inOrder = (rows: SheetRow[]): SheetRow[] =>
  rows.sort((a, b) => order[a.verdict] - order[b.verdict]);

const rowOf = (rule: Rule, level: RuleLevel, finding: Finding): SheetRow => ({
  ...finding,
  rule: rule.id,
  level,
  source: rule.source,
  verdict: verdicts[level],
});

/** Did the creator switch a rule off, here or for the whole plan? A must never is. */
const isOff = (document: PlanDocument, rule: string, level: RuleLevel, elementId: string | null) =>
  level !== 'must' &&
  document.switchedOff.some(
    (s) => s.rule === rule && (s.elementId === undefined || s.elementId === elementId),
  );

/**
 * Runs the check sheet's rules over a plan; give the model where it is there already. A failing *must* is `fails`, a *should*
 * `at-risk`, a note `needs-a-reading`. Rules that the creator switched off (never a must) are left out. Some rules are
 * stricter when the plan is to be published.
 */
export function checkSheet(
  document: PlanDocument,
  given?: PlanModel,
  purpose: Purpose = 'draft',
): CheckSheet {
  let made = given;
  const model = () => (made ??= createModel(document));
  const rows: SheetRow[] = [];
  let quiet = 0;
  for (const rule of rules) {
    const level = purpose === 'publish' ? (rule.toPublish ?? rule.level) : rule.level;
    const found = rule
      .run({ document, model })
      .filter((f) => !isOff(document, rule.id, level, f.place.elementId));
    if (found.length === 0) quiet += 1;
    for (const finding of found) rows.push(rowOf(rule, level, finding));
  }
  return { rows: inOrder(rows), quiet };
}

/**
 * The sheet once a layout engine has answered: for each stock it answered, its word takes the place of the bound's. If it
 * cannot be asked the bound stands.
 */
export async function askLayout(
  sheet: CheckSheet,
  document: PlanDocument,
  ask: AskLayout,
  purpose: Purpose = 'draft',
): Promise<CheckSheet> {
  const answers = await ask(document).catch(() => []);
  if (answers.length === 0) return sheet;
  const level = purpose === 'publish' ? (layoutEnough.toPublish ?? 'must') : layoutEnough.level;
  const answered = new Set(answers.map((a) => a.stockId));
  const before = sheet.rows.filter((row) => row.rule === layoutEnough.id);
  const kept = before.filter((row) => !answered.has(row.place.elementId ?? ''));
  const now = answers.flatMap((answer) => {
    const finding = layoutFinding(document, answer);
    const off = isOff(document, layoutEnough.id, level, answer.stockId);
    return finding && !off ? [rowOf(layoutEnough, level, finding)] : [];
  });
  const others = sheet.rows.filter((row) => row.rule !== layoutEnough.id);
  const wasQuiet = before.length === 0 ? 1 : 0;
  const isQuiet = kept.length + now.length === 0 ? 1 : 0;
  return { rows: inOrder([...others, ...kept, ...now]), quiet: sheet.quiet - wasQuiet + isQuiet };
}

export { type Finding, type Rule, type RuleLevel, type Place } from './rule';
export { type AskLayout, type LayoutAnswer } from './layout-port';
export { applyMend, mendLabel, type Mend } from './mends';

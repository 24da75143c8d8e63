import { type PlanDocument, type Step } from '../../document';
import { type PlanModel } from '../../model';
import { actionExpressions } from '../expressions';
import { type Finding, type Rule } from '../rule';

const wordsIn = (text: string): string[] => text.match(/[A-Za-z][A-Za-z0-9_]*/g) ?? [];

/** Looks up which dimensions a step cannot do without, with all that feeds them. */
function needsOf(document: PlanDocument, model: PlanModel): (step: Step) => ReadonlySet<string> {
  const parts = new Map(document.parts.map((p) => [p.id, p]));
  const checks = new Map(document.checks.map((c) => [c.id, c]));
  const named = (texts: readonly string[]) =>
    texts.flatMap(wordsIn).flatMap((word) => model.symbols.get(word)?.id ?? []);
  return (step) => {
    const sized = step.parts.flatMap(({ partId, to }) => {
      const part = to === 'sized' ? parts.get(partId) : undefined;
      return part ? [part.length, part.width, part.thickness] : [];
    });
    const asked = step.checks.map((id) => checks.get(id)?.expression ?? '');
    const open = [
      ...step.holds,
      ...[...step.text.matchAll(/\{\{dim:([0-9a-f-]+)\}\}/g)].map((m) => m[1]!),
      ...named([...sized, ...asked, ...actionExpressions(step)]),
    ];
    const all = new Set<string>();
    while (open.length > 0) {
      const id = open.pop()!;
      if (all.has(id)) continue;
      all.add(id);
      open.push(...model.feeds(id));
    }
    return all;
  };
}

export const dimsUntaken: Rule = {
  id: 'dims/untaken',
  level: 'must',
  source: 'plan model §7: a taken dimension is measured before the first step that needs it',
  run: ({ document, model }) => {
    const taken = document.dimensions.filter((d) => d.origin === 'taken');
    if (taken.length === 0) return [];
    const needed = document.steps.map(needsOf(document, model()));
    return taken.flatMap((dimension): Finding[] => {
      const measured = document.steps.findIndex((s) => s.takes.includes(dimension.id));
      const first = needed.findIndex((ids) => ids.has(dimension.id));
      const place = { in: 'dimensions' as const, elementId: dimension.id };
      if (measured < 0) {
        return [
          {
            place,
            message: `${dimension.name} is taken by each builder, but no step measures it.`,
            cure: 'Name it under “take” in the step that measures it.',
          },
        ];
      }
      if (first < 0 || measured <= first) return [];
      return [
        {
          place,
          message: `${dimension.name} is measured in step ${measured + 1}, but step ${first + 1} needs it.`,
          cure: `Measure it in step ${first + 1} or before.`,
        },
      ];
    });
  },
};

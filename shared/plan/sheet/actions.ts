import { type Action, type Cut, type Part, type PlanDocument, type Step } from '../document';
import { type PlanModel } from '../model';
import { type Finding } from './rule';

type Did<K extends Action['do']> = Extract<Action, { do: K }>;

/** An action with its step, counted from 1. */
export interface Placed<A> {
  action: A;
  step: Step;
  number: number;
}

/** All actions of a kind, in the order of the steps. */
export function actionsOf<K extends Action['do']>(
  document: PlanDocument,
  kind: K,
): Placed<Did<K>>[] {
  return document.steps.flatMap((step, i) =>
    step.actions
      .filter((action): action is Did<K> => action.do === kind)
      .map((action) => ({ action, step, number: i + 1 })),
  );
}

/** A finding at a step. */
export const atStep = (step: Step, message: string, cure: string): Finding => ({
  place: { in: 'steps', elementId: step.id },
  message,
  cure,
});

/** Everything a step says in words: title, text, cautions. */
export const wordsOf = (step: Step): string =>
  [step.title, step.text, ...step.cautions.map((c) => c.text)].join(' \n').toLowerCase();

export const planWordsOf = (document: PlanDocument): string =>
  document.steps.map(wordsOf).join(' \n');

/** Length in mm of an expression of the plan; null when it is empty or cannot be worked out. */
export function mm(model: PlanModel, text: string): number | null {
  if (text.trim() === '') return null;
  return model.evaluate(text).value?.x ?? null;
}

/** A part's worked-out sizes in mm. */
export function sizeOf(model: PlanModel, part: Part) {
  const state = model.parts.get(part.id);
  return {
    length: state?.length.value?.x ?? null,
    width: state?.width.value?.x ?? null,
    thickness: state?.thickness.value?.x ?? null,
  };
}

/** The smallest length and width among the pieces on the machine, mm. */
export function workOf(document: PlanDocument, model: PlanModel, cut: Cut) {
  const parts = document.parts
    .filter((p) => cut.partIds.includes(p.id))
    .map((p) => sizeOf(model, p));
  const least = (values: (number | null)[]) => {
    const known = values.filter((v): v is number => v !== null);
    return known.length > 0 ? Math.min(...known) : null;
  };
  return {
    length: mm(model, cut.length) ?? least(parts.map((p) => p.length)),
    width: mm(model, cut.width) ?? least(parts.map((p) => p.width)),
  };
}

const holding = new Set([
  'push-stick',
  'push-block',
  'feather-board',
  'hold-down',
  'clamp',
  'jig',
  'vice',
  'tunnel',
  'mitre-gauge',
]);
/** Does something other than a hand hold or feed the work? */
export const isHeld = (cut: Cut): boolean => cut.heldBy.some((by) => holding.has(by));

const replacing = new Set(['feather-board', 'hold-down', 'tunnel', 'jig', 'clamp', 'push-block']);
/** Is something named that keeps hands away where the machine's guard cannot pass? */
export const guardReplaced = (cut: Cut): boolean =>
  cut.guardInstead.trim() !== '' || cut.heldBy.some((by) => replacing.has(by));

export const machineWords = (machine: string): string => machine.replaceAll('-', ' ');

export const throughCuts = new Set<Cut['kind']>(['through-rip', 'through-crosscut', 'mitre-cut']);
export const raisedCuts = new Set<Cut['kind']>(['plunge', 'raised-blade']);
export const grooveCuts = new Set<Cut['kind']>(['groove', 'dado', 'rabbet']);

const rotating = new Set([
  'table-saw',
  'mitre-saw',
  'circular-saw',
  'track-saw',
  'bandsaw',
  'router',
  'router-table',
  'drill-press',
  'jointer',
  'planer',
  'lathe',
  'grinder',
]);
export const turns = (machine: string): boolean => rotating.has(machine);

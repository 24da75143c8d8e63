import { dimensionSchema, type PlanDocument, type Step } from '../document';
import { looseFigures } from './loose-figures';

/** A change of the plan that mends a finding in one tap. */
export type Mend =
  /** A figure in a step's text becomes a reference to the dimension of that value. */
  | { do: 'reference'; stepId: string; text: string; dimensionId: string }
  /** A new dimension is made of a figure in a step's text. */
  | { do: 'dimension'; stepId: string; text: string }
  /** The figure is a name, here and everywhere. */
  | { do: 'name'; text: string }
  /** What the creator says of words heard in the clip. */
  | { do: 'ruling'; stepId: string; heardId: string; ruling: 'muted' | 'right-on-mine' };

/** What a mend is called on a button. */
export function mendLabel(mend: Mend, document: PlanDocument): string {
  if (mend.do === 'name') return 'It is a name';
  if (mend.do === 'dimension') return 'Make a dimension of it';
  if (mend.do === 'ruling')
    return mend.ruling === 'muted' ? 'Mute the words' : 'Right on my machine';
  const symbol = document.dimensions.find((d) => d.id === mend.dimensionId)?.symbol;
  return `Refer to ${symbol ?? 'the dimension'}`;
}

const inStep = (
  document: PlanDocument,
  stepId: string,
  change: (step: Step) => Step,
): PlanDocument => ({
  ...document,
  steps: document.steps.map((step) => (step.id === stepId ? change(step) : step)),
});

/** A step's text with the first loose figure of these words as a reference. */
function referring(document: PlanDocument, step: Step, text: string, id: string): Step {
  const figure = looseFigures(step.text, document.names).find((f) => f.text === text);
  if (!figure) return step;
  const after = step.text.slice(figure.at + text.length);
  return { ...step, text: `${step.text.slice(0, figure.at)}{{dim:${id}}}${after}` };
}

function freeSymbol(document: PlanDocument): string {
  const taken = new Set(document.dimensions.map((d) => d.symbol));
  for (let n = 1; ; n += 1) if (!taken.has(`size_${n}`)) return `size_${n}`;
}

/** The plan mended; `newId` is the id of a dimension, should one be made. */
export function applyMend(document: PlanDocument, mend: Mend, newId: string): PlanDocument {
  if (mend.do === 'name')
    return document.names.includes(mend.text)
      ? document
      : { ...document, names: [...document.names, mend.text] };
  if (mend.do === 'ruling')
    return inStep(document, mend.stepId, (step) => ({
      ...step,
      heard: step.heard.map((h) => (h.id === mend.heardId ? { ...h, ruling: mend.ruling } : h)),
    }));
  if (mend.do === 'reference')
    return inStep(document, mend.stepId, (step) =>
      referring(document, step, mend.text, mend.dimensionId),
    );
  const number = document.steps.findIndex((s) => s.id === mend.stepId) + 1;
  const dimension = dimensionSchema.parse({
    id: newId,
    name: `Size in step ${number}`,
    symbol: freeSymbol(document),
    origin: 'given',
    expression: mend.text.replace(/-(?=[a-z])/i, ' '),
  });
  const next = inStep(document, mend.stepId, (step) => referring(document, step, mend.text, newId));
  return { ...next, dimensions: [...next.dimensions, dimension] };
}

import { type Action, type Kind, type PlanDocument, type Step } from '../document';
import { type Place } from './rule';

/** An expression that stands outside dimensions, checks and the sizes of parts. */
export interface PlacedText {
  text: string;
  /** What it is, for a sentence. */
  name: string;
  place: Place;
  kind: Kind;
}

type Add = (name: string, text: string | undefined) => void;

function actionTexts(action: Action, add: Add): void {
  if (action.do === 'cut') {
    add('length of the work', action.length);
    add('width of the work', action.width);
    add('depth', action.depth);
    add('depth of a pass', action.depthPerPass);
    add('diameter of the bit', action.bitDiameter);
  }
  if (action.do !== 'fasten') return;
  add('thickness it goes through', action.throughThickness);
  add('thickness it goes into', action.intoThickness);
  add('pilot', action.pilot === 'none-needed' ? '' : action.pilot);
  add('clearance', action.clearance);
  add('place', action.x);
  add('place', action.y);
  add('saw path', action.clearOfCut);
}

/** The expressions of a step's actions. */
export function actionExpressions(step: Step): string[] {
  const all: string[] = [];
  for (const action of step.actions) actionTexts(action, (_, text) => void all.push(text ?? ''));
  return all;
}

/** Every other expression of a plan, empty ones left out. */
export function otherExpressions(document: PlanDocument): PlacedText[] {
  const all: PlacedText[] = [];
  const adding =
    (place: Place, owner: string): Add =>
    (name, text) => {
      if (text !== undefined && text.trim() !== '')
        all.push({ text, name: `${owner}, ${name}`, place, kind: 'length' });
    };
  for (const s of document.stock) {
    const add = adding({ in: 'stock', elementId: s.id }, s.name);
    add('thickness', s.thickness);
    add('kerf', s.kerf);
    for (const size of s.sizes) {
      add('length on sale', size.length);
      add('width on sale', size.width);
    }
  }
  for (const h of document.hardware) {
    const add = adding({ in: 'hardware', elementId: h.id }, h.name);
    add('diameter', h.diameter);
    add('length', h.length);
  }
  for (const part of document.parts) {
    const add = adding({ in: 'parts', elementId: part.id }, `Part ${part.mark}, ${part.name}`);
    add('allowance', part.allowance);
    for (const f of part.features) {
      const what = f.name || f.kind;
      add(`${what}, place`, f.x);
      add(`${what}, place`, f.y);
      add(`${what}, width`, f.width);
      add(`${what}, length`, f.length);
      add(`${what}, depth`, f.depth);
    }
  }
  document.steps.forEach((step, i) => {
    const add = adding({ in: 'steps', elementId: step.id }, `Step ${i + 1}`);
    for (const action of step.actions) actionTexts(action, add);
  });
  const add = adding({ in: 'plan', elementId: null }, 'Size over all');
  add('length', document.size?.length);
  add('width', document.size?.width);
  add('height', document.size?.height);
  return all;
}

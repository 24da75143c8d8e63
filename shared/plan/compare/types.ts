import { type CheckVerdict, type PlanModel } from '../model';

/** What an element is. Cautions, waits and actions are compared by themselves, whatever step they hang on. */
export const subjects = [
  'plan',
  'dimension',
  'part',
  'stock',
  'hardware',
  'consumable',
  'tool',
  'check',
  'step',
  'caution',
  'wait',
  'action',
  'flow',
  'link',
  'credit',
  'photo',
] as const;
export type Subject = (typeof subjects)[number];

/** One field that means something else now; the texts are as the documents hold them. */
export interface FieldChange {
  field: string;
  before: string;
  after: string;
  /** A name, a price, a stretch of the clip: nobody at a bench has to do anything about it. */
  quiet: boolean;
}

/** A computed figure in base units; null where it cannot be worked out. */
export interface ComputedFigure {
  x: number | null;
  low: number | null;
  high: number | null;
}

/** A figure of an element that moved: `value`, `length`, `width`, `thickness`, or `features/ID/x`. */
export interface FigureChange {
  of: string;
  before: ComputedFigure | null;
  after: ComputedFigure | null;
}

export interface Change {
  /** `dimension/ID`: one change per element. */
  key: string;
  subject: Subject;
  elementId: string;
  /** The step that a caution, wait or action hangs on, in the later revision where it is there. */
  stepId: string | null;
  /** Name, mark or first words, from the later revision where it is there. */
  name: string;
  /** `follows`: its own words are the same, but a figure of it moved. */
  how: 'added' | 'removed' | 'changed' | 'follows';
  fields: FieldChange[];
  figures: FigureChange[];
  /** A check whose verdict is another one now. */
  verdict: { before: CheckVerdict; after: CheckVerdict } | null;
  /** For what follows: keys of the changes it comes from. */
  because: string[];
  /** It bears on fingers: a caution, a guard, the power, how work is held. The creator decides in the end. */
  safety: boolean;
}

/** Two revisions compared by meaning, with the models they were compared on. */
export interface Comparison {
  changes: Change[];
  before: PlanModel;
  after: PlanModel;
}

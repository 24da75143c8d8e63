import { type PlanDocument } from '../document';
import { type PlanModel } from '../model';
import { type Mend } from './mends';

export type RuleLevel = 'must' | 'should' | 'note';

/** Where a row leads: which list of the plan, and which element in it. */
export interface Place {
  in:
    | 'plan'
    | 'steps'
    | 'dimensions'
    | 'checks'
    | 'parts'
    | 'stock'
    | 'hardware'
    | 'tools'
    | 'links'
    | 'photos'
    | 'clip';
  elementId: string | null;
}

/** One thing a rule found. */
export interface Finding {
  place: Place;
  /** What is wrong, one sentence. */
  message: string;
  /** How to mend it, one sentence. */
  cure: string;
  /** Ways to mend it in one tap, the likeliest first. */
  mends?: Mend[];
}

/** One rule of the check sheet. It must be quiet unless it is right. */
export interface Rule {
  /** Stable, e.g. `parts/made`. */
  id: string;
  level: RuleLevel;
  /** Its level when the plan is to be published, if that is another. */
  toPublish?: RuleLevel;
  /** Where the rule comes from, for whoever asks. */
  source: string;
  run: (context: RuleContext) => Finding[];
}

/** What rules look at. */
export interface RuleContext {
  document: PlanDocument;
  /** The plan worked out, at design; made when the first rule asks for it. */
  model: () => PlanModel;
}

export const stepName = (document: PlanDocument, stepId: string): string => {
  const at = document.steps.findIndex((s) => s.id === stepId);
  return at < 0 ? 'a step' : `step ${at + 1}`;
};

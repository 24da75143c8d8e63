import { type InstrumentName } from '../plan/document-values';

/** An instrument's uncertainty: mm, or degrees for angles, or mm over a length. */
export interface InstrumentFact {
  uncertainty: number;
  /** The length it holds over, mm. */
  over?: number;
  /** Finer ones to reach for. */
  finer: InstrumentName[];
}

/** Common practice, no source; each person sets their own. */
export const instrumentFacts: Record<InstrumentName, InstrumentFact> = {
  tape: { uncertainty: 1, finer: ['rule', 'calipers'] },
  rule: { uncertainty: 0.25, finer: ['calipers'] },
  calipers: { uncertainty: 0.03, finer: ['micrometer'] },
  micrometer: { uncertainty: 0.005, finer: [] },
  square: { uncertainty: 0.1, over: 300, finer: ['feeler'] },
  'angle-gauge': { uncertainty: 0.2, finer: ['square'] },
  feeler: { uncertainty: 0.02, finer: [] },
  scale: { uncertainty: 0.05, finer: [] },
  eye: { uncertainty: 2, finer: ['tape', 'rule'] },
};

export type Uncertainties = Partial<Record<InstrumentName, number>>;

/** The uncertainty of an instrument: the person's own, or the default. */
export function uncertaintyOf(name: InstrumentName, own?: Uncertainties): number {
  return own?.[name] ?? instrumentFacts[name].uncertainty;
}

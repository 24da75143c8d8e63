import { type PlanDocument } from '../document';

/** What a layout engine says of one stock. */
export interface LayoutAnswer {
  stockId: string;
  /** Pieces of its first size that are needed; null when it found no way at all. */
  pieces: number | null;
}

/**
 * Asks how many pieces of each stock the parts really take. Slow, so never part of the sheet's own run; the bound of
 * `layout/enough` stands until it answers.
 */
export type AskLayout = (document: PlanDocument) => Promise<readonly LayoutAnswer[]>;

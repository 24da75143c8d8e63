import { type PlanDocument, type Stock } from '../document';
import { type PlanModel } from '../model';
import { mm } from './actions';

/** A piece on sale, mm; width null where it has none (rod). */
export interface SaleSize {
  length: number;
  width: number | null;
}

/** The sizes of a stock that can be worked out. */
export const saleSizes = (stock: Stock, model: PlanModel): SaleSize[] =>
  stock.sizes.flatMap((s) => {
    const length = mm(model, s.length);
    return length === null ? [] : [{ length, width: mm(model, s.width) }];
  });

const slack = 1e-6;

/** Does a rectangle go on a piece, as it lies or, if it may, turned? */
export const goesOn = (l: number, w: number, size: SaleSize, turn: boolean): boolean => {
  const across = size.width ?? Infinity;
  return (
    (l <= size.length + slack && w <= across + slack) ||
    (turn && w <= size.length + slack && l <= across + slack)
  );
};

export const stockOf = (document: PlanDocument, stockId: string | undefined): Stock | undefined =>
  document.stock.find((s) => s.id === stockId);

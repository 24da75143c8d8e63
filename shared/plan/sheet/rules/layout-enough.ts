import { type PlanDocument, type Stock } from '../../document';
import { type PlanModel } from '../../model';
import { mm, sizeOf } from '../actions';
import { type LayoutAnswer } from '../layout-port';
import { saleSizes, type SaleSize } from '../stock-sizes';
import { type Finding, type Rule } from '../rule';

interface Blank {
  length: number;
  width: number;
  quantity: number;
  /** May it lie the other way round? */
  turn: boolean;
}

function blanksOf(document: PlanDocument, model: PlanModel, stock: Stock): Blank[] | null {
  const blanks: Blank[] = [];
  for (const part of document.parts) {
    if (part.stockId !== stock.id) continue;
    const { length, width } = sizeOf(model, part);
    if (length === null || width === null) return null;
    const across = stock.grained && part.grain === 'width';
    blanks.push({
      length: across ? width : length,
      width: across ? length : width,
      quantity: part.quantity,
      turn: part.grain === 'free' || !stock.grained,
    });
  }
  return blanks;
}

/** Pieces the area needs, kerf round each part included. */
const byArea = (blanks: readonly Blank[], size: SaleSize, kerf: number): number => {
  const need = blanks.reduce(
    (sum, b) => sum + b.quantity * (b.length + kerf) * (b.width + kerf),
    0,
  );
  return need / ((size.length + kerf) * ((size.width ?? 0) + kerf));
};

/** Pieces the largest parts need: of parts longer and wider than half a piece each takes one for itself. */
const byLargest = (blanks: readonly Blank[], size: SaleSize, kerf: number): number => {
  const across = size.width ?? 0;
  const alone = (l: number, w: number) =>
    2 * l + kerf > size.length + 1e-6 && 2 * w + kerf > across + 1e-6;
  return blanks
    .filter((b) => alone(b.length, b.width) && (!b.turn || alone(b.width, b.length)))
    .reduce((sum, b) => sum + b.quantity, 0);
};

/** Fewest pieces of the stock's first size that anybody could do with; null when it cannot be said. */
export function leastPieces(
  document: PlanDocument,
  model: PlanModel,
  stock: Stock,
): { pieces: number; because: 'area' | 'largest' } | null {
  const [size] = saleSizes(stock, model);
  const blanks = blanksOf(document, model, stock);
  if (!size || size.width === null || !blanks) return null;
  const kerf = mm(model, stock.kerf) ?? 0;
  const area = byArea(blanks, size, kerf);
  const largest = byLargest(blanks, size, kerf);
  return area > largest
    ? { pieces: area, because: 'area' }
    : { pieces: largest, because: 'largest' };
}

export const layoutEnough: Rule = {
  id: 'layout/enough',
  level: 'should',
  toPublish: 'must',
  source: 'area and largest parts with kerf: what fails here cannot be laid out by anybody',
  run: ({ document, model }) =>
    document.stock.flatMap((stock): Finding[] => {
      const least = leastPieces(document, model(), stock);
      if (!least || least.pieces <= stock.quantity + 1e-9) return [];
      const need = Math.ceil(least.pieces - 1e-9);
      return [
        {
          place: { in: 'stock', elementId: stock.id },
          message:
            least.because === 'area'
              ? `The parts take more of ${stock.name} than is listed: at least ${need}, listed ${stock.quantity}.`
              : `${need} parts take a piece of ${stock.name} each; listed ${stock.quantity}.`,
          cure: `List at least ${need}, or make the parts smaller.`,
        },
      ];
    }),
};

/** The finding a layout engine's answer makes; null when the stock is enough. */
export function layoutFinding(document: PlanDocument, answer: LayoutAnswer): Finding | null {
  const stock = document.stock.find((s) => s.id === answer.stockId);
  if (!stock || (answer.pieces !== null && answer.pieces <= stock.quantity)) return null;
  const place = { in: 'stock' as const, elementId: stock.id };
  return answer.pieces === null
    ? {
        place,
        message: `No way was found to lay the parts out on ${stock.name}.`,
        cure: 'List a larger size, or make the parts smaller.',
      }
    : {
        place,
        message: `Laid out, the parts take ${answer.pieces} of ${stock.name}; listed ${stock.quantity}.`,
        cure: `List ${answer.pieces}.`,
      };
}

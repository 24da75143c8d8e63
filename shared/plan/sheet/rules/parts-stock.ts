import { type PlanDocument, type Stock } from '../../document';
import { type PlanModel } from '../../model';
import { actionsOf, mm, sizeOf } from '../actions';
import { type Finding, type Rule } from '../rule';

interface Size {
  length: number;
  width: number | null;
}
const sizesOf = (stock: Stock, model: PlanModel): Size[] =>
  stock.sizes.flatMap((s) => {
    const length = mm(model, s.length);
    return length === null ? [] : [{ length, width: mm(model, s.width) }];
  });

const slack = 1e-6;
const fits = (l: number, w: number, size: Size, turn: boolean): boolean => {
  const across = size.width ?? Infinity;
  return (
    (l <= size.length + slack && w <= across + slack) ||
    (turn && w <= size.length + slack && l <= across + slack)
  );
};

export const partsFitsStock: Rule = {
  id: 'parts/fits-stock',
  level: 'must',
  source: 'geometry: a part is cut from a piece that is on sale, grain kept',
  run: ({ document, model }) =>
    document.parts.flatMap((part): Finding[] => {
      const stock = document.stock.find((s) => s.id === part.stockId);
      const { length, width } = sizeOf(model(), part);
      const sizes = stock ? sizesOf(stock, model()) : [];
      if (!stock || length === null || width === null || sizes.length === 0) return [];
      const turn = part.grain === 'free' || !stock.grained;
      const along: [number, number] =
        part.grain === 'width' && stock.grained ? [width, length] : [length, width];
      return sizes.some((size) => fits(along[0], along[1], size, turn))
        ? []
        : [
            {
              place: { in: 'parts', elementId: part.id },
              message: `Part ${part.mark}, ${part.name}, does not fit on ${stock.name} as it is sold${turn ? '' : ' with its grain'}.`,
              cure: 'List a larger size, join it of two, or change the part.',
            },
          ];
    }),
};

export const partsQuantity: Rule = {
  id: 'parts/quantity',
  level: 'must',
  source: 'counting: what the steps use is on the list',
  run: ({ document }) =>
    document.hardware.flatMap((item): Finding[] => {
      const used = actionsOf(document, 'fasten')
        .filter(({ action }) => action.hardwareId === item.id)
        .reduce((n, { action }) => n + action.quantity, 0);
      return used > item.quantity
        ? [
            {
              place: { in: 'hardware', elementId: item.id },
              message: `The steps use ${used} of ${item.name}; the list has ${item.quantity}.`,
              cure: `List ${used}, or correct the steps.`,
            },
          ]
        : [];
    }),
};

export const partsThickness: Rule = {
  id: 'parts/thickness',
  level: 'should',
  source: 'plan model §5: the thickness is the stock’s, planed, or a lamination',
  run: ({ document, model }) =>
    document.parts.flatMap((part): Finding[] => {
      const stock = document.stock.find((s) => s.id === part.stockId);
      if (!stock || part.thickness.trim() === '' || part.layers.length > 0) return [];
      const own = mm(model(), part.thickness);
      const given = mm(model(), stock.thickness);
      return own !== null && given !== null && own > given + 0.05
        ? [
            {
              place: { in: 'parts', elementId: part.id },
              message: `Part ${part.mark}, ${part.name}, is thicker than the stock it is cut from.`,
              cure: 'Choose thicker stock, or name the layers it is glued of.',
            },
          ]
        : [];
    }),
};

/** Area of the parts cut from a stock against the area on sale, kerf round each part included; mm². */
function areas(
  document: PlanDocument,
  model: PlanModel,
  stock: Stock,
): { need: number; have: number } | null {
  const [size] = sizesOf(stock, model);
  if (!size || size.width === null) return null;
  const kerf = mm(model, stock.kerf) ?? 3.2;
  let need = 0;
  for (const part of document.parts.filter((p) => p.stockId === stock.id)) {
    const { length, width } = sizeOf(model, part);
    if (length === null || width === null) return null;
    need += part.quantity * (length + kerf) * (width + kerf);
  }
  return { need, have: stock.quantity * (size.length + kerf) * (size.width + kerf) };
}

export const layoutEnough: Rule = {
  id: 'layout/enough',
  level: 'should',
  source: 'area bound with kerf: what fails here cannot be laid out by anybody',
  run: ({ document, model }) =>
    document.stock.flatMap((stock): Finding[] => {
      const area = areas(document, model(), stock);
      return area && area.need > area.have
        ? [
            {
              place: { in: 'stock', elementId: stock.id },
              message: `The parts need ${Math.ceil((area.need / area.have) * 100)} % of the ${stock.name} listed.`,
              cure: `List at least ${Math.ceil((stock.quantity * area.need) / area.have)}.`,
            },
          ]
        : [];
    }),
};

import { sizeOf } from '../actions';
import { goesOn, saleSizes, stockOf } from '../stock-sizes';
import { type Finding, type Rule } from '../rule';

export const partsFitsStock: Rule = {
  id: 'parts/fits-stock',
  level: 'must',
  source: 'geometry: a part is cut from a piece that is on sale, grain kept',
  run: ({ document, model }) =>
    document.parts.flatMap((part): Finding[] => {
      const stock = stockOf(document, part.stockId);
      const { length, width } = sizeOf(model(), part);
      const sizes = stock ? saleSizes(stock, model()) : [];
      if (!stock || length === null || width === null || sizes.length === 0) return [];
      const turn = part.grain === 'free' || !stock.grained;
      const across = part.grain === 'width' && stock.grained;
      const [l, w] = across ? [width, length] : [length, width];
      return sizes.some((size) => goesOn(l, w, size, turn))
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

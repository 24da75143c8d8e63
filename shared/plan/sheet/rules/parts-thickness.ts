import { mm, sizeOf } from '../actions';
import { stockOf } from '../stock-sizes';
import { type Finding, type Rule } from '../rule';

export const partsThickness: Rule = {
  id: 'parts/thickness',
  level: 'should',
  source: 'plan model §5: the thickness is the stock’s, planed, or a lamination',
  run: ({ document, model }) =>
    document.parts.flatMap((part): Finding[] => {
      const stock = stockOf(document, part.stockId);
      if (!stock || part.thickness.trim() === '' || part.layers.length > 0) return [];
      const own = sizeOf(model(), part).thickness;
      const given = mm(model(), stock.thickness);
      if (own === null || given === null) return [];
      const name = `Part ${part.mark}, ${part.name},`;
      const found = (message: string, cure: string): Finding[] => [
        { place: { in: 'parts', elementId: part.id }, message, cure },
      ];
      if (own > given + 0.05)
        return found(
          `${name} is thicker than the stock it is cut from.`,
          'Choose thicker stock, or name the layers it is glued of.',
        );
      return stock.form === 'sheet' && own < given - 1
        ? found(
            `${name} is thinner than the sheet it is cut from; sheet is not planed.`,
            'Leave its thickness to the stock, or choose another sheet.',
          )
        : [];
    }),
};

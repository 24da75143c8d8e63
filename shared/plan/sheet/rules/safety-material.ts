import { careMaterials } from '../../../trade/materials.data';
import { planWordsOf } from '../actions';
import { type Finding, type Rule } from '../rule';

export const safetyMaterial: Rule = {
  id: 'safety/material',
  level: 'should',
  source: 'OSHA, NIOSH and ACGIH on wood dust; common practice for reclaimed and treated timber',
  run: ({ document }) => {
    const said = planWordsOf(document);
    return document.stock.flatMap((stock): Finding[] => {
      const named = `${stock.name} ${stock.material}`.toLowerCase();
      return careMaterials
        .filter((kind) => kind.match.test(named) && !kind.needs.test(said))
        .map((kind) => ({
          place: { in: 'stock' as const, elementId: stock.id },
          message: `${stock.name}: ${kind.what}, and no caution says so.`,
          cure: kind.cure,
        }));
    });
  },
};

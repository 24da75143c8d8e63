import { planWordsOf } from '../actions';
import { type Finding, type Rule } from '../rule';

const kinds = [
  {
    match: /\bmdf\b|fibreboard|fiberboard/,
    what: 'its dust is very fine',
    needs: /\b(?:dust|mask|respirator|extract)/,
    cure: 'Say that dust is extracted and a mask worn.',
  },
  {
    match: /\btreated\b|pressure.?treated|railway sleeper/,
    what: 'its dust and smoke are poisonous',
    needs: /\b(?:mask|respirator|burn|gloves)/,
    cure: 'Say: mask on, never burn the offcuts.',
  },
  {
    match: /\breclaimed\b|\bpallet\b|salvaged/,
    what: 'nails may be in it',
    needs: /\b(?:nails?|metal|detector)\b/,
    cure: 'Say that nails are looked for before it meets a blade.',
  },
  {
    match: /\b(?:cedar|rosewood|cocobolo|iroko|wenge|yew)\b/,
    what: 'it can sensitise skin and lungs',
    needs: /\b(?:mask|respirator|dust|skin)/,
    cure: 'Say: mask on, dust extracted, skin covered.',
  },
];

export const safetyMaterial: Rule = {
  id: 'safety/material',
  level: 'should',
  source: 'OSHA, NIOSH and ACGIH on wood dust; common practice for reclaimed and treated timber',
  run: ({ document }) => {
    const said = planWordsOf(document);
    return document.stock.flatMap((stock): Finding[] => {
      const named = `${stock.name} ${stock.material}`.toLowerCase();
      return kinds
        .filter((kind) => kind.match.test(named) && !kind.needs.test(said))
        .map((kind) => ({
          place: { in: 'stock' as const, elementId: stock.id },
          message: `${stock.name}: ${kind.what}, and no caution says so.`,
          cure: kind.cure,
        }));
    });
  },
};

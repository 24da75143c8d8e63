import { coefficientsOf, movement } from '../../../trade/movement';
import { movementBorne, season } from '../../../trade/shop.data';
import { atStep, sizeOf, wordsOf } from '../actions';
import { stockOf } from '../stock-sizes';
import { type Finding, type Rule } from '../rule';

/** Made of layers or fibres: it does not move to speak of. */
const manmade = /\b(?:ply|plywood|mdf|hdf|osb|chipboard|particle ?board|hardboard|melamine)\b/i;
const roomSaid =
  /\bslot(?:s|ted)?\b|elongat|\bbuttons?\b|figure.eight|\bclips?\b|room to (?:move|swell)|free to move|(?:middle|cent(?:er|re)|front|one end) only|only (?:at|in|along) the (?:middle|cent(?:er|re)|front)|\boversize/;

export const movementSeason: Rule = {
  id: 'movement/season',
  level: 'should',
  source:
    'USDA Wood Handbook FPL-GTR-190, Eq. 13–2 and Table 13–5; four points of moisture content a year',
  run: ({ document, model }) => {
    /** Parts glued edge to edge with their own kind make one wide panel. */
    const panels = new Set(
      document.steps.flatMap((step) =>
        step.actions.flatMap((a) =>
          a.do === 'glue' && !a.acrossGrain && a.partIds.length === 1 ? a.partIds : [],
        ),
      ),
    );
    /** How much a part of solid wood swells and shrinks across, mm. */
    const moves = (id: string | undefined): number => {
      const part = document.parts.find((p) => p.id === id);
      const stock = stockOf(document, part?.stockId);
      if (!part || !stock || (stock.form !== 'board' && stock.form !== 'strip')) return 0;
      const wood = `${stock.material} ${stock.name}`;
      if (manmade.test(wood)) return 0;
      const { length, width } = sizeOf(model(), part);
      const one = (part.grain === 'width' ? length : width) ?? 0;
      const across = panels.has(part.id) ? one * part.quantity : one;
      return movement(across, coefficientsOf(wood).tangential, 0, season);
    };
    return document.steps.flatMap((step, i) =>
      step.actions.flatMap((action): Finding[] => {
        if ((action.do !== 'glue' && action.do !== 'fasten') || !action.acrossGrain) return [];
        const ids =
          action.do === 'glue' ? action.partIds : [action.throughPartId, action.intoPartId];
        const most = Math.max(0, ...ids.map(moves));
        if (most < movementBorne || roomSaid.test(wordsOf(step))) return [];
        return [
          atStep(
            step,
            `Step ${i + 1} ${action.do === 'glue' ? 'glues' : 'screws'} solid wood across the grain; over a year it moves about ${most.toFixed(1)} mm.`,
            action.do === 'glue'
              ? 'Leave it room: slots, buttons, or glue at the middle only.'
              : 'Slot the holes toward the edges so that it can move.',
          ),
        ];
      }),
    );
  },
};

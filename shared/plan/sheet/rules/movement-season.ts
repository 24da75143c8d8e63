import { actionsOf, atStep, sizeOf } from '../actions';
import { type Finding, type Rule } from '../rule';

/** Wider than this solid wood moves enough in a year to split or bow, mm. Common practice, no source. */
const wide = 150;

export const movementSeason: Rule = {
  id: 'movement/season',
  level: 'should',
  source:
    'USDA Wood Handbook FPL-GTR-190 ch. 13: solid wood moves across the grain with the season',
  run: ({ document, model }) => {
    const solidAndWide = (id: string | undefined): boolean => {
      const part = document.parts.find((p) => p.id === id);
      const stock = document.stock.find((s) => s.id === part?.stockId);
      const width = part ? sizeOf(model(), part).width : null;
      return stock?.form === 'board' && width !== null && width > wide;
    };
    const glued = actionsOf(document, 'glue').flatMap(({ action, step, number }): Finding[] =>
      action.acrossGrain && action.partIds.some(solidAndWide)
        ? [
            atStep(
              step,
              `Step ${number} glues wide solid wood across the grain.`,
              'Leave it room to move: slots, buttons, or glue at the middle only.',
            ),
          ]
        : [],
    );
    const screwed = actionsOf(document, 'fasten').flatMap(({ action, step, number }): Finding[] =>
      action.acrossGrain && [action.throughPartId, action.intoPartId].some(solidAndWide)
        ? [
            atStep(
              step,
              `Step ${number} screws wide solid wood across the grain.`,
              'Slot the holes toward the edges so that it can move.',
            ),
          ]
        : [],
    );
    return [...glued, ...screwed];
  },
};

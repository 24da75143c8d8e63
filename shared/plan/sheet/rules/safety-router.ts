import { routerSpeeds } from '../../../trade/shop.data';
import { actionsOf, atStep, mm, wordsOf } from '../actions';
import { type Finding, type Rule } from '../rule';

const passes = /\bpass(?:es)?\b|\bat a time\b|\bshallow\b/;

export const safetyRouter: Rule = {
  id: 'safety/router',
  level: 'should',
  source: 'common practice, no source; the speed marked on the bit wins',
  run: ({ document, model }) =>
    actionsOf(document, 'cut').flatMap(({ action, step, number }): Finding[] => {
      if (action.machine !== 'router' && action.machine !== 'router-table') return [];
      const found: Finding[] = [];
      if (action.feedAgainstRotation === false)
        found.push(
          atStep(
            step,
            `Step ${number} feeds with the rotation of the bit: it pulls itself along.`,
            'Feed against the rotation.',
          ),
        );
      const bit = mm(model(), action.bitDiameter);
      const pass =
        mm(model(), action.depthPerPass) ??
        (passes.test(wordsOf(step)) ? null : mm(model(), action.depth));
      if (bit !== null && pass !== null && pass > bit + 1e-6)
        found.push(
          atStep(
            step,
            `Step ${number} takes a deeper pass than the bit is thick.`,
            'Take it in several passes, none deeper than the bit’s diameter.',
          ),
        );
      const most = bit === null ? null : routerSpeeds.find((s) => bit > s.over)!.rpm;
      if (most !== null && action.rpm !== undefined && action.rpm > most)
        found.push(
          atStep(
            step,
            `Step ${number} turns a bit of ${Math.round(bit ?? 0)} mm at ${action.rpm} rev/min.`,
            `At most ${most} for that diameter, or less as the bit is marked.`,
          ),
        );
      return found;
    }),
};

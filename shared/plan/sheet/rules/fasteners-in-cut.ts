import { fastenerAir } from '../../../trade/shop.data';
import { actionsOf, atStep, mm } from '../actions';
import { shankOf } from '../screws';
import { type Finding, type Rule } from '../rule';

/** Width of a cut where the plan names none, mm: an eighth of an inch. */
const usualKerf = 3.175;

export const fastenersInCut: Rule = {
  id: 'fasteners/in-cut',
  level: 'must',
  source: 'common practice, no source: a blade that meets a screw throws teeth',
  run: ({ document, model }) =>
    actionsOf(document, 'fasten').flatMap(({ action, step, number }): Finding[] => {
      const at = mm(model(), action.x);
      const path = mm(model(), action.clearOfCut);
      if (at === null || path === null) return [];
      const item = document.hardware.find((h) => h.id === action.hardwareId);
      const kerf = Math.max(usualKerf, ...document.stock.map((s) => mm(model(), s.kerf) ?? 0));
      const shank = (item && shankOf(item, document, model())) ?? 0;
      const clear = kerf / 2 + fastenerAir + shank / 2;
      return Math.abs(at - path) < clear - 1e-6
        ? [
            atStep(
              step,
              `A fastener of step ${number} lies in the path of the saw.`,
              `Move it at least ${clear.toFixed(1)} mm from the middle of the cut.`,
            ),
          ]
        : [];
    }),
};

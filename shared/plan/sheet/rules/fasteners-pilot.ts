import { leadHoles, rootShare } from '../../../trade/screws';
import { actionsOf, atStep, mm } from '../actions';
import { shankOf } from '../screws';
import { type Finding, type Rule } from '../rule';

const standsProud = /\b(?:round|pan|hex|hexagon|washer|button|truss)\b/i;

export const fastenersPilot: Rule = {
  id: 'fasteners/pilot',
  level: 'should',
  source:
    'Wood Handbook FPL-GTR-190 ch. 8: lead holes 70 % and 90 % of the root, root two thirds of the shank (shares from memory)',
  run: ({ document, model }) =>
    actionsOf(document, 'fasten').flatMap(({ action, step, number }): Finding[] => {
      const item = document.hardware.find((h) => h.id === action.hardwareId);
      if (item?.kind !== 'screw') return [];
      if (action.pilot === '')
        return [
          atStep(
            step,
            `Step ${number} drives ${item.name} and says nothing of a pilot hole.`,
            'Give the pilot, or answer “none needed”.',
          ),
        ];
      const found: Finding[] = [];
      const shank = shankOf(item, document, model());
      const pilot = action.pilot === 'none-needed' ? null : mm(model(), action.pilot);
      const clearance = mm(model(), action.clearance);
      if (shank !== null) {
        const { soft, hard } = leadHoles(shank);
        const between = `Between ${soft.toFixed(1)} mm in softwood and ${hard.toFixed(1)} mm in hardwood; the screw’s own table wins.`;
        const say = (what: string) =>
          found.push(atStep(step, `Step ${number}: ${what} for ${item.name}.`, between));
        if (pilot !== null && pilot > 0.875 * shank + 1e-6)
          say(`a pilot of ${pilot.toFixed(1)} mm leaves no wood to hold`);
        if (pilot !== null && pilot < 0.5 * rootShare * shank - 1e-6)
          say(`a pilot of ${pilot.toFixed(1)} mm is too thin`);
        if (clearance !== null && (clearance < shank - 0.1 || clearance > 1.8 * shank))
          found.push(
            atStep(
              step,
              `Step ${number}: a clearance hole of ${clearance.toFixed(1)} mm does not match ${item.name}.`,
              `Its shank is ${shank.toFixed(1)} mm: drill a little over that.`,
            ),
          );
      }
      if (action.countersink && standsProud.test(item.head ?? ''))
        found.push(
          atStep(
            step,
            `Step ${number} countersinks ${item.name}, whose head stands on the surface.`,
            'Leave the countersink out, or list a flat head.',
          ),
        );
      return found;
    }),
};

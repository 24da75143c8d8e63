import { usual } from '../../../trade/shop.data';
import { mm, sizeOf } from '../actions';
import { type Finding, type Place, type Rule } from '../rule';

type Range = readonly [number, number];

export const dimsUnlikely: Rule = {
  id: 'dims/unlikely',
  level: 'should',
  source: 'common practice, no source: 18 in plywood and 3/4 mm screws are slips of the unit',
  run: ({ document, model }) => {
    const found: Finding[] = [];
    const worked = model();
    const look = (x: number | null, [low, high]: Range, place: Place, says: string) => {
      if (x === null || (x >= low && x <= high)) return;
      const figure = x < 10 ? x.toFixed(2) : x.toFixed(1);
      found.push({
        place,
        message: `${says.replace('#', `${figure} mm`)}`,
        cure: 'Look at the unit.',
      });
    };
    for (const s of document.stock) {
      const place: Place = { in: 'stock', elementId: s.id };
      if (s.form === 'sheet' || s.form === 'board')
        look(mm(worked, s.thickness), usual[s.form], place, `${s.name} would be # thick.`);
      look(mm(worked, s.kerf), usual.kerf, place, `The kerf in ${s.name} would be #.`);
    }
    for (const h of document.hardware)
      if ((h.kind === 'screw' || h.kind === 'brad') && h.length)
        look(
          mm(worked, h.length),
          usual.screw,
          { in: 'hardware', elementId: h.id },
          `${h.name} would be # long.`,
        );
    for (const part of document.parts) {
      const place: Place = { in: 'parts', elementId: part.id };
      const { length, width } = sizeOf(worked, part);
      look(length, usual.part, place, `Part ${part.mark}, ${part.name}, would be # long.`);
      look(width, usual.part, place, `Part ${part.mark}, ${part.name}, would be # wide.`);
      for (const f of part.features)
        if (f.kind === 'hole')
          look(
            mm(worked, f.width),
            usual.hole,
            place,
            `A hole in part ${part.mark} would be # wide.`,
          );
    }
    document.steps.forEach((step, i) => {
      for (const action of step.actions)
        if (action.do === 'cut')
          look(
            mm(worked, action.bitDiameter),
            usual.bit,
            { in: 'steps', elementId: step.id },
            `The bit of step ${i + 1} would be # thick.`,
          );
    });
    return found;
  },
};

import { shankDiameter } from '../../../trade/screws';
import { type Hardware, type PlanDocument } from '../../document';
import { type PlanModel } from '../../model';
import { actionsOf, atStep, mm, sizeOf, type Placed } from '../actions';
import { type Finding, type Rule } from '../rule';
import { type Fasten } from '../../document';

/** A screw through one piece into another, in mm: nominal and with everything at its worst. */
export interface Driven extends Placed<Fasten> {
  item: Hardware;
  length: number;
  through: number;
  into: number | null;
  /** ± on length less both thicknesses. */
  slack: number;
}

function stackOf(
  model: PlanModel,
  text: string,
  fallback: number | null,
): { x: number | null; worst: number } {
  if (text.trim() === '') return { x: fallback, worst: 0 };
  const value = model.evaluate(text).value;
  return { x: value?.x ?? null, worst: value?.worst ?? 0 };
}

/** Every screw and brad whose length and stack can be worked out. */
export function drivenOf(document: PlanDocument, model: PlanModel): Driven[] {
  const thickness = (id: string | undefined) => {
    const part = document.parts.find((p) => p.id === id);
    return part ? sizeOf(model, part).thickness : null;
  };
  return actionsOf(document, 'fasten').flatMap((placed): Driven[] => {
    const { action } = placed;
    const item = document.hardware.find((h) => h.id === action.hardwareId);
    const length = item?.length ? mm(model, item.length) : null;
    if (!item || (item.kind !== 'screw' && item.kind !== 'brad') || length === null) return [];
    const through = stackOf(model, action.throughThickness, thickness(action.throughPartId));
    const into = stackOf(model, action.intoThickness, thickness(action.intoPartId));
    if (through.x === null) return [];
    return [
      {
        ...placed,
        item,
        length,
        through: through.x,
        into: into.x,
        slack: through.worst + into.worst,
      },
    ];
  });
}

export const fastenersThrough: Rule = {
  id: 'fasteners/through',
  level: 'must',
  source: 'arithmetic of the stack, with its tolerances',
  run: ({ document, model }) =>
    drivenOf(document, model()).flatMap(
      ({ item, length, through, into, slack, step, number }): Finding[] => {
        if (item.through || into === null) return [];
        const out = length + slack - through - into;
        return out >= -1e-6
          ? [
              atStep(
                step,
                `In step ${number} ${item.name} comes out the far side${out > 0.05 ? ` by ${out.toFixed(1)} mm at the worst` : ''}.`,
                'Take a shorter one, or mark it as going through on purpose.',
              ),
            ]
          : [];
      },
    ),
};

/** Least bite in diameters. */
const least = 3;

export const fastenersBite: Rule = {
  id: 'fasteners/bite',
  level: 'should',
  source:
    'common practice, no source: three diameters hold a jig or a cabinet; structures ask for more (NDS)',
  run: ({ document, model }) =>
    drivenOf(document, model()).flatMap(({ item, length, through, step, number }): Finding[] => {
      const diameter = item.gauge && item.series ? shankDiameter(item.gauge, item.series) : null;
      const bite = length - through;
      if (bite <= 0)
        return [
          atStep(
            step,
            `In step ${number} ${item.name} does not reach the second piece.`,
            'Take a longer one.',
          ),
        ];
      return diameter !== null && bite < least * diameter - 1e-6
        ? [
            atStep(
              step,
              `In step ${number} ${item.name} bites only ${bite.toFixed(0)} mm in the second piece.`,
              `Give it ${(least * diameter).toFixed(0)} mm, ${least} times its diameter, or more.`,
            ),
          ]
        : [];
    }),
};

export const fastenersPilot: Rule = {
  id: 'fasteners/pilot',
  level: 'should',
  source: 'Wood Handbook ch. 8 (lead holes 70 % and 90 % of root diameter), from memory',
  run: ({ document }) =>
    actionsOf(document, 'fasten').flatMap(({ action, step, number }): Finding[] => {
      const item = document.hardware.find((h) => h.id === action.hardwareId);
      return item?.kind === 'screw' && action.pilot === ''
        ? [
            atStep(
              step,
              `Step ${number} drives ${item.name} and says nothing of a pilot hole.`,
              'Give the pilot, or answer “none needed”.',
            ),
          ]
        : [];
    }),
};

/** Air between a saw path and a screw on each side, mm; half a kerf comes on top. */
const air = 3;

export const fastenersInCut: Rule = {
  id: 'fasteners/in-cut',
  level: 'must',
  source: 'common practice, no source: a blade that meets a screw throws teeth',
  run: ({ document, model }) =>
    actionsOf(document, 'fasten').flatMap(({ action, step, number }): Finding[] => {
      const at = mm(model(), action.x);
      const path = mm(model(), action.clearOfCut);
      if (at === null || path === null) return [];
      const kerf = Math.max(3.2, ...document.stock.map((s) => mm(model(), s.kerf) ?? 0));
      return Math.abs(at - path) < kerf / 2 + air
        ? [
            atStep(
              step,
              `A fastener of step ${number} lies in the path of the saw.`,
              `Move it at least ${(kerf / 2 + air).toFixed(1)} mm from the middle of the cut.`,
            ),
          ]
        : [];
    }),
};

import { z } from 'zod';
import { movementCoefficients } from '../trade/movement.data';
import { refused, type Outcome, type Refused } from './outcome';

/** The woods of the handbook's table, and one of the person's own with its shrinkage. */
export const woodNames = [...movementCoefficients.map(({ wood }) => wood), 'other'] as const;
const knownWoods = new Set<string>(woodNames);

/** Wood, cut, and for another wood its total shrinkage: what the aids about movement ask. */
export const woodFields = {
  wood: z.string().refine((wood) => knownWoods.has(wood), {
    message: 'This wood is not in the handbook’s table. Choose other and give its shrinkage.',
  }),
  cut: z.enum(['flat', 'quarter']),
  /** For another wood: shrinkage from green to oven-dry in that direction, %. */
  shrinkage: z.number().optional(),
};

/** Moisture contents between which the linear form holds, %. */
export const movementDomain = [6, 14] as const;
/** The linear form's own error, as a share of the change (Wood Handbook ch. 13, read). */
export const linearShare = 0.05;
/** Percent of moisture at which shrinkage starts, general value (reproduces 13 read pairs). */
const fibreSaturation = 30;
const shrinkageDomain = [1, 15] as const;

/** C from total shrinkage S in percent: 1/(100 f/S − (f − 10)), f = 30 (derived; reproduces the handbook's pairs). */
export const coefficientFromShrinkage = (shrinkage: number, f: number = fibreSaturation): number =>
  1 / ((100 * f) / shrinkage - (f - 10));

/** The coefficient of a wood and cut, or why there is none. */
export function coefficientFor(input: {
  wood: string;
  cut: 'flat' | 'quarter';
  shrinkage?: number;
}): Outcome<number> {
  const row = movementCoefficients.find(({ wood }) => wood === input.wood);
  if (row) return { ok: true, result: input.cut === 'flat' ? row.tangential : row.radial };
  const [least, most] = shrinkageDomain;
  const { shrinkage } = input;
  if (shrinkage === undefined)
    return refused(
      'shrinkage',
      'This wood is not in the handbook’s table.',
      'Give its shrinkage from green to oven-dry across this cut, or choose a wood like it.',
    );
  if (!(shrinkage >= least && shrinkage <= most))
    return refused(
      'shrinkage',
      `Woods shrink ${least} to ${most} % from green to oven-dry.`,
      'Look the figure up again.',
    );
  return { ok: true, result: coefficientFromShrinkage(shrinkage) };
}

/** Refuses a moisture content outside 6 to 14 %, where the handbook's linear form stops. */
export function moistureRange(moisture: number, field: string): Refused | null {
  const [least, most] = movementDomain;
  if (moisture >= least && moisture <= most) return null;
  return refused(
    field,
    `The handbook’s rule holds from ${least} to ${most} % moisture.`,
    'Let the wood come nearer to the room first; outside it nothing sure can be said.',
  );
}

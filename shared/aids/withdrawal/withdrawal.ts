import { z } from 'zod';
import {
  allowableWithdrawal,
  gravityDomain,
  leastPenetration,
  triedGauges,
  ultimateWithdrawal,
} from '../../trade/withdrawal';
import { defineAid } from '../aid';
import { refused, type Outcome, type Refused } from '../outcome';

export const withdrawalInput = z.object({
  fastener: z.enum(['screw', 'nail']),
  /** Oven-dry specific gravity of the piece it bites into. */
  gravity: z.number(),
  /** Shank, mm. */
  diameter: z.number(),
  /** Thread (screw) or nail in the main piece, mm. */
  bite: z.number().positive().max(500),
  grain: z.enum(['side', 'end']),
  /** US number and whole length in mm: checks that the equation was tried for such a screw. */
  number: z.number().optional(),
  length: z.number().positive().max(500).optional(),
});

export interface WithdrawalResult {
  /** N at which it pulls out on average. */
  ultimate: number;
  /** N, reference value before the code's own factors. */
  allowable: number;
  /** How many times the one is the other. */
  ratio: number;
}

const inch = 25.4;
/** Shanks the equations are used for, mm: screws No. 0 to 24, nails 17 gauge to 20d. */
const diameters = {
  screw: [0.06 * inch, 0.372 * inch],
  nail: [0.054 * inch, 0.192 * inch],
} as const;

function untried(number: number, length: number): Refused | null {
  // A length between two of the table goes by the shorter: its gauges were tried for both sides of it or not at all.
  const row = triedGauges.filter(({ inches }) => inches * inch <= length + 1e-6).at(-1);
  const longest = triedGauges.at(-1);
  if (
    row &&
    longest &&
    length <= longest.inches * inch + 1e-6 &&
    number >= row.from &&
    number <= row.to
  )
    return null;
  return refused(
    'number',
    row
      ? `Screws of this length were tried in numbers ${row.from} to ${row.to}, up to 3 in long.`
      : 'The equation was tried for screws from 1/2 in long.',
    'Take a screw inside the range, or a tested load of its maker.',
  );
}

/** Pull-out of a screw or nail: the ultimate load and, apart from it, the allowable reference. */
export function workWithdrawal(input: z.output<typeof withdrawalInput>): Outcome<WithdrawalResult> {
  const { fastener, gravity, diameter, bite, number, length } = input;
  if (input.grain === 'end')
    return refused(
      'grain',
      'Screws and nails are not loaded in withdrawal from end grain.',
      'Turn the joint so that it pulls out of side grain, or use another joint.',
    );
  const [lightest, heaviest] = gravityDomain;
  if (!(gravity >= lightest && gravity <= heaviest))
    return refused(
      'gravity',
      `The design tables run from specific gravity ${lightest} to ${heaviest}.`,
      'Look the wood’s specific gravity up; it has no unit.',
    );
  const [thinnest, thickest] = diameters[fastener];
  if (!(diameter >= thinnest - 1e-9 && diameter <= thickest + 1e-9))
    return refused(
      'diameter',
      `The equation is for ${fastener}s of ${thinnest.toFixed(2)} to ${thickest.toFixed(2)} mm.`,
      'Give the shank’s diameter.',
    );
  if (bite < leastPenetration * diameter)
    return refused(
      'bite',
      `Less than ${leastPenetration} diameters of bite: no load can be counted on.`,
      'Use a longer or thinner one.',
    );
  if (fastener === 'screw' && number !== undefined && length !== undefined) {
    const fault = untried(number, length);
    if (fault) return fault;
  }
  const ultimate = ultimateWithdrawal(fastener, gravity, diameter, bite);
  const allowable = allowableWithdrawal(fastener, gravity, diameter, bite);
  return { ok: true, result: { ultimate, allowable, ratio: ultimate / allowable } };
}

/** The aid "Pull-out of a screw or nail". */
export const withdrawalAid = defineAid({
  id: 'withdrawal',
  title: 'Pull-out of a screw or nail',
  what: 'What it pulls out at, and apart from it what a design may count on.',
  sources:
    'Ultimate: USDA Wood Handbook ch. 8 (screws from memory, nails by FPL notes). Allowable: NDS reference values before the code’s own factors.',
  caution:
    'Nothing over people’s heads hangs on these figures: ask whoever is licensed to say, and the fastener’s maker.',
  example: { fastener: 'screw', gravity: 0.5, diameter: 4.17, bite: 30, grain: 'side' },
  input: withdrawalInput,
  work: workWithdrawal,
});

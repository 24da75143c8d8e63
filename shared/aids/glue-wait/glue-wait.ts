import { z } from 'zod';
import { clampPressure, glueFamilies, type Span } from '../../trade/glue.data';
import { defineAid } from '../aid';
import { refused, type Outcome } from '../outcome';

const minutes = z.number().positive().max(20_160).optional();

export const glueWaitInput = z.object({
  family: z.string().max(40),
  /** The joint is sprung, bent or loaded in its clamps. */
  stressed: z.boolean().default(false),
  /** Shop, wood and glue, °C. */
  celsius: z.number(),
  /** The label's own figures, minutes and °C; each one left out is filled with a placeholder. */
  label: z
    .object({ open: minutes, clamp: minutes, cure: minutes, least: z.number().optional() })
    .default({}),
  /** Minutes the person needs to bring it together. */
  assembly: z.number().min(0).max(1_440).optional(),
  /** Glued face, mm, and the wood: for the clamps. */
  faceLength: z.number().positive().max(10_000).optional(),
  faceWidth: z.number().positive().max(10_000).optional(),
  wood: z.enum(['soft', 'medium', 'hard']).default('medium'),
});

export interface Wait {
  low: number;
  high: number;
  /** `label`: the person's own figure. `placeholder`: ours, to be replaced. */
  from: 'label' | 'placeholder';
}

export interface GlueWaitResult {
  open: Wait;
  clamp: Wait;
  cure: Wait;
  least: { celsius: number; from: Wait['from'] };
  /** Whether the assembly fits into the open time. */
  assembly: 'fits' | 'may-not' | 'too-long' | null;
  /** Kilonewtons over the whole face; null where the family wants no such pressure or no area is given. */
  force: Span | null;
  mark: string;
}

const pressed = new Set(['pva-white', 'pva-yellow', 'polyurethane']);

/** The waits of a glued joint by the label's figures, with marked placeholders where the label's are not given. */
export function workGlueWait(input: z.output<typeof glueWaitInput>): Outcome<GlueWaitResult> {
  const family = glueFamilies.find(({ id }) => id === input.family);
  if (!family)
    return refused('family', 'This family of glue is not in the table.', 'Use the label alone.');
  const { label, celsius, assembly, faceLength, faceWidth } = input;
  const area =
    faceLength !== undefined && faceWidth !== undefined ? faceLength * faceWidth : undefined;
  const least = label.least ?? family.least;
  if (!(celsius >= -50 && celsius <= 60))
    return refused('celsius', 'A shop between −50 and 60 °C is expected.', 'Check the unit.');
  if (celsius < least)
    return refused(
      'celsius',
      `Too cold: this glue wants ${least} °C or more${label.least === undefined ? ' (placeholder; the label decides)' : ''}.`,
      'Warm wood, glue and shop first; below it a water-borne film dries chalky and weak.',
    );
  const wait = (own: number | undefined, [low, high]: Span): Wait =>
    own === undefined ? { low, high, from: 'placeholder' } : { low: own, high: own, from: 'label' };
  const open = wait(label.open, family.open);
  const byStress = input.stressed ? (family.clampStressed ?? family.clamp) : family.clamp;
  const force =
    area !== undefined && pressed.has(family.id)
      ? (clampPressure[input.wood].map((mpa) => (mpa * area) / 1000) as [number, number])
      : null;
  return {
    ok: true,
    result: {
      open,
      clamp: wait(label.clamp, byStress),
      cure: wait(label.cure, family.cure),
      least: { celsius: least, from: label.least === undefined ? 'placeholder' : 'label' },
      assembly:
        assembly === undefined
          ? null
          : assembly <= open.low
            ? 'fits'
            : assembly <= open.high
              ? 'may-not'
              : 'too-long',
      force,
      mark: family.mark,
    },
  };
}

/** The aid "Waits of glue". */
export const glueWaitAid = defineAid({
  id: 'glue-wait',
  title: 'Waits of glue',
  what: 'How long it stays open, in the clamps, and off its load.',
  sources:
    'Placeholders from makers’ guides and from memory until the label’s own figures stand there; clamp pressure read in a guide.',
  caution:
    'Read the label: skin, eyes, fresh air. Solvents and some hardeners want gloves and no flame.',
  example: { family: 'pva-yellow', celsius: 20, label: {} },
  input: glueWaitInput,
  work: workGlueWait,
});

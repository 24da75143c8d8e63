import { z } from 'zod';
import { movement } from '../../trade/movement';
import { defineAid } from '../aid';
import { refused, type Outcome } from '../outcome';
import { coefficientFor, moistureRange, linearShare, woodFields } from '../wood';

export const woodMovementInput = z.object({
  ...woodFields,
  /** Width (or thickness) across the grain now, mm. */
  width: z.number().positive().max(10_000),
  /** Moisture content now and later, %. */
  from: z.number(),
  to: z.number(),
  /** How sure each moisture content is, percent points. */
  moistureUncertainty: z.number().min(0).max(5).default(1),
});

export interface WoodMovementResult {
  coefficient: number;
  /** mm; below zero it shrinks. */
  change: number;
  /** mm either way. */
  uncertainty: number;
  after: number;
}

/** How much a board moves across the grain from one moisture content to another (Wood Handbook Eq. 13–2). */
export function workWoodMovement(
  input: z.output<typeof woodMovementInput>,
): Outcome<WoodMovementResult> {
  const found = coefficientFor(input);
  if (!found.ok) return found;
  const { width, from, to } = input;
  const outside = moistureRange(from, 'from') ?? moistureRange(to, 'to');
  if (outside) return outside;
  const change = movement(width, found.result, from, to);
  const byMoisture = movement(width, found.result, 0, input.moistureUncertainty) * Math.SQRT2;
  if (width + change <= 0)
    return refused('width', 'Nothing would be left of it.', 'Look at the figures again.');
  return {
    ok: true,
    result: {
      coefficient: found.result,
      change,
      uncertainty: Math.hypot(linearShare * change, byMoisture),
      after: width + change,
    },
  };
}

/** The aid "Wood movement". */
export const woodMovementAid = defineAid({
  id: 'wood-movement',
  title: 'Wood movement',
  what: 'How much a board grows or shrinks across the grain.',
  sources:
    'USDA Wood Handbook FPL-GTR-190, Eq. 13–2 and Table 13–5, 6 to 14 % moisture; some softwoods computed, redwood, white pine, teak and mahogany from memory.',
  example: { wood: 'cherry', cut: 'flat', width: 300, from: 8, to: 12 },
  input: woodMovementInput,
  work: workWoodMovement,
});

import { z } from 'zod';
import { gravitySpread, specificGravity } from '../../trade/gravity.data';
import { woodDensity } from '../../trade/lumber';
import { twoPeopleLift } from '../../trade/shop.data';
import { defineAid } from '../aid';
import { refused, type Outcome } from '../outcome';

export const woodWeightInput = z.object({
  wood: z.string().max(40),
  /** For another wood: specific gravity at about 12 % moisture. */
  gravity: z.number().optional(),
  /** Moisture content, %. */
  moisture: z.number().default(12),
  /** Dressed sizes, mm. */
  thickness: z.number().positive().max(1_000),
  width: z.number().positive().max(5_000),
  length: z.number().positive().max(20_000),
  count: z.number().int().min(1).max(10_000).default(1),
});

export interface WoodWeightResult {
  /** kg/m³. */
  density: number;
  /** kg, of one and of all, and how much either way. */
  each: number;
  all: number;
  uncertainty: number;
  twoPeople: boolean;
}

/** Specific gravities of wood, from balsa to lignum vitae. */
const gravities = [0.1, 1.3] as const;
/** About the gravity at 12 %: below this the wood is as good as measured, above it swells little more. */
const moistures = [0, 30] as const;

/** Mass of solid wood from its specific gravity, moisture and size. */
export function workWoodWeight(input: z.output<typeof woodWeightInput>): Outcome<WoodWeightResult> {
  const gravity = input.wood === 'other' ? input.gravity : specificGravity[input.wood];
  if (gravity === undefined)
    return refused(
      input.wood === 'other' ? 'gravity' : 'wood',
      'The specific gravity of this wood is not known here.',
      'Choose other and give it, or weigh a piece.',
    );
  if (!(gravity >= gravities[0] && gravity <= gravities[1]))
    return refused('gravity', 'Specific gravity of wood runs from 0.1 to 1.3.', 'It has no unit.');
  const { moisture } = input;
  if (!(moisture >= moistures[0] && moisture <= moistures[1]))
    return refused(
      'moisture',
      'From 0 to 30 % moisture; wetter wood holds free water and can weigh twice as much.',
      'Weigh a piece instead.',
    );
  const density = woodDensity(gravity, moisture);
  const each = (density * input.thickness * input.width * input.length) / 1e9;
  return {
    ok: true,
    result: {
      density,
      each,
      all: each * input.count,
      uncertainty: each * input.count * gravitySpread,
      twoPeople: each > twoPeopleLift,
    },
  };
}

/** The aid "Weight of wood". */
export const woodWeightAid = defineAid({
  id: 'wood-weight',
  title: 'Weight of wood',
  what: 'What a piece or a pile weighs.',
  sources:
    'USDA Wood Handbook FPL-GTR-190 ch. 4 and Table 5–3, from memory; pieces of one species differ by a tenth.',
  caution: 'Over 25 kg two people lift (common practice, no source).',
  example: { wood: 'white oak', thickness: 50, width: 200, length: 2000 },
  input: woodWeightInput,
  work: workWoodWeight,
});

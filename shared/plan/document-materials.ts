import { z } from 'zod';
import { limits } from '../api/limits';
import {
  disclosures,
  elementId,
  expression,
  grains,
  sentence,
  shortName,
  webUrl,
} from './document-values';

export const stockSchema = z.object({
  id: elementId,
  name: shortName,
  form: z.enum(['sheet', 'board', 'strip', 'rod']),
  /** What it is made of, e.g. birch plywood, red oak. */
  material: shortName.default(''),
  /** Symbol or expression of the actual thickness (diameter of a rod); usually a taken dimension. */
  thickness: expression,
  /** Sizes on sale. */
  sizes: z
    .array(
      z.object({
        id: elementId,
        length: expression,
        width: expression.default(''),
        price: z.number().min(0).max(1_000_000).optional(),
      }),
    )
    .default([]),
  /** How many of its first size the plan counts on. */
  quantity: z.number().min(0).max(1000).default(1),
  grained: z.boolean().default(false),
  kerf: expression.default(''),
  note: sentence.default(''),
});
export type Stock = z.infer<typeof stockSchema>;

/** Position and size of what is cut into a part's face, from its lower left corner. */
export const featureSchema = z.object({
  id: elementId,
  kind: z.enum(['hole', 'groove', 'dado', 'rabbet', 'chamfer', 'notch', 'slot']),
  name: shortName.default(''),
  x: expression.default('0'),
  y: expression.default('0'),
  /** Diameter of a hole; width of a groove or rabbet. */
  width: expression,
  /** Along which it runs (groove, dado, rabbet, slot); empty for the full run. */
  length: expression.default(''),
  /** Empty for through. */
  depth: expression.default(''),
  along: z.enum(['length', 'width']).default('length'),
  face: z.enum(['front', 'back', 'left', 'right', 'top', 'bottom']).default('front'),
});
export type Feature = z.infer<typeof featureSchema>;

export const partSchema = z.object({
  id: elementId,
  /** A, B … AA. */
  mark: z.string().max(4),
  name: shortName,
  quantity: z.number().int().min(1).max(1000).default(1),
  length: expression,
  width: expression,
  /** Empty: the stock's. */
  thickness: expression.default(''),
  layers: z.array(shortName).default([]),
  stockId: elementId.optional(),
  grain: z.enum(grains).default('free'),
  role: z.enum(['part', 'spare', 'test-piece', 'helper']).default('part'),
  /** Allowance for rough sizes, each way. */
  allowance: expression.default(''),
  features: z.array(featureSchema).default([]),
  note: sentence.default(''),
});
export type Part = z.infer<typeof partSchema>;

export const hardwareSchema = z.object({
  id: elementId,
  kind: z.enum(['screw', 'bolt', 'brad', 'hinge', 'slide', 'castor', 'magnet', 'other']),
  name: shortName,
  quantity: z.number().int().min(1).max(10_000).default(1),
  /** Screws and brads. */
  series: z.enum(['us', 'british', 'metric']).optional(),
  gauge: shortName.optional(),
  diameter: expression.optional(),
  length: expression.optional(),
  head: shortName.optional(),
  packOf: z.number().int().min(1).max(10_000).optional(),
  price: z.number().min(0).max(1_000_000).optional(),
  /** Comes out the far side on purpose. */
  through: z.boolean().default(false),
  note: sentence.default(''),
});
export type Hardware = z.infer<typeof hardwareSchema>;

export const consumableSchema = z.object({
  id: elementId,
  kind: z.enum(['glue', 'finish', 'abrasive', 'other']),
  name: shortName,
  amount: shortName.default(''),
  /** As the label says, minutes. */
  open: z.number().min(0).optional(),
  clamp: z.number().min(0).optional(),
  cure: z.number().min(0).optional(),
  note: sentence.default(''),
});
export type Consumable = z.infer<typeof consumableSchema>;

export const machineClasses = [
  'table-saw',
  'track-saw',
  'circular-saw',
  'mitre-saw',
  'bandsaw',
  'jigsaw',
  'router',
  'router-table',
  'drill',
  'drill-press',
  'jointer',
  'planer',
  'sander',
  'lathe',
  'grinder',
  'hand-tool',
] as const;
export type MachineClass = (typeof machineClasses)[number];

export const toolSchema = z.object({
  id: elementId,
  machine: z.enum(machineClasses),
  name: shortName,
  /** What it must be able to do, e.g. cut depth needed. */
  needs: z
    .array(
      z.object({
        limit: z.enum(['depth-of-cut', 'rip', 'crosscut', 'throat', 'reach', 'slot-width']),
        atLeast: expression,
      }),
    )
    .default([]),
  needed: z.boolean().default(true),
  /** "Instead you can …". */
  instead: sentence.default(''),
});
export type Tool = z.infer<typeof toolSchema>;

export const linkSchema = z.object({
  id: elementId,
  title: shortName,
  url: webUrl,
  disclosure: z.enum(disclosures).optional(),
  onSale: z.boolean().default(true),
  note: sentence.default(''),
});
export type PlanLink = z.infer<typeof linkSchema>;

export const creditSchema = z.object({
  id: elementId,
  text: z.string().max(limits.note),
  url: z.union([webUrl, z.literal('')]).default(''),
});
export type Credit = z.infer<typeof creditSchema>;

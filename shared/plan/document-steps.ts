import { z } from 'zod';
import { limits } from '../api/limits';
import { elementId, expression, minutes, seconds, sentence, shortName } from './document-values';
import { heardSchema } from './document-dimensions';
import { machineClasses } from './document-materials';

export const cutKinds = [
  'through-rip',
  'through-crosscut',
  'sheet-breakdown',
  'groove',
  'dado',
  'rabbet',
  'plunge',
  'raised-blade',
  'drilling',
  'routing',
  'planing',
  'jointing',
  'band-sawing',
  'mitre-cut',
  'sanding',
] as const;
export type CutKind = (typeof cutKinds)[number];
export const guardItems = [
  'blade-guard',
  'riving-knife',
  'splitter',
  'anti-kickback',
  'hood',
  'fence-cover',
] as const;
export type GuardItem = (typeof guardItems)[number];

const cutSchema = z.object({
  id: elementId,
  do: z.literal('cut'),
  machine: z.enum(machineClasses),
  kind: z.enum(cutKinds),
  partIds: z.array(elementId).default([]),
  /** Size of the work on the machine; empty when the parts say it. */
  length: expression.default(''),
  width: expression.default(''),
  depth: expression.default(''),
  /** How it is held or fed: hold-downs, push sticks, clamps, feather boards, a jig. */
  heldBy: z
    .array(
      z.enum([
        'hand',
        'push-stick',
        'push-block',
        'feather-board',
        'hold-down',
        'clamp',
        'jig',
        'fence',
        'mitre-gauge',
        'vice',
        'tunnel',
        'tape',
        'helper-person',
      ]),
    )
    .default([]),
  /** What covers the place where the blade comes out, and what stops the jig. */
  exitCover: sentence.default(''),
  exitStop: sentence.default(''),
  /** Replaces the machine's guard where it cannot pass. */
  guardInstead: sentence.default(''),
  lengthStop: z.enum(['none', 'rip-fence', 'stand-off-block', 'stop-block']).default('none'),
  /** Both sides of the piece touch something while the blade is between them. */
  trapped: z.boolean().default(false),
  waitsForBlade: z.boolean().optional(),
  feedAgainstRotation: z.boolean().optional(),
  depthPerPass: expression.default(''),
  bitDiameter: expression.default(''),
  rpm: z.number().min(0).max(60_000).optional(),
  /** A cut free piece: both halves held. */
  offcutHeld: z.boolean().optional(),
  /** The dado head is asked for; a shop without one gets the router. */
  dadoHead: z.boolean().default(false),
});
export type Cut = z.infer<typeof cutSchema>;

const guardSchema = z.object({
  id: elementId,
  do: z.literal('guard'),
  machine: z.enum(machineClasses),
  item: z.enum(guardItems),
  to: z.enum(['off', 'lowered', 'back-on']),
});
export type GuardChange = z.infer<typeof guardSchema>;

const powerSchema = z.object({
  id: elementId,
  do: z.literal('power'),
  machine: z.enum(machineClasses),
  isolated: z.boolean(),
  touches: z.enum(['blade', 'bit', 'guard', 'setting']).default('blade'),
});
export type PowerState = z.infer<typeof powerSchema>;

const fastenSchema = z.object({
  id: elementId,
  do: z.literal('fasten'),
  hardwareId: elementId,
  quantity: z.number().int().min(1).max(1000).default(1),
  /** First the part under the head, then the one it bites in. */
  throughPartId: elementId.optional(),
  intoPartId: elementId.optional(),
  /** Thickness it goes through, and depth available behind it; empty: the parts' thicknesses. */
  throughThickness: expression.default(''),
  intoThickness: expression.default(''),
  pilot: z.union([z.literal('none-needed'), expression]).default(''),
  clearance: expression.default(''),
  countersink: z.boolean().default(false),
  /** Position on the part, and the saw path it must stay clear of. */
  x: expression.default(''),
  y: expression.default(''),
  clearOfCut: expression.default(''),
  acrossGrain: z.boolean().default(false),
});
export type Fasten = z.infer<typeof fastenSchema>;

const glueSchema = z.object({
  id: elementId,
  do: z.literal('glue'),
  consumableId: elementId.optional(),
  partIds: z.array(elementId).default([]),
  acrossGrain: z.boolean().default(false),
});
export type Glue = z.infer<typeof glueSchema>;

const finishSchema = z.object({
  id: elementId,
  do: z.literal('finish'),
  consumableId: elementId.optional(),
  oily: z.boolean().default(false),
  solvent: z.boolean().default(false),
});

const mountSchema = z.object({
  id: elementId,
  do: z.literal('mount'),
  /** Load on the wall, kilograms. */
  kg: z.number().min(0).max(10_000).optional(),
  intoStructure: z.boolean().default(false),
  servicesLookedFor: z.boolean().default(false),
  liftingHelp: z.boolean().default(false),
});

export const actionSchema = z.discriminatedUnion('do', [
  cutSchema,
  guardSchema,
  powerSchema,
  fastenSchema,
  glueSchema,
  finishSchema,
  mountSchema,
]);
export type Action = z.infer<typeof actionSchema>;

export const cautionSchema = z.object({
  id: elementId,
  text: sentence,
  level: z.enum(['danger', 'care']).default('care'),
  at: seconds.optional(),
});
export type Caution = z.infer<typeof cautionSchema>;

export const waitSchema = z.object({
  id: elementId,
  minutes: minutes,
  what: shortName.default(''),
  /** May the next step start before it is over? */
  nextMayStart: z.boolean().default(false),
  kind: z.enum(['clamp', 'cure', 'dry', 'other']).default('other'),
});
export type Wait = z.infer<typeof waitSchema>;

export const stepSchema = z.object({
  id: elementId,
  title: z.string().max(limits.title),
  /** Markdown; `{{dim:ID}}` and `{{part:ID}}` are references. */
  text: z.string().max(limits.stepText).default(''),
  phase: z.enum(['build', 'demo', 'aside']).default('build'),
  stretches: z.array(z.object({ start: seconds, end: seconds })).default([]),
  photoIds: z.array(elementId).default([]),
  parts: z
    .array(z.object({ partId: elementId, to: z.enum(['roughed', 'sized', 'shaped', 'used']) }))
    .default([]),
  takes: z.array(elementId).default([]),
  holds: z.array(elementId).default([]),
  checks: z.array(elementId).default([]),
  cautions: z.array(cautionSchema).default([]),
  waits: z.array(waitSchema).default([]),
  after: z.array(elementId).default([]),
  loadsJoint: z.boolean().default(false),
  people: z.number().int().min(1).max(20).default(1),
  handsOn: minutes.default(0),
  actions: z.array(actionSchema).default([]),
  toolIds: z.array(elementId).default([]),
  heard: z.array(heardSchema).default([]),
  /** Standing lines the product writes (eye, ear, dust; no gloves) that the creator took out, by rule id. */
  withoutLines: z.array(z.string().max(60)).default([]),
});
export type Step = z.infer<typeof stepSchema>;

export const flowSchema = z.discriminatedUnion('kind', [
  z.object({
    id: elementId,
    kind: z.literal('repeat'),
    fromStepId: elementId,
    toStepId: elementId,
    untilCheckId: elementId,
    atMost: z.number().int().min(1).max(50),
  }),
  z.object({
    id: elementId,
    kind: z.literal('alternatives'),
    name: shortName,
    groups: z
      .array(
        z.object({
          id: elementId,
          name: shortName,
          stepIds: z.array(elementId),
          machine: z.enum(machineClasses).optional(),
        }),
      )
      .min(2),
  }),
]);
export type Flow = z.infer<typeof flowSchema>;

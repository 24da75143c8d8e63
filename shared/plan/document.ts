import { z } from 'zod';
import { limits } from '../api/limits';
import { checkSchema, dimensionSchema, photoSchema } from './document-dimensions';
import {
  consumableSchema,
  creditSchema,
  hardwareSchema,
  linkSchema,
  partSchema,
  stockSchema,
  toolSchema,
} from './document-materials';
import { flowSchema, stepSchema } from './document-steps';
import { elementId, expression, mediaHash, seconds, sentence, webUrl } from './document-values';

/** The version of the document's shape; older ones are upgraded on reading. */
export const documentVersion = 1;

/** Where the footage is. A hosted one is only an address and its time codes. */
export const clipSchema = z.discriminatedUnion('source', [
  z.object({ source: z.literal('none') }),
  z.object({
    source: z.literal('upload'),
    media: mediaHash,
    duration: seconds,
    poster: mediaHash.optional(),
    captions: mediaHash.optional(),
  }),
  z.object({
    source: z.literal('hosted'),
    url: webUrl,
    duration: seconds,
    captions: mediaHash.optional(),
    /** Proved to be the maker's own. */
    claimed: z.boolean().default(false),
  }),
]);
export type Clip = z.infer<typeof clipSchema>;

/**
 * A plan as one document: what a draft stores, a revision freezes and an export carries. Lists keep the
 * creator's order. Every element has an id that survives edits, revisions, export and import.
 */
export const planDocumentSchema = z.object({
  scantling: z.literal(documentVersion),
  id: elementId,
  title: z.string().max(limits.title),
  summary: z.string().max(limits.summary).default(''),
  units: z.enum(['mm', 'in']),
  terms: z.enum(['us', 'uk']).default('us'),
  category: z
    .enum(['jig', 'bench-aid', 'storage', 'furniture', 'toy', 'garden', 'other'])
    .default('other'),
  skill: z.enum(['first', 'some', 'practised']).default('some'),
  /** Size over all; expressions. */
  size: z.object({ length: expression, width: expression, height: expression }).optional(),
  licence: z
    .object({ build: z.boolean(), sell: z.boolean(), teach: z.boolean() })
    .default({ build: true, sell: false, teach: false }),
  cover: mediaHash.optional(),
  coverAlt: z.string().max(limits.note).default(''),
  clip: clipSchema.default({ source: 'none' }),
  credits: z.array(creditSchema).max(limits.listItems).default([]),
  dimensions: z.array(dimensionSchema).max(limits.dimensions).default([]),
  checks: z.array(checkSchema).max(limits.dimensions).default([]),
  stock: z.array(stockSchema).max(limits.listItems).default([]),
  parts: z.array(partSchema).max(limits.parts).default([]),
  hardware: z.array(hardwareSchema).max(limits.listItems).default([]),
  consumables: z.array(consumableSchema).max(limits.listItems).default([]),
  tools: z.array(toolSchema).max(limits.listItems).default([]),
  links: z.array(linkSchema).max(limits.listItems).default([]),
  photos: z.array(photoSchema).max(limits.listItems).default([]),
  steps: z.array(stepSchema).max(limits.steps).default([]),
  flow: z.array(flowSchema).max(limits.listItems).default([]),
  /** Rules switched off (should) with the reason; for one element or the whole plan. */
  switchedOff: z
    .array(
      z.object({
        rule: z.string().max(60),
        elementId: elementId.optional(),
        reason: sentence.min(1),
      }),
    )
    .default([]),
  /** Texts the creator said are names, not figures (loose figures). */
  names: z.array(z.string().max(80)).default([]),
});
export type PlanDocument = z.infer<typeof planDocumentSchema>;
export type PlanDocumentInput = z.input<typeof planDocumentSchema>;

/** A new, empty plan. */
export function emptyPlan(id: string, title: string, units: PlanDocument['units']): PlanDocument {
  return planDocumentSchema.parse({ scantling: documentVersion, id, title, units });
}

export * from './document-values';
export * from './document-dimensions';
export * from './document-materials';
export * from './document-steps';

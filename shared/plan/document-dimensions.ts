import { z } from 'zod';
import { limits } from '../api/limits';
import {
  elementId,
  exactLength,
  expression,
  instruments,
  kinds,
  mediaHash,
  origins,
  seconds,
  senses,
  sentence,
  shortName,
  tolerance,
} from './document-values';

/** Symbols as expressions use them: a letter, then letters, digits, underscores. */
export const symbolPattern = /^[A-Za-z][A-Za-z0-9_]*$/;

export const dimensionSchema = z.object({
  id: elementId,
  name: shortName,
  symbol: z.string().max(limits.symbol),
  kind: z.enum(kinds).default('length'),
  origin: z.enum(origins),
  /** given: the value · taken: the creator's own reading, the stand-in · derived: over other symbols. */
  expression: expression,
  tolerance: tolerance.default({ form: 'none' }),
  sense: z.enum(senses).default('outside'),
  instrument: z.enum(instruments).default('tape'),
  /** Several readings of one dimension: which of them counts. */
  counts: z.enum(['min', 'max', 'mean']).default('mean'),
  /** How many readings are asked for (both ends, three places). */
  places: z.number().int().min(1).max(12).default(1),
  /** Dimensions cut at one stop setting share its name; their errors add in line. */
  setting: shortName.optional(),
  /** For a form dimension: the length it is measured over. */
  over: expression.optional(),
  /** Where and how to measure. */
  where: sentence.default(''),
  photoId: elementId.optional(),
  at: seconds.optional(),
});
export type Dimension = z.infer<typeof dimensionSchema>;

export const fitWords = ['free', 'running', 'snug', 'tight', "won't go"] as const;
export type FitWord = (typeof fitWords)[number];

export const checkSchema = z.object({
  id: elementId,
  name: shortName,
  /** `left < right`, `left <= right`, `left = right within band`, `between`, `fit(inner, outer, from, to)`. */
  expression: expression,
  why: sentence.default(''),
  level: z.enum(['must', 'should']).default('must'),
  asked: z.enum(['design', 'bench', 'both']).default('both'),
  /** What may answer it at the bench. */
  answeredBy: z.array(z.enum(['figures', 'trial', 'look'])).default(['figures']),
  /** For a trial or a look: what to do and against what. */
  how: sentence.default(''),
});
export type Check = z.infer<typeof checkSchema>;

export const photoSchema = z.object({
  id: elementId,
  media: mediaHash,
  alt: z.string().max(limits.note).default(''),
  marks: z
    .array(
      z.object({
        id: elementId,
        shape: z.enum(['arrow', 'dimension', 'ring']),
        /** Fractions of the picture's width and height, 0–1. */
        from: z.tuple([z.number(), z.number()]),
        to: z.tuple([z.number(), z.number()]),
        dimensionId: elementId.optional(),
        text: shortName.default(''),
      }),
    )
    .default([]),
});
export type Photo = z.infer<typeof photoSchema>;

/** A figure heard in the clip, kept from the import. */
export const heardSchema = z.object({
  id: elementId,
  at: seconds,
  words: z.string().max(300),
  value: exactLength.optional(),
  unit: z.string().max(20).default(''),
  /** The dimension it speaks of, when known. */
  dimensionId: elementId.optional(),
  /** The creator may mute the words or say that they were right on the creator's machine. */
  ruling: z.enum(['say', 'muted', 'right-on-mine']).default('say'),
});
export type Heard = z.infer<typeof heardSchema>;

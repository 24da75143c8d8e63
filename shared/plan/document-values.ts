import { z } from 'zod';
import { limits } from '../api/limits';

/**
 * Small values that the plan document is made of. An expression is text in the expression language
 * (symbols of dimensions, units on literals); a field holding only a number takes the plan's unit.
 */
export const elementId = z.uuid();
export const expression = z.string().max(limits.expression);
export const sentence = z.string().max(limits.note);
export const shortName = z.string().max(limits.name);
export const webUrl = z.url({ protocol: /^https?$/ }).max(limits.url);
export const mediaHash = z.string().regex(/^[0-9a-f]{64}$/, 'A media hash is 64 hex digits.');
export const seconds = z
  .number()
  .min(0)
  .max(24 * 3600);
export const minutes = z
  .number()
  .min(0)
  .max(60 * 24 * 60);

/** A figure as typed, and exact in millimetres as a rational (`"7239/80"` or `"18"`). */
export const exactLength = z.object({
  text: z.string().max(200),
  mm: z.string().regex(/^-?\d+(\/\d+)?$/),
});
export type ExactLength = z.infer<typeof exactLength>;

export const tolerance = z.discriminatedUnion('form', [
  z.object({ form: z.literal('none') }),
  z.object({ form: z.literal('plus-minus'), by: expression }),
  z.object({ form: z.literal('unequal'), plus: expression, minus: expression }),
  z.object({ form: z.literal('limits'), low: expression, high: expression }),
  z.object({ form: z.literal('iso2768'), class: z.enum(['f', 'm', 'c', 'v']) }),
]);
export type Tolerance = z.infer<typeof tolerance>;

export const origins = ['given', 'taken', 'derived'] as const;
export const senses = ['outside', 'inside', 'place', 'setting', 'form'] as const;
export const kinds = [
  'length',
  'area',
  'volume',
  'angle',
  'duration',
  'mass',
  'force',
  'temperature',
  'count',
  'money',
  'number',
] as const;
export const instruments = [
  'tape',
  'rule',
  'calipers',
  'micrometer',
  'square',
  'angle-gauge',
  'feeler',
  'scale',
  'eye',
] as const;
export const disclosures = ['none', 'affiliate', 'sponsored', 'own-product'] as const;
export const grains = ['length', 'width', 'free'] as const;
export type Origin = (typeof origins)[number];
export type Sense = (typeof senses)[number];
export type Kind = (typeof kinds)[number];
export type InstrumentName = (typeof instruments)[number];
export type Disclosure = (typeof disclosures)[number];
export type Grain = (typeof grains)[number];

import { z } from 'zod';
import { limits } from '../../api/limits';
import { elementId, exactLength, instruments, mediaHash } from '../document-values';

/** What every entry carries: who made it is the bench copy's owner. */
const base = z.object({
  /** The client's UUIDv7. */
  id: elementId,
  /** The step, dimension, check or wait it is about; for `acknowledge` the correction or safety note. */
  elementId: elementId,
  revisionId: elementId,
  /** Opaque id of the browser, and its own running number. */
  device: z.string().max(60),
  deviceSequence: z.number().int().min(0),
  /** Only shown; never used for order. */
  deviceTime: z.iso.datetime({ offset: true }),
  /** An earlier entry that this one takes back or corrects. */
  withdraws: elementId.optional(),
});

export const trialResults = ['fits', 'loose', "won't go"] as const;
export const lookResults = ['good', 'not-good'] as const;

/** One line of a bench copy's append-only set. Its state is a pure fold over these. */
export const entrySchema = z.discriminatedUnion('kind', [
  base.extend({ kind: z.literal('tick') }),
  base.extend({
    kind: z.literal('reading'),
    form: z.literal('figure').default('figure'),
    value: exactLength,
    instrument: z.enum(instruments),
    /** Uncertainty in millimetres, exact. */
    uncertainty: exactLength.optional(),
    place: z.string().max(80).default(''),
  }),
  base.extend({
    kind: z.literal('trial'),
    result: z.enum(trialResults),
    against: z.string().max(200).default(''),
  }),
  base.extend({
    kind: z.literal('look'),
    result: z.enum(lookResults),
    photo: mediaHash.optional(),
  }),
  base.extend({ kind: z.literal('note'), text: z.string().trim().min(1).max(limits.note) }),
  base.extend({
    kind: z.literal('photo'),
    media: mediaHash,
    alt: z.string().max(limits.note).default(''),
  }),
  base.extend({ kind: z.literal('wait-start'), startedAt: z.iso.datetime({ offset: true }) }),
  base.extend({ kind: z.literal('wait-end') }),
  base.extend({ kind: z.literal('choice'), groupId: elementId }),
  /** Read and understood: a correction or a safety note, by its id. */
  base.extend({ kind: z.literal('acknowledge') }),
  /** Takes an earlier entry back and puts nothing in its place. */
  base.extend({ kind: z.literal('withdraw'), withdraws: elementId }),
]);
export type Entry = z.infer<typeof entrySchema>;
export type EntryKind = Entry['kind'];

import { z } from 'zod';
import { subjects } from '../plan/compare/types';
import { kinds, senses } from '../plan/document-values';
import { meanings } from '../plan/notice/types';
import { id, idParams, okSchema, pageOf, pageQuery, timestamp } from './common';
import { contract } from './contract';
import { limits } from './limits';

/**
 * Kinds of notices. `safety` corrections that bear on fingers · `correction` others · `answer` to one's own words ·
 * `talk` about one's own plans.
 */
export const noticeKinds = ['safety', 'correction', 'answer', 'talk'] as const;
export type NoticeKind = (typeof noticeKinds)[number];

/** What the creator says about a correction. */
export const correctionBody = z.object({
  id,
  reason: z
    .string()
    .trim()
    .min(limits.reasonMin, 'Say in a sentence why it changes.')
    .max(limits.reason),
  safety: z.boolean().default(false),
  /** A reason of its own for single changes, by key. */
  reasons: z.record(z.string().max(80), z.string().trim().max(limits.reason)).default({}),
});
export type CorrectionBody = z.infer<typeof correctionBody>;

const nullableNumber = z.number().nullable();
const computed = z.object({ x: nullableNumber, low: nullableNumber, high: nullableNumber });
const fieldChange = z.object({
  field: z.string(),
  before: z.string(),
  after: z.string(),
  quiet: z.boolean(),
});
/** A change between two revisions, as `shared/plan/compare` gives it. */
export const changeSchema = z.object({
  key: z.string(),
  subject: z.enum(subjects),
  elementId: z.string(),
  stepId: z.string().nullable(),
  name: z.string(),
  how: z.enum(['added', 'removed', 'changed', 'follows']),
  fields: z.array(fieldChange),
  figures: z.array(
    z.object({ of: z.string(), before: computed.nullable(), after: computed.nullable() }),
  ),
  verdict: z.object({ before: z.string(), after: z.string() }).nullable(),
  because: z.array(z.string()),
  safety: z.boolean(),
});
export type ChangeView = z.infer<typeof changeSchema>;

const meaning = z.enum(meanings);
export const noticeItemSchema = z.object({
  change: changeSchema,
  means: meaning,
  cure: z.enum(['none', 'work', 'move', 'set']),
  figures: z.array(
    z.object({
      of: z.string(),
      made: z.number(),
      read: z.boolean(),
      low: z.number(),
      high: z.number(),
      off: z.number(),
      sense: z.enum(senses),
      kind: z.enum(kinds),
    }),
  ),
  needs: z.array(
    z.object({
      partId: z.string(),
      mark: z.string(),
      quantity: z.number(),
      stockId: z.string().nullable(),
      stock: z.string(),
      length: nullableNumber,
      width: nullableNumber,
      thickness: nullableNumber,
    }),
  ),
  assumed: z.boolean(),
});
export type NoticeItemView = z.infer<typeof noticeItemSchema>;
const counts = z.partialRecord(meaning, z.number().int());

/** Corrections newer than a bench copy's revision, and what the newest means for it as it stands. */
export const copyCorrectionSchema = z.object({
  revisionId: id,
  letter: z.string(),
  /** The creator's words, newest first. Each is acknowledged by its id. */
  notes: z.array(
    z.object({
      id,
      letter: z.string(),
      at: timestamp,
      reason: z.string(),
      safety: z.boolean(),
      reasons: z.record(z.string(), z.string()),
    }),
  ),
  items: z.array(noticeItemSchema),
});
export type CopyCorrection = z.infer<typeof copyCorrectionSchema>;

/** What a correction would do, before it is sent. */
export const previewSchema = z.object({
  /** Changes from the newest revision to the draft. */
  changes: z.array(changeSchema),
  copies: z.number().int(),
  /** Bench copies that would get a notice. */
  touched: z.number().int(),
  /** Touched bench copies by the worst it means there. */
  worst: counts,
  /** Per change: at how many bench copies it means what. */
  byChange: z.record(z.string(), counts),
});
export type CorrectionPreview = z.infer<typeof previewSchema>;

export const previewCorrection = contract({
  id: 'previewCorrection',
  method: 'POST',
  path: '/drafts/:planId/correction-preview',
  access: 'creator',
  limit: 'write',
  summary: 'How many bench copies the draft would touch, and how. Nothing is sent.',
  params: idParams('planId'),
  response: previewSchema,
});
export const compareLetters = contract({
  id: 'compareRevisions',
  method: 'GET',
  path: '/plans/:planId/changes',
  access: 'public',
  summary: 'Two revisions of a plan compared by meaning, with the reasons given for them.',
  params: idParams('planId'),
  query: z.object({ from: z.string().regex(/^[A-Z]{1,3}$/), to: z.string().regex(/^[A-Z]{1,3}$/) }),
  response: z.object({
    changes: z.array(changeSchema),
    notes: copyCorrectionSchema.shape.notes,
  }),
});

export const noticeSchema = z.object({
  id,
  kind: z.enum(noticeKinds),
  title: z.string(),
  text: z.string(),
  /** Where it leads, below the application's address. */
  path: z.string(),
  createdAt: timestamp,
  readAt: timestamp.nullable(),
});
export type NoticeView = z.infer<typeof noticeSchema>;

export const listNotices = contract({
  id: 'listNotices',
  method: 'GET',
  path: '/notices',
  access: 'person',
  summary: 'One’s notices, the newest first, with how many are unread.',
  query: pageQuery,
  response: pageOf(noticeSchema).extend({ unread: z.number().int() }),
});
export const readNotices = contract({
  id: 'readNotices',
  method: 'POST',
  path: '/notices/read',
  access: 'person',
  limit: 'write',
  summary: 'Mark notices as read; without ids all of them.',
  body: z.object({ ids: z.array(id).max(200).optional() }),
  response: okSchema,
});

export const noticeSettingSchema = z.object({
  kind: z.enum(noticeKinds),
  mail: z.boolean(),
  /** In the product; safety notices are always shown there. */
  product: z.boolean(),
});
export type NoticeSetting = z.infer<typeof noticeSettingSchema>;
const settings = z.object({ items: z.array(noticeSettingSchema) });
export const getNoticeSettings = contract({
  id: 'getNoticeSettings',
  method: 'GET',
  path: '/notices/settings',
  access: 'person',
  summary: 'Which kinds of notices come, and where.',
  response: settings,
});
export const saveNoticeSetting = contract({
  id: 'saveNoticeSetting',
  method: 'PUT',
  path: '/notices/settings',
  access: 'person',
  limit: 'write',
  summary: 'Turn one kind on or off.',
  body: noticeSettingSchema,
  response: settings,
});
export const unsubscribe = contract({
  id: 'unsubscribe',
  method: 'POST',
  path: '/unsubscribe',
  access: 'public',
  limit: 'write',
  summary:
    'Stop letters of the kinds a letter’s own link names (RFC 8058 one-click; the token stands for the sign-in).',
  query: z.object({ token: z.string().max(300) }),
  response: z.object({ kinds: z.array(z.enum(noticeKinds)) }),
});

export const noticeContracts = [
  previewCorrection,
  compareLetters,
  listNotices,
  readNotices,
  getNoticeSettings,
  saveNoticeSetting,
  unsubscribe,
] as const;

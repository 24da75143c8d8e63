import { z } from 'zod';
import { entrySchema } from '../plan/bench/entry';
import { planDocumentSchema } from '../plan/document';
import { id, idParams, personRefSchema, timestamp } from './common';
import { contract } from './contract';
import { copyCorrectionSchema } from './notices';
import { planCardSchema, revisionRefSchema } from './plans';

export const benchCopyRefSchema = z.object({
  id,
  planId: id,
  slug: z.string(),
  title: z.string(),
  maker: personRefSchema,
  revision: revisionRefSchema.pick({ id: true, letter: true, publishedAt: true }),
  /** Newer revision of the plan, if any. */
  newerLetter: z.string().nullable(),
  startedAt: timestamp,
  lastEntryAt: timestamp.nullable(),
  steps: z.number().int(),
  stepsDone: z.number().int(),
  card: planCardSchema.pick({ cover: true, coverAlt: true, handsOn: true, clipDuration: true }),
});
export type BenchCopyRef = z.infer<typeof benchCopyRefSchema>;

/** An entry as stored: the server's sequence gives the order. */
export const storedEntrySchema = z.object({
  entry: entrySchema,
  sequence: z.number().int(),
  receivedAt: timestamp,
});
export type StoredEntry = z.infer<typeof storedEntrySchema>;

export const benchCopySchema = benchCopyRefSchema.extend({
  document: planDocumentSchema,
  entries: z.array(storedEntrySchema),
  /** A newer revision with its reasons, and what it means here. */
  correction: copyCorrectionSchema.nullable(),
});
export type BenchCopy = z.infer<typeof benchCopySchema>;

export const listCopies = contract({
  id: 'listCopies',
  method: 'GET',
  path: '/bench',
  access: 'person',
  summary: 'One’s bench copies.',
  response: z.object({ items: z.array(benchCopyRefSchema) }),
});
export const startCopy = contract({
  id: 'startCopy',
  method: 'PUT',
  path: '/bench/:copyId',
  access: 'person',
  limit: 'write',
  status: 201,
  summary: 'Start a bench copy of a revision; the id is the client’s, sending twice makes one.',
  params: idParams('copyId'),
  body: z.object({ planId: id, revisionId: id }),
  response: benchCopySchema,
});
export const getCopy = contract({
  id: 'getCopy',
  method: 'GET',
  path: '/bench/:copyId',
  access: 'person',
  summary: 'A bench copy of one’s own: the frozen plan and all entries.',
  params: idParams('copyId'),
  response: benchCopySchema,
});
export const listEntries = contract({
  id: 'listEntries',
  method: 'GET',
  path: '/bench/:copyId/entries',
  access: 'person',
  summary: 'Entries after a sequence.',
  params: idParams('copyId'),
  query: z.object({ after: z.coerce.number().int().min(0).default(0) }),
  response: z.object({ items: z.array(storedEntrySchema) }),
});
export const putEntry = contract({
  id: 'putEntry',
  method: 'PUT',
  path: '/bench/:copyId/entries/:entryId',
  access: 'person',
  limit: 'write',
  summary:
    'Store one entry. Idempotent: the same id and content again is the same answer; other content is 409 `bench/entry-differs`.',
  params: z.object({ copyId: id, entryId: id }),
  body: entrySchema,
  response: storedEntrySchema,
});
export const moveCopy = contract({
  id: 'moveCopy',
  method: 'PUT',
  path: '/bench/:copyId/revision',
  access: 'person',
  limit: 'write',
  summary:
    'Move a bench copy to a later revision of its plan; entries come along where what they are about is still there.',
  params: idParams('copyId'),
  body: z.object({ revisionId: id }),
  response: benchCopySchema,
});
export const removeCopy = contract({
  id: 'removeCopy',
  method: 'DELETE',
  path: '/bench/:copyId',
  access: 'person',
  limit: 'write',
  status: 204,
  summary: 'Put a bench copy away for good.',
  params: idParams('copyId'),
});

/** What a person's shop has; one document, compare and set like a draft. */
export const shopCardSchema = z.object({
  machines: z
    .array(
      z.object({
        id,
        machine: z.string().max(40),
        name: z.string().max(120),
        /** Measured limits as typed, e.g. depth-of-cut: "3 1/8 in". */
        limits: z.record(z.string().max(40), z.string().max(60)).default({}),
        dadoHead: z.boolean().default(false),
        note: z.string().max(1000).default(''),
      }),
    )
    .max(100)
    .default([]),
  tools: z
    .array(z.object({ id, name: z.string().max(120) }))
    .max(400)
    .default([]),
  stock: z
    .array(
      z.object({
        id,
        name: z.string().max(120),
        form: z.enum(['sheet', 'board', 'strip', 'rod']).default('sheet'),
        thickness: z.string().max(60).default(''),
        length: z.string().max(60).default(''),
        width: z.string().max(60).default(''),
        quantity: z.number().int().min(0).max(1000).default(1),
        offcut: z.boolean().default(false),
      }),
    )
    .max(400)
    .default([]),
  instruments: z
    .array(z.object({ id, instrument: z.string().max(40), uncertainty: z.string().max(60) }))
    .max(40)
    .default([]),
  kerf: z.string().max(60).default(''),
  /** Last values of taken dimensions by symbol, to prefill forms. */
  usual: z.record(z.string().max(60), z.string().max(60)).default({}),
  /** Drills on hand as typed: "1/16 in, 5/64 in, 3 mm". */
  drills: z.string().max(2000).default(''),
  /** Set-ups worked out with bench aids: what was typed, what it said. */
  setups: z
    .array(
      z.object({
        id,
        aid: z.string().max(40),
        units: z.enum(['mm', 'in']),
        machine: z.string().max(120).default(''),
        /** Day, as 2026-12-01. */
        on: z.string().max(10),
        values: z.record(z.string().max(60), z.string().max(200)),
        said: z.string().max(600),
      }),
    )
    .max(200)
    .default([]),
});
export type ShopCard = z.infer<typeof shopCardSchema>;
const shopCardResponse = z.object({ version: z.number().int(), card: shopCardSchema });
export const getShopCard = contract({
  id: 'getShopCard',
  method: 'GET',
  path: '/shop-card',
  access: 'person',
  summary: 'One’s shop card.',
  response: shopCardResponse,
});
export const saveShopCard = contract({
  id: 'saveShopCard',
  method: 'PUT',
  path: '/shop-card',
  access: 'person',
  limit: 'write',
  summary: 'Save it; 409 `shop-card/stale-version` when another device was first.',
  body: z.object({ version: z.number().int(), card: shopCardSchema }),
  response: shopCardResponse,
});

export const benchContracts = [
  listCopies,
  startCopy,
  getCopy,
  listEntries,
  putEntry,
  moveCopy,
  removeCopy,
  getShopCard,
  saveShopCard,
] as const;

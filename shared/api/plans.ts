import { z } from 'zod';
import { planDocumentSchema } from '../plan/document';
import { id, idParams, pageOf, pageQuery, personRefSchema, timestamp } from './common';
import { contract } from './contract';
import { limits } from './limits';
import { correctionBody } from './notices';

export const revisionLetter = z.string().regex(/^[A-Z]{1,3}$/);

/** A plan in a list. */
export const planCardSchema = z.object({
  id,
  slug: z.string(),
  title: z.string(),
  summary: z.string(),
  maker: personRefSchema,
  letter: revisionLetter,
  publishedAt: timestamp,
  cover: z.string().nullable(),
  coverAlt: z.string(),
  category: z.string(),
  skill: z.string(),
  units: z.enum(['mm', 'in']),
  steps: z.number().int(),
  /** Hands-on minutes and minutes with waits. */
  handsOn: z.number(),
  elapsed: z.number(),
  machines: z.array(z.string()),
  benchCopies: z.number().int(),
  clipDuration: z.number().nullable(),
});
export type PlanCard = z.infer<typeof planCardSchema>;

export const revisionRefSchema = z.object({
  id,
  letter: revisionLetter,
  sha256: z.string(),
  publishedAt: timestamp,
  note: z.string(),
  /** Failing musts published over, with the reason readers see. */
  overrides: z.array(
    z.object({
      rule: z.string(),
      elementId: z.string().nullable(),
      message: z.string(),
      reason: z.string(),
    }),
  ),
});
export type RevisionRef = z.infer<typeof revisionRefSchema>;

/** Everything the plan page shows. */
export const planPageSchema = z.object({
  id,
  slug: z.string(),
  maker: personRefSchema,
  revision: revisionRefSchema,
  document: planDocumentSchema,
  revisions: z.array(revisionRefSchema),
  talk: z.object({
    critiques: z.number().int(),
    questions: z.number().int(),
    /** Counts per step id. */
    bySteps: z.record(z.string(), z.number().int()),
  }),
  benchCopies: z.number().int(),
  /** The asker's own copy of this plan, if there is one. */
  myCopyId: id.nullable(),
  abilities: z.object({ draft: z.boolean(), talk: z.boolean(), moderate: z.boolean() }),
  /** Taken down by its maker or by a ruling; only they and moderators still see it. */
  state: z.enum(['published', 'unpublished', 'hidden', 'removed']),
});
export type PlanPage = z.infer<typeof planPageSchema>;

export const listPlansQuery = pageQuery.extend({
  q: z.string().max(200).default(''),
  maxMinutes: z.coerce.number().int().min(1).optional(),
  /** Only plans that need no machine outside this list (comma separated classes). */
  machines: z.string().max(400).optional(),
  skill: z.enum(['first', 'some', 'practised']).optional(),
  units: z.enum(['mm', 'in']).optional(),
  category: z.string().max(40).optional(),
  maker: z.string().max(80).optional(),
  sort: z.enum(['newest', 'most-built', 'shortest']).default('newest'),
});

export const listPlans = contract({
  id: 'listPlans',
  method: 'GET',
  path: '/plans',
  access: 'public',
  summary: 'Browse and search published plans.',
  query: listPlansQuery,
  response: pageOf(planCardSchema),
});
export const getPlan = contract({
  id: 'getPlan',
  method: 'GET',
  path: '/plans/:slug',
  access: 'public',
  summary: 'A published plan, its newest or the named revision.',
  params: z.object({ slug: z.string().max(200) }),
  query: z.object({ rev: revisionLetter.optional() }),
  response: planPageSchema,
});

/** A creator's plan in the drafting list. */
export const draftCardSchema = z.object({
  id,
  title: z.string(),
  version: z.number().int(),
  updatedAt: timestamp,
  slug: z.string().nullable(),
  letter: revisionLetter.nullable(),
  state: z.enum(['draft', 'published', 'unpublished', 'hidden', 'removed']),
  steps: z.number().int(),
});
export type DraftCard = z.infer<typeof draftCardSchema>;

export const draftSchema = z.object({
  id,
  version: z.number().int(),
  updatedAt: timestamp,
  document: planDocumentSchema,
  slug: z.string().nullable(),
  revisions: z.array(revisionRefSchema),
  state: draftCardSchema.shape.state,
});
export type Draft = z.infer<typeof draftSchema>;

export const listDrafts = contract({
  id: 'listDrafts',
  method: 'GET',
  path: '/drafts',
  access: 'creator',
  summary: 'One’s own plans, drafts and published.',
  response: z.object({ items: z.array(draftCardSchema) }),
});
export const createDraft = contract({
  id: 'createDraft',
  method: 'POST',
  path: '/drafts',
  access: 'creator',
  limit: 'write',
  status: 201,
  summary:
    'Begin a plan; the id is the client’s, sending twice makes one. A whole document may be imported.',
  body: z.object({
    id,
    title: z.string().trim().min(1, 'Give the plan a title.').max(limits.title),
    units: z.enum(['mm', 'in']),
    document: planDocumentSchema.optional(),
  }),
  response: draftSchema,
});
export const getDraft = contract({
  id: 'getDraft',
  method: 'GET',
  path: '/drafts/:planId',
  access: 'creator',
  summary: 'The draft of one of one’s plans.',
  params: idParams('planId'),
  response: draftSchema,
});
export const saveDraft = contract({
  id: 'saveDraft',
  method: 'PUT',
  path: '/drafts/:planId',
  access: 'creator',
  limit: 'write',
  summary:
    'Compare and set: 409 `drafts/stale-version` with the current version and document in meta when another tab was first.',
  params: idParams('planId'),
  body: z.object({ version: z.number().int(), document: planDocumentSchema }),
  response: z.object({ version: z.number().int(), updatedAt: timestamp }),
});
export const deleteDraft = contract({
  id: 'deleteDraft',
  method: 'DELETE',
  path: '/drafts/:planId',
  access: 'creator',
  limit: 'write',
  status: 204,
  summary: 'Throw away a plan that was never published.',
  params: idParams('planId'),
});
export const publishPlan = contract({
  id: 'publishPlan',
  method: 'POST',
  path: '/drafts/:planId/revisions',
  access: 'creator',
  limit: 'write',
  status: 201,
  summary:
    'Freeze the draft as the next lettered revision. Failing musts need a reason each (422 `plans/check-sheet` lists them).',
  params: idParams('planId'),
  body: z.object({
    version: z.number().int(),
    note: z.string().max(limits.reason).default(''),
    overrides: z
      .array(
        z.object({
          rule: z.string().max(60),
          elementId: z.string().max(60).nullable(),
          reason: z
            .string()
            .trim()
            .min(limits.reasonMin, 'Write the reason readers will see.')
            .max(limits.reason),
        }),
      )
      .max(100)
      .default([]),
    /** Tells the bench copies it touches; without it the revision is quiet. */
    correction: correctionBody.optional(),
  }),
  response: z.object({ revision: revisionRefSchema, slug: z.string() }),
});
export const unpublishPlan = contract({
  id: 'unpublishPlan',
  method: 'POST',
  path: '/drafts/:planId/unpublish',
  access: 'creator',
  limit: 'write',
  summary: 'Take the plan off the lists; bench copies keep theirs.',
  params: idParams('planId'),
  response: draftCardSchema,
});
export const republishPlan = contract({
  id: 'republishPlan',
  method: 'POST',
  path: '/drafts/:planId/republish',
  access: 'creator',
  limit: 'write',
  summary: 'Put an unpublished plan back on the lists.',
  params: idParams('planId'),
  response: draftCardSchema,
});

export const planContracts = [
  listPlans,
  getPlan,
  listDrafts,
  createDraft,
  getDraft,
  saveDraft,
  deleteDraft,
  publishPlan,
  unpublishPlan,
  republishPlan,
] as const;

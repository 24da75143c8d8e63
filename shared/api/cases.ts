import { z } from 'zod';
import { commentSchema } from './talk';
import { id, idParams, pageOf, pageQuery, personRefSchema, timestamp } from './common';
import { contract } from './contract';
import { limits } from './limits';

/** Kinds of problem, the gravest first: the queue sorts by this order, then age, then number. */
export const problemKinds = [
  'dangerous-advice',
  'abuse',
  'copied-work',
  'not-the-owner',
  'disclosure',
  'spam',
  'other',
] as const;
export const subjectKinds = ['comment', 'plan', 'person'] as const;
export const rulingActs = ['no-action', 'hide', 'remove', 'suspend'] as const;
/** The site's rules; a ruling names the one that was broken. */
export const siteRules = [
  {
    code: 'S1',
    title: 'Advice that can maim',
    text: 'Do not tell people to work in a way that is likely to hurt them.',
  },
  {
    code: 'S2',
    title: 'Working without a guard',
    text: 'Do not tell people to take a guard or riving knife off where it can stay on.',
  },
  {
    code: 'P1',
    title: 'Civil talk',
    text: 'No insults, threats or harassment. Criticise the work, not the person.',
  },
  { code: 'P2', title: 'No hate', text: 'Nobody is put down for who they are.' },
  { code: 'H1', title: 'Honest links', text: 'Say what a link to something on sale earns you.' },
  {
    code: 'H2',
    title: 'Your own work',
    text: 'Publish what is yours, or say whose it is and that you may.',
  },
  { code: 'H3', title: 'No spam', text: 'No advertising in talk, no repeats.' },
  { code: 'L1', title: 'The law', text: 'Nothing that the law forbids.' },
] as const;
export const ruleCodes = siteRules.map((r) => r.code);

const subject = z.object({ kind: z.enum(subjectKinds), id });

export const reportThing = contract({
  id: 'reportThing',
  method: 'POST',
  path: '/reports',
  access: 'public',
  limit: 'report',
  status: 201,
  summary: 'Report a comment, a plan or a person; signed in or not.',
  body: z.object({
    id,
    subject,
    problem: z.enum(problemKinds),
    reason: z.string().trim().min(10, 'Say in a sentence what is wrong.').max(limits.reason),
    /** Needed when not signed in, to tell the outcome. */
    email: z.email('That is not an e-mail address.').max(limits.email).optional(),
  }),
  response: z.object({ receipt: z.string() }),
});

export const caseCardSchema = z.object({
  id,
  number: z.number().int(),
  problem: z.enum(problemKinds),
  subject: subject.extend({
    title: z.string(),
    excerpt: z.string(),
    planSlug: z.string().nullable(),
  }),
  reports: z.number().int(),
  openedAt: timestamp,
  state: z.enum(['open', 'ruled']),
  workedBy: personRefSchema.nullable(),
});
export type CaseCard = z.infer<typeof caseCardSchema>;

export const rulingSchema = z.object({
  id,
  act: z.enum(rulingActs),
  rule: z.string().nullable(),
  reasons: z.string(),
  until: timestamp.nullable(),
  by: personRefSchema,
  at: timestamp,
});
export const caseSchema = caseCardSchema.extend({
  comment: commentSchema.nullable(),
  person: personRefSchema.nullable(),
  reportList: z.array(
    z.object({
      id,
      problem: z.enum(problemKinds),
      reason: z.string(),
      by: personRefSchema.nullable(),
      at: timestamp,
    }),
  ),
  rulings: z.array(rulingSchema),
  log: z.array(
    z.object({
      id: z.string(),
      at: timestamp,
      by: personRefSchema.nullable(),
      act: z.string(),
      text: z.string(),
    }),
  ),
});
export type CaseView = z.infer<typeof caseSchema>;

export const listCases = contract({
  id: 'listCases',
  method: 'GET',
  path: '/cases',
  access: 'moderator',
  summary: 'The queue: danger to life first, then age, then number.',
  query: pageQuery.extend({ state: z.enum(['open', 'ruled']).default('open') }),
  response: pageOf(caseCardSchema),
});
export const getCase = contract({
  id: 'getCase',
  method: 'GET',
  path: '/cases/:caseId',
  access: 'moderator',
  summary: 'One case with its reports, rulings and log.',
  params: idParams('caseId'),
  response: caseSchema,
});
export const takeCase = contract({
  id: 'takeCase',
  method: 'PUT',
  path: '/cases/:caseId/worker',
  access: 'moderator',
  limit: 'write',
  summary: 'Say that one is on it; 409 `cases/taken` names who already is, unless `over` is given.',
  params: idParams('caseId'),
  body: z.object({ over: z.boolean().default(false) }),
  response: caseSchema,
});
export const giveRuling = contract({
  id: 'giveRuling',
  method: 'POST',
  path: '/cases/:caseId/rulings',
  access: 'moderator',
  limit: 'write',
  status: 201,
  summary:
    'Rule with the rule and reasons; the person concerned and the reporters are told by e-mail.',
  params: idParams('caseId'),
  body: z.object({
    id,
    act: z.enum(rulingActs),
    rule: z.string().max(10).nullable(),
    reasons: z
      .string()
      .trim()
      .min(20, 'Say which facts and why: the person will read it.')
      .max(limits.reason),
    /** Suspension in days; absent for good. */
    days: z.number().int().min(1).max(3650).optional(),
  }),
  response: caseSchema,
});
export const getPerson = contract({
  id: 'getPerson',
  method: 'GET',
  path: '/people/:handle',
  access: 'public',
  summary: 'A person as others see them.',
  params: z.object({ handle: z.string().max(80) }),
  response: personRefSchema.extend({ isMaker: z.boolean(), since: timestamp }),
});

export const caseContracts = [
  reportThing,
  listCases,
  getCase,
  takeCase,
  giveRuling,
  getPerson,
] as const;

import { z } from 'zod';
import { id, idParams, pageOf, pageQuery, personRefSchema, timestamp } from './common';
import { contract } from './contract';
import { limits } from './limits';

export const commentKinds = ['critique', 'question', 'answer'] as const;
/** What a comment hangs on. */
export const anchorSchema = z.object({
  on: z.enum(['plan', 'step', 'part', 'dimension']),
  /** Element id; absent for the plan itself. */
  elementId: id.optional(),
});
export type Anchor = z.infer<typeof anchorSchema>;

const text = z.string().trim().min(1, 'Say something first.').max(limits.commentText);

export const commentSchema = z.object({
  id,
  planId: id,
  letter: z.string(),
  kind: z.enum(commentKinds),
  anchor: anchorSchema,
  /** keep or change, for a critique. */
  stance: z.enum(['keep', 'change']).nullable(),
  text: z.string(),
  why: z.string(),
  author: personRefSchema,
  byMaker: z.boolean(),
  parentId: id.nullable(),
  /** The answer the creator marked as settling it. */
  settledBy: id.nullable(),
  createdAt: timestamp,
  editedAt: timestamp.nullable(),
  /** shown · deleted (by its writer) · hidden or removed (by a ruling; text is empty for others). */
  state: z.enum(['shown', 'deleted', 'hidden', 'removed']),
  abilities: z.object({
    edit: z.boolean(),
    delete: z.boolean(),
    settle: z.boolean(),
    report: z.boolean(),
  }),
});
export type Comment = z.infer<typeof commentSchema>;
export const threadSchema = commentSchema.extend({ answers: z.array(commentSchema) });
export type Thread = z.infer<typeof threadSchema>;

export const commentBody = z.discriminatedUnion('kind', [
  z.object({
    id,
    kind: z.literal('critique'),
    anchor: anchorSchema,
    stance: z.enum(['keep', 'change']),
    text,
    why: z.string().trim().min(1, 'Say why: it is what the maker can use.').max(limits.reason),
  }),
  z.object({ id, kind: z.literal('question'), anchor: anchorSchema, text }),
  z.object({ id, kind: z.literal('answer'), parentId: id, text }),
]);
export type CommentBody = z.infer<typeof commentBody>;

export const listTalk = contract({
  id: 'listTalk',
  method: 'GET',
  path: '/plans/:planId/talk',
  access: 'public',
  summary: 'Critiques and questions of a plan with their answers.',
  params: idParams('planId'),
  query: pageQuery.extend({
    kind: z.enum(['critique', 'question']).optional(),
    elementId: id.optional(),
    open: z.enum(['true']).optional(),
  }),
  response: pageOf(threadSchema),
});
export const postComment = contract({
  id: 'postComment',
  method: 'POST',
  path: '/plans/:planId/talk',
  access: 'confirmed',
  limit: 'write',
  status: 201,
  summary: 'Critique, ask or answer; the id is the client’s, sending twice makes one.',
  params: idParams('planId'),
  body: commentBody,
  response: commentSchema,
});
export const editComment = contract({
  id: 'editComment',
  method: 'PATCH',
  path: '/talk/:commentId',
  access: 'confirmed',
  limit: 'write',
  summary: 'Change one’s own words; earlier words are kept.',
  params: idParams('commentId'),
  body: z.object({ text, why: z.string().trim().max(limits.reason).optional() }),
  response: commentSchema,
});
export const deleteComment = contract({
  id: 'deleteComment',
  method: 'DELETE',
  path: '/talk/:commentId',
  access: 'confirmed',
  limit: 'write',
  status: 204,
  summary: 'Take one’s own comment back; a trace stays for those who answered.',
  params: idParams('commentId'),
});
export const settleComment = contract({
  id: 'settleComment',
  method: 'PUT',
  path: '/talk/:commentId/settled',
  access: 'creator',
  limit: 'write',
  summary: 'The maker marks the answer that settles it, or none.',
  params: idParams('commentId'),
  body: z.object({ answerId: id.nullable() }),
  response: commentSchema,
});

export const talkContracts = [
  listTalk,
  postComment,
  editComment,
  deleteComment,
  settleComment,
] as const;

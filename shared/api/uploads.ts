import { z } from 'zod';
import { elementId, mediaHash } from '../plan/document-values';
import { timestamp } from './common';
import { contract } from './contract';
import { limits } from './limits';

/** open: parts come · waiting, working: it is looked into · done: it is a file of one's own · refused, failed: with a reason. */
export const uploadStates = ['open', 'waiting', 'working', 'done', 'refused', 'failed'] as const;
export type UploadState = (typeof uploadStates)[number];

/** Part `number` (from 1) of an upload that the store has. */
export const uploadPartSchema = z.object({
  number: z.number().int().min(1).max(10_000),
  etag: z.string().min(1).max(200),
  bytes: z.number().int().min(1),
});
export type UploadPart = z.infer<typeof uploadPartSchema>;

export const uploadSchema = z.object({
  id: elementId,
  /** The draft it is for. */
  planId: elementId.nullable(),
  name: z.string(),
  /** What the browser tells the same file by: name, length, time of change. */
  mark: z.string(),
  bytes: z.number().int(),
  partBytes: z.number().int(),
  state: z.enum(uploadStates),
  reason: z.string().nullable(),
  /** Once it is done. */
  hash: mediaHash.nullable(),
  duration: z.number().nullable(),
  parts: z.array(uploadPartSchema),
  createdAt: timestamp,
});
export type Upload = z.infer<typeof uploadSchema>;

/** Part sizes: at least 8 MiB, at most about a hundred parts, whole MiB. */
export function partBytesFor(bytes: number): number {
  const mib = 1024 * 1024;
  return Math.max(8 * mib, Math.ceil(bytes / 100 / mib) * mib);
}
/** How long the part with a number has to be. */
export function partLength(
  { bytes, partBytes }: Pick<Upload, 'bytes' | 'partBytes'>,
  number: number,
) {
  return Math.min(partBytes, bytes - (number - 1) * partBytes);
}
export const partCount = ({ bytes, partBytes }: Pick<Upload, 'bytes' | 'partBytes'>) =>
  Math.ceil(bytes / partBytes);

const idParams = z.object({ uploadId: elementId });
const numberParams = idParams.extend({ number: z.coerce.number().int().min(1).max(10_000) });
const answer = z.object({ upload: uploadSchema });

export const startUpload = contract({
  id: 'startUpload',
  method: 'POST',
  path: '/clip-uploads',
  access: 'creator',
  limit: 'upload',
  status: 201,
  summary: 'Begins to upload a clip of up to 4 GB in parts, or finds the same one that broke off.',
  body: z.object({
    id: elementId,
    planId: elementId.nullable(),
    name: z.string().min(1).max(limits.fileName),
    mark: z.string().min(1).max(400),
    bytes: z.number().int().min(1, 'The file is empty').max(limits.clipBytes, 'Over 4 GB'),
  }),
  response: answer,
});
export const listUploads = contract({
  id: 'listUploads',
  method: 'GET',
  path: '/clip-uploads',
  access: 'creator',
  summary:
    'One’s uploads that are not done, and those of the last day, with the room that is left.',
  response: z.object({
    items: z.array(uploadSchema),
    usedBytes: z.number(),
    quotaBytes: z.number(),
  }),
});
export const getUpload = contract({
  id: 'getUpload',
  method: 'GET',
  path: '/clip-uploads/:uploadId',
  access: 'creator',
  summary: 'An upload with the ledger of its parts.',
  params: idParams,
  response: answer,
});
export const signUploadPart = contract({
  id: 'signUploadPart',
  method: 'POST',
  path: '/clip-uploads/:uploadId/parts/:number',
  access: 'creator',
  limit: 'part',
  summary: 'A signed address to PUT one part to, straight at the object store.',
  params: numberParams,
  response: z.object({ address: z.url(), expiresIn: z.number().int() }),
});
export const noteUploadPart = contract({
  id: 'noteUploadPart',
  method: 'PUT',
  path: '/clip-uploads/:uploadId/parts/:number',
  access: 'creator',
  limit: 'part',
  status: 204,
  summary: 'Writes a part the store has taken into the ledger.',
  params: numberParams,
  body: uploadPartSchema.omit({ number: true }),
});
export const completeUpload = contract({
  id: 'completeUpload',
  method: 'POST',
  path: '/clip-uploads/:uploadId/complete',
  access: 'creator',
  limit: 'upload',
  summary: 'All parts are there: the file is put together and looked into.',
  params: idParams,
  response: answer,
});
export const cancelUpload = contract({
  id: 'cancelUpload',
  method: 'DELETE',
  path: '/clip-uploads/:uploadId',
  access: 'creator',
  limit: 'write',
  status: 204,
  summary: 'Gives an upload up; what came of it is removed.',
  params: idParams,
});

export const uploadContracts = [
  startUpload,
  listUploads,
  getUpload,
  signUploadPart,
  noteUploadPart,
  completeUpload,
  cancelUpload,
] as const;

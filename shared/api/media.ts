import { z } from 'zod';
import { mediaHash } from '../plan/document-values';
import { timestamp } from './common';
import { contract } from './contract';
import { limits } from './limits';

export const mediaKinds = ['clip', 'photo', 'captions'] as const;
/** waiting and working: there soon · ready · refused: not a file we take · failed: the work broke off, the file is kept. */
export const mediaStates = ['waiting', 'working', 'ready', 'refused', 'failed'] as const;
export type MediaState = (typeof mediaStates)[number];
export const mediaSchema = z.object({
  hash: mediaHash,
  kind: z.enum(mediaKinds),
  bytes: z.number().int(),
  type: z.string(),
  name: z.string(),
  width: z.number().nullable(),
  height: z.number().nullable(),
  duration: z.number().nullable(),
  /** Addresses below `/media`, by rendition: 720, 360, poster, strip; large, medium, thumb; original. */
  renditions: z.array(z.string()),
  state: z.enum(mediaStates),
  /** Per cent, while working. */
  progress: z.number().int(),
  /** Why it was refused or failed: what happened, what was kept, what to do. */
  reason: z.string().nullable(),
  createdAt: timestamp,
});
export type Media = z.infer<typeof mediaSchema>;

/** `/media/<hash>/<rendition>`: checks permission, redirects to a signed address on the media origin. */
export const mediaPath = (hash: string, rendition: string) => `/media/${hash}/${rendition}`;

/** Name of the file that holds a stretch of a clip (seconds): whole seconds around it, so that it can be found again. */
export function stretchName(stretch: { start: number; end: number }): string {
  const { start, end } = wholeSeconds(stretch);
  return `cut-${start}-${end}`;
}
export const wholeSeconds = ({ start, end }: { start: number; end: number }) => ({
  start: Math.floor(start),
  end: Math.ceil(end),
});

/** Pictures side by side in a clip's contact strip. */
export const stripFrames = 24;

const uploadResponse = z.object({ media: mediaSchema });
export const uploadPhoto = contract({
  id: 'uploadPhoto',
  method: 'POST',
  path: '/uploads/photo',
  access: 'confirmed',
  limit: 'upload',
  status: 201,
  summary: 'A photo: checked by its content, turned upright, stripped of place and device.',
  upload: { field: 'file', maxBytes: limits.photoBytes },
  response: uploadResponse,
});
export const uploadClip = contract({
  id: 'uploadClip',
  method: 'POST',
  path: '/uploads/clip',
  access: 'creator',
  limit: 'upload',
  status: 201,
  summary: 'A clip up to 200 MB in one request (MP4, WebM, QuickTime); larger ones go in parts.',
  upload: { field: 'file', maxBytes: limits.wholeClipBytes },
  response: uploadResponse,
});
export const uploadCaptions = contract({
  id: 'uploadCaptions',
  method: 'POST',
  path: '/uploads/captions',
  access: 'creator',
  limit: 'upload',
  status: 201,
  summary: 'A caption file (WebVTT or SubRip), kept as WebVTT.',
  upload: { field: 'file', maxBytes: limits.captionBytes },
  response: uploadResponse,
});
export const listMedia = contract({
  id: 'listMedia',
  method: 'GET',
  path: '/uploads',
  access: 'confirmed',
  summary: 'What one has uploaded.',
  response: z.object({ items: z.array(mediaSchema) }),
});

const hashParams = z.object({ hash: mediaHash });
export const getMedia = contract({
  id: 'getMedia',
  method: 'GET',
  path: '/uploads/files/:hash',
  access: 'confirmed',
  summary: 'One of one’s own files: what it is and how far the work on it is.',
  params: hashParams,
  response: uploadResponse,
});
export const getRenditions = contract({
  id: 'getRenditions',
  method: 'GET',
  path: '/files/:hash',
  access: 'public',
  summary: 'Which renditions there are of a picture or clip that one may see.',
  params: hashParams,
  response: z.object({ renditions: z.array(z.string()) }),
});
export const workAgain = contract({
  id: 'workAgain',
  method: 'POST',
  path: '/uploads/files/:hash/again',
  access: 'confirmed',
  limit: 'upload',
  summary: 'Begins the work on a file again after it failed.',
  params: hashParams,
  response: uploadResponse,
});

export const mediaContracts = [
  uploadPhoto,
  uploadClip,
  uploadCaptions,
  listMedia,
  getMedia,
  getRenditions,
  workAgain,
] as const;

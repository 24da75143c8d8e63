import { z } from 'zod';
import { mediaHash } from '../plan/document-values';
import { timestamp } from './common';
import { contract } from './contract';
import { limits } from './limits';

export const mediaKinds = ['clip', 'photo', 'captions'] as const;
export const mediaSchema = z.object({
  hash: mediaHash,
  kind: z.enum(mediaKinds),
  bytes: z.number().int(),
  type: z.string(),
  name: z.string(),
  width: z.number().nullable(),
  height: z.number().nullable(),
  duration: z.number().nullable(),
  /** Addresses below `/media`, by rendition: original, large, thumb, poster. */
  renditions: z.array(z.string()),
  createdAt: timestamp,
});
export type Media = z.infer<typeof mediaSchema>;

/** `/media/<hash>/<rendition>`: checks permission, redirects to a signed address on the media origin. */
export const mediaPath = (hash: string, rendition: string) => `/media/${hash}/${rendition}`;

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
  summary: 'A clip up to 200 MB (MP4, WebM, QuickTime): checked by its content, stored by hash.',
  upload: { field: 'file', maxBytes: limits.clipBytes },
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

export const mediaContracts = [uploadPhoto, uploadClip, uploadCaptions, listMedia] as const;

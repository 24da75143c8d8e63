import { getRenditions, mediaPath, stretchName } from '../../shared/api/media';
import { type PlanDocument } from '../../shared/plan/document';
import { call } from './api-client';
import { keptFilesCache } from './kept-names';
import { NoSignal } from './problems';

/** A whole file as it is kept: its address and its length. */
export interface KeptFile {
  path: string;
  bytes: number;
}

/** Addresses of the the pictures and captions the steps of a plan show, each once. */
export function filesOf(document: PlanDocument): string[] {
  const { clip, cover, photos, steps } = document;
  const used = new Set(steps.flatMap((step) => step.photoIds));
  const paths = [
    ...(cover ? [mediaPath(cover, 'large')] : []),
    ...photos.filter((photo) => used.has(photo.id)).map((photo) => mediaPath(photo.media, 'large')),
    ...(clip.source !== 'none' && clip.captions ? [mediaPath(clip.captions, 'original')] : []),
  ];
  return [...new Set(paths)];
}

/** The clip: as the stretches the steps show where those are cut, or whole. Throws `NoSignal`. */
export async function clipFilesOf(document: PlanDocument, signal: AbortSignal): Promise<string[]> {
  const { clip, steps } = document;
  if (clip.source !== 'upload') return [];
  const stretches = [...new Set(steps.flatMap((step) => step.stretches.map(stretchName)))];
  const { renditions } = await call(getRenditions, { params: { hash: clip.media }, signal });
  const cut = stretches.length > 0 && stretches.every((name) => renditions.includes(name));
  return (cut ? stretches : ['720']).map((name) => mediaPath(clip.media, name));
}

const open = () => caches.open(keptFilesCache);

async function answerTo(path: string, method: 'HEAD' | 'GET', signal: AbortSignal) {
  let response: Response;
  try {
    // Asked for by name, so that what is kept of a photo is a form every such browser shows.
    const headers = { Accept: 'image/webp,*/*' };
    response = await fetch(path, { method, credentials: 'same-origin', headers, signal });
  } catch (error) {
    if (signal.aborted) throw error;
    throw new NoSignal();
  }
  return response;
}

/** The file's length; null when the server has no such file. Throws `NoSignal`, for a broken server too. */
export async function measureFile(path: string, signal: AbortSignal): Promise<KeptFile | null> {
  const response = await answerTo(path, 'HEAD', signal);
  const length = response.headers.get('content-length');
  if (response.status >= 500) throw new NoSignal();
  return response.ok && length !== null ? { path, bytes: Number(length) } : null;
}

export async function isKept(file: KeptFile): Promise<boolean> {
  const found = await (await open()).match(file.path);
  return found?.headers.get('content-length') === String(file.bytes);
}

/** Counts what goes through, and breaks off when the file turns out shorter or longer than said. */
function counter(bytes: number, onBytes: (more: number) => void) {
  let seen = 0;
  return new TransformStream<Uint8Array<ArrayBuffer>, Uint8Array<ArrayBuffer>>({
    transform(chunk, controller) {
      seen += chunk.byteLength;
      onBytes(chunk.byteLength);
      controller.enqueue(chunk);
    },
    flush(controller) {
      if (seen !== bytes) controller.error(new NoSignal());
    },
  });
}

/**
 * Fetches one file into the cache as a stream, whole or not at all. Throws `NoSignal` when it broke off,
 * and what the browser throws when there is no room (`QuotaExceededError`) or `signal` was aborted.
 */
export async function fetchIntoCache(
  file: KeptFile,
  signal: AbortSignal,
  onBytes: (more: number) => void,
): Promise<void> {
  const response = await answerTo(file.path, 'GET', signal);
  if (!response.ok || !response.body) throw new NoSignal();
  const headers = {
    'Content-Type': response.headers.get('content-type') ?? 'application/octet-stream',
    'Content-Length': String(file.bytes),
    'Accept-Ranges': 'bytes',
  };
  const body = response.body.pipeThrough(counter(file.bytes, onBytes));
  try {
    await (await open()).put(file.path, new Response(body, { headers }));
  } catch (error) {
    const full = error instanceof DOMException && error.name === 'QuotaExceededError';
    if (full || signal.aborted) throw error;
    throw new NoSignal();
  }
}

export async function dropFromCache(paths: readonly string[]): Promise<void> {
  const cache = await open();
  await Promise.all(paths.map((path) => cache.delete(path)));
}

export const clearKeptCache = (): Promise<boolean> => caches.delete(keptFilesCache);
export const cachesThere = (): boolean => typeof caches !== 'undefined';

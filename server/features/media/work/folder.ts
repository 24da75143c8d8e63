import { createReadStream, createWriteStream } from 'node:fs';
import { mkdtemp, rm, stat } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pipeline } from 'node:stream/promises';
import { type MediaEntity } from '../../../db/entities/media';
import { type Deps } from '../../../deps';
import { type Made } from './renditions';

/** A folder for one piece of work, gone afterwards whatever happened. */
export async function inFolder<T>(work: (folder: string) => Promise<T>): Promise<T> {
  const folder = await mkdtemp(join(tmpdir(), 'scantling-media-'));
  try {
    return await work(folder);
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}

/** Brings a file of the store to disk, as a stream. */
export async function fetchFile(
  deps: Deps,
  key: string,
  path: string,
  signal: AbortSignal,
): Promise<void> {
  await pipeline(await deps.storage.read(key), createWriteStream(path), { signal });
}

/** Stores what was made, each path once, and returns the renditions it makes. */
export async function storeMade(
  deps: Deps,
  prefix: string,
  made: readonly Made[],
): Promise<MediaEntity['renditions']> {
  const keys = new Map<string, string>();
  const renditions: MediaEntity['renditions'] = {};
  for (const { name, path, type } of made) {
    let key = keys.get(path);
    if (key === undefined) {
      key = `${prefix}/${name}`;
      const { size } = await stat(path);
      await deps.storage.put(key, createReadStream(path), { type, bytes: size });
      keys.set(path, key);
    }
    renditions[name] = { key, type };
  }
  return renditions;
}

import { join } from 'node:path';
import sharp from 'sharp';
import { MediaEntity } from '../../../db/entities/media';
import { type Deps } from '../../../deps';
import { type Turn } from '../../../jobs/jobs';
import { maxPixels, photoSizes } from '../photo-sizes';
import { fetchFile, inFolder, storeMade } from './folder';
import { leased, type Leased } from './lease';
import { Refusal } from './probe';
import { type FileJob } from './queues';
import { type Made } from './renditions';

/** AVIF for browsers that read it, JPEG for what reads neither that nor WebP. */
const formats = [
  { ending: 'avif', type: 'image/avif' },
  { ending: 'jpeg', type: 'image/jpeg' },
] as const;

async function make(deps: Deps, { media, onShare }: Leased, signal: AbortSignal): Promise<void> {
  const { hash, sourceKey } = media;
  if (!sourceKey) throw new Refusal('The file it was made from is gone. Upload it again.');
  await inFolder(async (folder) => {
    const source = join(folder, 'source');
    await fetchFile(deps, sourceKey, source, signal);
    const made: Made[] = [];
    const all = Object.entries(photoSizes);
    for (const [name, width] of all) {
      signal.throwIfAborted();
      const upright = sharp(source, { limitInputPixels: maxPixels })
        .autoOrient()
        .resize({ width, height: width, fit: 'inside', withoutEnlargement: true });
      for (const { ending, type } of formats) {
        const path = join(folder, `${name}.${ending}`);
        const as = upright.clone();
        await (
          ending === 'avif'
            ? as.avif({ quality: 55, effort: 2 })
            : as.flatten({ background: '#ffffff' }).jpeg({ quality: 82, mozjpeg: true })
        ).toFile(path);
        made.push({ name: `${name}.${ending}`, path, type });
        onShare(made.length / (all.length * formats.length));
      }
    }
    const more = await storeMade(deps, `photo/${hash}`, made);
    const renditions = { ...media.renditions, ...more };
    await deps.db.getRepository(MediaEntity).update(
      { hash },
      {
        renditions,
        state: 'ready',
        progress: 100,
        reason: null,
        leaseUntil: null,
        sourceKey: null,
      },
    );
    // Only now: it is the one thing left that may tell of place and device.
    await deps.storage.remove(sourceKey);
  });
}

/** Makes the other formats of a photo, and does away with the file it came as. */
export const workOnPhoto = (deps: Deps, { hash }: FileJob, turn: Turn): Promise<void> =>
  leased(deps, hash, turn, (lease) => make(deps, lease, turn.signal));

import { join } from 'node:path';
import { MediaEntity } from '../../../db/entities/media';
import { type Deps } from '../../../deps';
import { type Turn } from '../../../jobs/jobs';
import { contentType } from '../content';
import { fetchFile, inFolder, storeMade } from './folder';
import { leased, type Leased } from './lease';
import { probeClip, Refusal } from './probe';
import { makeFilms, makePictures } from './renditions';
import { type FileJob } from './queues';

async function make(deps: Deps, { media, onShare }: Leased, signal: AbortSignal): Promise<void> {
  const { hash, sourceKey } = media;
  if (!sourceKey) throw new Refusal('The file it was made from is gone. Upload it again.');
  await inFolder(async (folder) => {
    const source = join(folder, 'source');
    await fetchFile(deps, sourceKey, source, signal);
    const type = (await contentType(source)) ?? media.type;
    const facts = await probeClip(source, type, signal);
    const films = await makeFilms({ source, type, facts, folder, signal, onShare });
    const film = films[films.length - 1]!.path;
    const made = await probeClip(film, 'video/mp4', signal);
    const duration = made.duration ?? 0;
    if (facts.duration !== null && duration < facts.duration * 0.95 - 1)
      throw new Refusal(
        `It says it lasts ${Math.round(facts.duration)} seconds, but ends after ${Math.round(duration)}: it was cut off on its way. Nothing of it is shown. Export it again and upload that.`,
      );
    const pictures = await makePictures(film, duration, folder, signal);
    const renditions = await storeMade(deps, `clip/${hash}`, [...films, ...pictures]);
    const { width, height } = facts;
    // `original` goes with this: nothing that may tell of place or device stays within reach.
    await deps.db.getRepository(MediaEntity).update(
      { hash },
      {
        renditions,
        duration,
        width,
        height,
        state: 'ready',
        progress: 100,
        reason: null,
        leaseUntil: null,
      },
    );
  });
}

/** Makes of an uploaded clip what is shown of it. */
export const workOnClip = (deps: Deps, { hash }: FileJob, turn: Turn): Promise<void> =>
  leased(deps, hash, turn, (lease) => make(deps, lease, turn.signal));

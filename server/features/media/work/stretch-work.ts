import { join } from 'node:path';
import { stretchName } from '../../../../shared/api/media';
import { MediaEntity } from '../../../db/entities/media';
import { type Deps } from '../../../deps';
import { type Turn } from '../../../jobs/jobs';
import { fetchFile, inFolder, storeMade } from './folder';
import { type StretchJob } from './queues';
import { cutStretch, type Made } from './renditions';

/** Below this the whole clip goes with a bench copy; cutting it saves nothing worth having. */
export const worthCutting = 12_000_000;

/** Cuts the stretches that steps show, for use with no signal; those that are there already stay. */
export async function workOnStretches(
  deps: Deps,
  job: StretchJob,
  { signal }: Pick<Turn, 'signal'>,
  from = worthCutting,
): Promise<void> {
  const { hash } = job;
  const files = deps.db.getRepository(MediaEntity);
  const media = await files.findOneBy({ hash });
  if (media?.kind !== 'clip' || media.state === 'refused') return;
  const whole = media.renditions['720'];
  // Thrown to come round again once the clip itself is ready.
  if (!whole) throw new Error('the clip is not ready to be cut');
  if ((await deps.storage.size(whole.key)) < from) return;
  const wanted = job.stretches
    .map((stretch) => ({ ...stretch, name: stretchName(stretch) }))
    .filter(({ name, start, end }) => end > start && !(name in media.renditions));
  if (wanted.length === 0) return;
  await inFolder(async (folder) => {
    const film = join(folder, 'film.mp4');
    await fetchFile(deps, whole.key, film, signal);
    for (const stretch of wanted) {
      const made: Made = await cutStretch(film, stretch, folder, signal);
      const renditions = await storeMade(deps, `clip/${hash}`, [made]);
      await deps.db.query(`UPDATE media SET renditions = renditions || $2::jsonb WHERE hash = $1`, [
        hash,
        JSON.stringify(renditions),
      ]);
    }
  });
}

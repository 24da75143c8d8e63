import { LessThan } from 'typeorm';
import { UploadEntity } from '../../db/entities/upload';
import { type Deps } from '../../deps';
import { arrivalQueue, queueArrival, workOnArrival, type ArrivalJob } from './arrival';
import { giveUploadUp } from './uploads.service';

/** Nobody has gone on with it for so long: it is given up. */
export const abandonedAfterMs = 7 * 24 * 3600 * 1000;

/** Takes up arrivals nobody works on, and removes uploads nobody goes on with. Returns how many of each. */
export async function sweepUploads(deps: Deps): Promise<{ taken: number; removed: number }> {
  const uploads = deps.db.getRepository(UploadEntity);
  const left: { id: string }[] = await deps.db.query(
    `SELECT id FROM uploads WHERE state IN ('waiting','working') AND (lease_until IS NULL OR lease_until < now())`,
  );
  for (const { id } of left) await queueArrival(deps, id);
  const before = new Date(deps.now().getTime() - abandonedAfterMs);
  const old = await uploads.findBy({ touchedAt: LessThan(before) });
  const gone = old.filter(({ state }) => state !== 'waiting' && state !== 'working');
  for (const upload of gone) await giveUploadUp(deps, upload);
  return { taken: left.length, removed: gone.filter(({ state }) => state === 'open').length };
}

/** Starts looking into uploads in this process. */
export async function startUploadWork(deps: Deps): Promise<void> {
  await deps.jobs.work<ArrivalJob>({
    queue: arrivalQueue,
    retryLimit: 3,
    retryDelay: 5,
    run: (job, turn) => workOnArrival(deps, job, turn),
  });
  await deps.jobs.work<object>({
    queue: 'upload-sweep',
    retryLimit: 0,
    retryDelay: 1,
    every: '* * * * *',
    run: async () => void (await sweepUploads(deps)),
  });
  await sweepUploads(deps);
}

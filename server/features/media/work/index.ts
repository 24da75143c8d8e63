import { spawnSync } from 'node:child_process';
import { type Deps } from '../../../deps';
import { type Turn } from '../../../jobs/jobs';
import { workOnClip } from './clip-work';
import { workOnPhoto } from './photo-work';
import { queues, queueWork, type FileJob, type StretchJob } from './queues';
import { workOnStretches } from './stretch-work';

const retry = { retryLimit: 3, retryDelay: 5 };

/** Queues what waits without anybody working on it: after a process died, or from before there were queues. */
export async function sweepMedia(deps: Deps): Promise<number> {
  const left: { hash: string; kind: 'clip' | 'photo' }[] = await deps.db.query(
    `SELECT hash, kind FROM media WHERE state IN ('waiting','working')
       AND (lease_until IS NULL OR lease_until < now()) AND source_key IS NOT NULL LIMIT 500`,
  );
  for (const media of left) await queueWork(deps, media);
  return left.length;
}

/** Starts the work on media in this process; several may do it side by side. */
export async function startMediaWork(deps: Deps): Promise<void> {
  if (spawnSync('ffmpeg', ['-version'], { stdio: 'ignore' }).status !== 0)
    deps.log.error('ffmpeg is missing: clips wait until it is installed');
  const { jobs } = deps;
  const bind =
    <T>(work: (deps: Deps, job: T, turn: Turn) => Promise<void>) =>
    (job: T, turn: Turn) =>
      work(deps, job, turn);
  await jobs.work<FileJob>({ queue: queues.photo, ...retry, run: bind(workOnPhoto) });
  await jobs.work<FileJob>({ queue: queues.clip, ...retry, run: bind(workOnClip) });
  await jobs.work<StretchJob>({ queue: queues.stretches, ...retry, run: bind(workOnStretches) });
  await jobs.work<object>({
    queue: queues.sweep,
    retryLimit: 0,
    retryDelay: 1,
    every: '* * * * *',
    run: async () => void (await sweepMedia(deps)),
  });
  await sweepMedia(deps);
}

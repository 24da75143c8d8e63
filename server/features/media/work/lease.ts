import { MediaEntity } from '../../../db/entities/media';
import { type Deps } from '../../../deps';
import { type Turn } from '../../../jobs/jobs';
import { Refusal } from './probe';

const leaseSeconds = 90;
const goesOn = 'The work on it broke off. It is tried again in a while.';
const gaveUp =
  'The work on it broke off several times. The fault is ours, and the file is kept. Try again later.';

export interface Leased {
  media: MediaEntity;
  /** Notes how much is done, 0…1; at most once a second. */
  onShare: (share: number) => void;
}

async function take(deps: Deps, hash: string): Promise<MediaEntity | null> {
  const taken: [unknown[], number] = await deps.db.query(
    `UPDATE media SET state = 'working', progress = 0, reason = NULL,
            lease_until = now() + $2 * interval '1 second'
     WHERE hash = $1 AND state IN ('waiting','working') AND (lease_until IS NULL OR lease_until < now())
     RETURNING hash`,
    [hash, leaseSeconds],
  );
  return taken[1] === 1 ? deps.db.getRepository(MediaEntity).findOneBy({ hash }) : null;
}

const renew = (deps: Deps, hash: string, per: number) =>
  deps.db.query(
    `UPDATE media SET progress = $2, lease_until = now() + $3 * interval '1 second' WHERE hash = $1`,
    [hash, per, leaseSeconds],
  );

/** Ends a lease: with a reason when it did not go well. */
async function end(deps: Deps, hash: string, state: string, reason: string | null): Promise<void> {
  await deps.db.query(
    `UPDATE media SET state = $2, reason = $3, lease_until = NULL WHERE hash = $1`,
    [hash, state, reason],
  );
}

/**
 * Does the work on one file while nobody else does. A `Refusal` ends it for good; anything else puts it
 * back and throws, so that the queue tries again. A file that somebody else works on is left alone.
 */
export async function leased(
  deps: Deps,
  hash: string,
  { signal, last }: Turn,
  work: (leased: Leased) => Promise<void>,
): Promise<void> {
  const media = await take(deps, hash);
  if (!media) return;
  let per = 0;
  const beat = setInterval(() => void renew(deps, hash, per).catch(() => undefined), 1000);
  try {
    await work({ media, onShare: (share) => (per = Math.round(share * 100)) });
  } catch (error) {
    clearInterval(beat);
    if (error instanceof Refusal) return await end(deps, hash, 'refused', error.message);
    if (signal.aborted) await end(deps, hash, 'waiting', null);
    else await end(deps, hash, last ? 'failed' : 'waiting', last ? gaveUp : goesOn);
    throw error;
  } finally {
    clearInterval(beat);
  }
}

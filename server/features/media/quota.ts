import { limits } from '../../../shared/api/limits';
import { type PersonEntity } from '../../db/entities/person';
import { type Deps } from '../../deps';
import { ApiError } from '../../http/errors';

/** Bytes a person may keep here in all. */
export const quotaOf = (person: PersonEntity): number =>
  person.roles.includes('creator') || person.roles.includes('admin')
    ? limits.creatorBytes
    : limits.viewerBytes;

/** Bytes of somebody's files and of what is on its way. */
export async function usedBytes(deps: Deps, person: PersonEntity): Promise<number> {
  const [row] = await deps.db.query<{ used: string }[]>(
    `SELECT coalesce((SELECT sum(m.bytes) FROM media_owners o JOIN media m ON m.hash = o.hash WHERE o.person_id = $1), 0)
          + coalesce((SELECT sum(bytes) FROM uploads WHERE person_id = $1 AND state IN ('open','waiting','working')), 0) AS used`,
    [person.id],
  );
  return Number(row?.used ?? 0);
}

const gigabytes = (bytes: number) => `${(bytes / 1024 ** 3).toFixed(bytes < 1024 ** 3 ? 2 : 1)} GB`;

/** Throws, with the figures, when a file would go over a person's room. */
export async function requireRoom(
  deps: Deps,
  person: PersonEntity,
  bytes: number,
  name: string,
): Promise<void> {
  const quota = quotaOf(person);
  const used = await usedBytes(deps, person);
  if (used + bytes <= quota) return;
  throw new ApiError(
    'uploads/quota',
    `“${name}” is ${gigabytes(bytes)}; you have ${gigabytes(Math.max(0, quota - used))} left of your ${gigabytes(quota)}. Nothing was stored. Upload a smaller file, or remove some you no longer show.`,
    { meta: { quota, used, bytes } },
  );
}

import { In } from 'typeorm';
import { MediaEntity, MediaOwnerEntity } from '../../db/entities/media';
import { type PersonEntity } from '../../db/entities/person';
import { type Deps } from '../../deps';
import { missing } from '../../http/errors';
import { queueWork } from './work/queues';

export interface OwnFile {
  media: MediaEntity;
  name: string;
}

/** What somebody has uploaded, newest first, 200 at most. */
export async function ownFiles(deps: Deps, person: PersonEntity): Promise<OwnFile[]> {
  const owned = await deps.db.getRepository(MediaOwnerEntity).find({
    where: { personId: person.id },
    order: { createdAt: 'DESC' },
    take: 200,
  });
  const files = await deps.db
    .getRepository(MediaEntity)
    .findBy({ hash: In(owned.map((each) => each.hash)) });
  const byHash = new Map(files.map((media) => [media.hash, media]));
  return owned.flatMap(({ hash, name }) => {
    const media = byHash.get(hash);
    return media ? [{ media, name }] : [];
  });
}

/** One of somebody's own files; throws when it is not theirs. */
export async function ownFile(deps: Deps, person: PersonEntity, hash: string): Promise<OwnFile> {
  const owner = await deps.db
    .getRepository(MediaOwnerEntity)
    .findOneBy({ hash, personId: person.id });
  const media = owner ? await deps.db.getRepository(MediaEntity).findOneBy({ hash }) : null;
  if (!owner || !media) throw missing('That file');
  return { media, name: owner.name };
}

/** Begins the work on a file again that was given up. */
export async function workOnAgain(deps: Deps, person: PersonEntity, hash: string): Promise<void> {
  const { media } = await ownFile(deps, person, hash);
  if (media.state !== 'failed') return;
  await deps.db.transaction(async (manager) => {
    await manager.update(MediaEntity, { hash }, { state: 'waiting', reason: null });
    await queueWork(deps, media, manager);
  });
}

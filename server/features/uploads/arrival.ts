import { createHash } from 'node:crypto';
import { type EntityManager } from 'typeorm';
import { MediaEntity, MediaOwnerEntity } from '../../db/entities/media';
import { UploadEntity } from '../../db/entities/upload';
import { type Deps } from '../../deps';
import { type Turn } from '../../jobs/jobs';
import { fromBuffer } from '../../http/file-type';
import { clipTypes } from '../media/content';
import { probeClip, Refusal } from '../media/work/probe';
import { queueWork } from '../media/work/queues';
import { partsOf } from './uploads.repository';

export const arrivalQueue = 'upload-arrival';
export interface ArrivalJob {
  uploadId: string;
}
const leaseSeconds = 60;

export const queueArrival = (deps: Deps, uploadId: string, manager?: EntityManager) =>
  deps.jobs.send(arrivalQueue, uploadId, { uploadId } satisfies ArrivalJob, manager);

async function take(deps: Deps, id: string): Promise<UploadEntity | null> {
  const taken: [unknown[], number] = await deps.db.query(
    `UPDATE uploads SET state = 'working', reason = NULL, lease_until = now() + $2 * interval '1 second'
     WHERE id = $1 AND state IN ('waiting','working') AND (lease_until IS NULL OR lease_until < now())
     RETURNING id`,
    [id, leaseSeconds],
  );
  return taken[1] === 1 ? deps.db.getRepository(UploadEntity).findOneBy({ id }) : null;
}

/** Puts the parts together, unless a try before this one has done it. */
async function join(deps: Deps, upload: UploadEntity): Promise<void> {
  const bytes = Number(upload.bytes);
  if ((await deps.storage.has(upload.key)) && (await deps.storage.size(upload.key)) === bytes)
    return;
  await deps.storage.joinParts(upload.key, upload.storeId, await partsOf(deps, upload.id));
  const stored = await deps.storage.size(upload.key);
  if (stored !== bytes)
    throw new Refusal(
      `${stored} of ${bytes} bytes arrived. Nothing of it is kept. Choose the file again.`,
    );
}

async function hashOf(deps: Deps, key: string, signal: AbortSignal): Promise<string> {
  const hash = createHash('sha256');
  for await (const chunk of await deps.storage.read(key)) {
    signal.throwIfAborted();
    hash.update(chunk as Buffer);
  }
  return hash.digest('hex');
}

/** Makes an arrived upload a file of its owner's. An identical one that is here already stays the only one. */
async function adopt(
  deps: Deps,
  upload: UploadEntity,
  file: { hash: string; type: string; duration: number | null },
): Promise<void> {
  const { hash, type, duration } = file;
  const added = await deps.db.transaction(async (manager) => {
    const row = {
      hash,
      kind: 'clip' as const,
      type,
      bytes: upload.bytes,
      width: null,
      height: null,
      duration,
      renditions: {},
      state: 'waiting' as const,
      sourceKey: upload.key,
    };
    const insert = manager.createQueryBuilder().insert();
    await insert.into(MediaEntity).values(row).orIgnore().execute();
    const stored = await manager.findOneByOrFail(MediaEntity, { hash });
    const owner = { hash, personId: upload.personId, name: upload.name };
    const own = manager.createQueryBuilder().insert();
    await own.into(MediaOwnerEntity).values(owner).orIgnore().execute();
    const done = { state: 'done' as const, hash, leaseUntil: null, touchedAt: deps.now() };
    await manager.update(UploadEntity, { id: upload.id }, done);
    if (stored.state === 'waiting') await queueWork(deps, stored, manager);
    return stored.sourceKey === upload.key;
  });
  if (!added) await deps.storage.remove(upload.key);
}

async function lookInto(deps: Deps, upload: UploadEntity, signal: AbortSignal): Promise<void> {
  await join(deps, upload);
  const head = await deps.storage.getRange(upload.key, 0, 65_535);
  const type = (await fromBuffer(head))?.mime;
  if (!type || !(clipTypes as readonly string[]).includes(type))
    throw new Refusal(
      'It is not a clip we can play, whatever its name says. Nothing of it is kept. Take an MP4, WebM or QuickTime file.',
    );
  const { duration } = await probeClip(await deps.storage.insideUrl(upload.key), type, signal);
  const hash = await hashOf(deps, upload.key, signal);
  await adopt(deps, upload, { hash, type, duration });
}

async function end(deps: Deps, id: string, state: string, reason: string | null): Promise<void> {
  await deps.db.query(
    `UPDATE uploads SET state = $2, reason = $3, lease_until = NULL, touched_at = now() WHERE id = $1`,
    [id, state, reason],
  );
}

/** Looks into an upload whose parts are all here: together, of a known type, readable, hashed, adopted. */
export async function workOnArrival(
  deps: Deps,
  { uploadId }: ArrivalJob,
  { signal, last }: Turn,
): Promise<void> {
  const upload = await take(deps, uploadId);
  if (!upload) return;
  const beat = setInterval(() => {
    const renew = `UPDATE uploads SET lease_until = now() + $2 * interval '1 second' WHERE id = $1 AND state = 'working'`;
    void deps.db.query(renew, [uploadId, leaseSeconds]).catch(() => undefined);
  }, 10_000);
  try {
    await lookInto(deps, upload, signal);
  } catch (error) {
    if (error instanceof Refusal) {
      await end(deps, uploadId, 'refused', error.message);
      await deps.storage.remove(upload.key);
      return;
    }
    const gaveUp =
      'It arrived, but could not be looked into. The fault is ours; choose the file again later.';
    await end(deps, uploadId, last ? 'failed' : 'waiting', last ? gaveUp : null);
    throw error;
  } finally {
    clearInterval(beat);
  }
}

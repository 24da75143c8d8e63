import { partBytesFor, partCount, partLength, type UploadPart } from '../../../shared/api/uploads';
import { type BodyOf } from '../../../shared/api/contract';
import { type startUpload } from '../../../shared/api/uploads';
import { UploadEntity, UploadPartEntity } from '../../db/entities/upload';
import { type PersonEntity } from '../../db/entities/person';
import { type Deps } from '../../deps';
import { ApiError } from '../../http/errors';
import { requireRoom } from '../media/quota';
import { queueArrival } from './arrival';
import { ownUpload, partsOf, sameOpenUpload, type WholeUpload } from './uploads.repository';

/** How long an address for a part is good. */
export const partSeconds = 3600;

const measures = (upload: UploadEntity) => ({
  bytes: Number(upload.bytes),
  partBytes: upload.partBytes,
});

async function openUpload(deps: Deps, person: PersonEntity, id: string): Promise<UploadEntity> {
  const { upload } = await ownUpload(deps, person, id);
  if (upload.state !== 'open')
    throw new ApiError(
      'uploads/closed',
      `“${upload.name}” has arrived already, or was given up. Nothing was changed; choose the file again if it is not among your clips.`,
    );
  return upload;
}

/** Begins an upload, or goes on with the same file's that broke off. */
export async function beginUpload(
  deps: Deps,
  person: PersonEntity,
  body: BodyOf<typeof startUpload>,
): Promise<WholeUpload> {
  const before = await sameOpenUpload(deps, person, body);
  if (before) return before;
  await requireRoom(deps, person, body.bytes, body.name);
  const key = `source/upload-${body.id}`;
  const upload = deps.db.getRepository(UploadEntity).create({
    id: body.id,
    personId: person.id,
    planId: body.planId,
    name: body.name,
    mark: body.mark,
    bytes: String(body.bytes),
    partBytes: partBytesFor(body.bytes),
    key,
    storeId: await deps.storage.startParts(key, 'application/octet-stream'),
    state: 'open',
    reason: null,
    hash: null,
    leaseUntil: null,
    touchedAt: deps.now(),
  });
  await deps.db.getRepository(UploadEntity).insert(upload);
  return ownUpload(deps, person, body.id);
}

function requireNumber(upload: UploadEntity, number: number): number {
  const sizes = measures(upload);
  if (number > partCount(sizes))
    throw new ApiError(
      'request/invalid',
      `There are ${partCount(sizes)} parts, no part ${number}. Nothing was changed.`,
    );
  return partLength(sizes, number);
}

export async function signPart(
  deps: Deps,
  person: PersonEntity,
  id: string,
  number: number,
): Promise<string> {
  const upload = await openUpload(deps, person, id);
  requireNumber(upload, number);
  await deps.db.getRepository(UploadEntity).update({ id }, { touchedAt: deps.now() });
  return deps.storage.partUrl(upload.key, upload.storeId, number, partSeconds);
}

/** Writes a part into the ledger; sent twice, the later one counts, as at the store. */
export async function notePart(
  deps: Deps,
  person: PersonEntity,
  id: string,
  part: UploadPart,
): Promise<void> {
  const upload = await openUpload(deps, person, id);
  const wanted = requireNumber(upload, part.number);
  if (part.bytes !== wanted)
    throw new ApiError(
      'request/invalid',
      `Part ${part.number} has ${part.bytes} bytes instead of ${wanted}. It was not noted; send it again.`,
    );
  await deps.db
    .getRepository(UploadPartEntity)
    .upsert({ uploadId: id, number: part.number, etag: part.etag, bytes: String(part.bytes) }, [
      'uploadId',
      'number',
    ]);
}

/** Closes an upload whose parts are all in the ledger, and queues looking into it. */
export async function finishUpload(
  deps: Deps,
  person: PersonEntity,
  id: string,
): Promise<WholeUpload> {
  const { upload } = await ownUpload(deps, person, id);
  // The answer to the first asking may have been lost on its way.
  if (upload.state === 'open') {
    const there = new Set((await partsOf(deps, id)).map((part) => part.number));
    const all = Array.from({ length: partCount(measures(upload)) }, (_, i) => i + 1);
    const lacking = all.filter((number) => !there.has(number));
    if (lacking.length > 0)
      throw new ApiError(
        'uploads/incomplete',
        `${lacking.length} of ${all.length} parts are not here yet. What came is kept; send the rest.`,
        { meta: { lacking: lacking.slice(0, 100) } },
      );
    await deps.db.transaction(async (manager) => {
      await manager.update(UploadEntity, { id, state: 'open' }, { state: 'waiting' });
      await queueArrival(deps, id, manager);
    });
  }
  return ownUpload(deps, person, id);
}

/** Removes an upload and what came of it, unless it is done: then it is a file of its own. */
export async function giveUploadUp(deps: Deps, upload: UploadEntity): Promise<void> {
  if (upload.state === 'open') await deps.storage.dropParts(upload.key, upload.storeId);
  if (upload.state === 'failed') await deps.storage.remove(upload.key);
  await deps.db.getRepository(UploadEntity).delete({ id: upload.id });
}

export async function cancel(deps: Deps, person: PersonEntity, id: string): Promise<void> {
  const { upload } = await ownUpload(deps, person, id);
  if (upload.state === 'waiting' || upload.state === 'working')
    throw new ApiError(
      'uploads/closed',
      `“${upload.name}” is being looked into at this moment. Nothing was changed; try again in a minute.`,
    );
  await giveUploadUp(deps, upload);
}

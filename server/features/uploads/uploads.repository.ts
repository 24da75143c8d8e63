import { MoreThan, In } from 'typeorm';
import { type UploadPart } from '../../../shared/api/uploads';
import { MediaEntity } from '../../db/entities/media';
import { UploadEntity, UploadPartEntity } from '../../db/entities/upload';
import { type PersonEntity } from '../../db/entities/person';
import { type Deps } from '../../deps';
import { missing } from '../../http/errors';

/** An upload with the ledger of its parts, and how long the clip lasts once that is known. */
export interface WholeUpload {
  upload: UploadEntity;
  parts: UploadPart[];
  duration: number | null;
}

export async function partsOf(deps: Deps, uploadId: string): Promise<UploadPart[]> {
  const rows = await deps.db
    .getRepository(UploadPartEntity)
    .find({ where: { uploadId }, order: { number: 'ASC' } });
  return rows.map(({ number, etag, bytes }) => ({ number, etag, bytes: Number(bytes) }));
}

async function whole(deps: Deps, upload: UploadEntity): Promise<WholeUpload> {
  const media = upload.hash
    ? await deps.db.getRepository(MediaEntity).findOneBy({ hash: upload.hash })
    : null;
  const parts = upload.state === 'open' ? await partsOf(deps, upload.id) : [];
  return { upload, parts, duration: media?.duration ?? null };
}

/** One of somebody's own uploads; throws when it is not theirs. */
export async function ownUpload(
  deps: Deps,
  person: PersonEntity,
  id: string,
): Promise<WholeUpload> {
  const upload = await deps.db.getRepository(UploadEntity).findOneBy({ id, personId: person.id });
  if (!upload) throw missing('That upload');
  return whole(deps, upload);
}

/** The one of the same file that is still open. */
export async function sameOpenUpload(
  deps: Deps,
  person: PersonEntity,
  file: { mark: string; bytes: number },
): Promise<WholeUpload | null> {
  const upload = await deps.db.getRepository(UploadEntity).findOneBy({
    personId: person.id,
    mark: file.mark,
    bytes: String(file.bytes),
    state: 'open',
  });
  return upload ? whole(deps, upload) : null;
}

/** What is on its way, and what ended within a day. */
export async function recentUploads(deps: Deps, person: PersonEntity): Promise<WholeUpload[]> {
  const dayAgo = new Date(deps.now().getTime() - 24 * 3600 * 1000);
  const found = await deps.db.getRepository(UploadEntity).find({
    where: [
      { personId: person.id, state: In(['open', 'waiting', 'working']) },
      { personId: person.id, touchedAt: MoreThan(dayAgo) },
    ],
    order: { createdAt: 'DESC' },
    take: 50,
  });
  return Promise.all(found.map((upload) => whole(deps, upload)));
}

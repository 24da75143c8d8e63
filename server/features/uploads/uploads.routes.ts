import { type Router } from 'express';
import {
  cancelUpload,
  completeUpload,
  getUpload,
  listUploads,
  noteUploadPart,
  signUploadPart,
  startUpload,
  type Upload,
} from '../../../shared/api/uploads';
import { type Deps } from '../../deps';
import { route, signedIn } from '../../http/route';
import { quotaOf, usedBytes } from '../media/quota';
import { ownUpload, recentUploads, type WholeUpload } from './uploads.repository';
import {
  beginUpload,
  cancel,
  finishUpload,
  notePart,
  partSeconds,
  signPart,
} from './uploads.service';

const presentUpload = ({ upload, parts, duration }: WholeUpload): Upload => ({
  id: upload.id,
  planId: upload.planId,
  name: upload.name,
  mark: upload.mark,
  bytes: Number(upload.bytes),
  partBytes: upload.partBytes,
  state: upload.state,
  reason: upload.reason,
  hash: upload.hash,
  duration,
  parts,
  createdAt: upload.createdAt.toISOString(),
});

export function registerUploads(router: Router, deps: Deps): void {
  route(router, deps, startUpload, async ({ person, body }) => ({
    upload: presentUpload(await beginUpload(deps, signedIn(person), body)),
  }));
  route(router, deps, listUploads, async ({ person }) => ({
    items: (await recentUploads(deps, signedIn(person))).map(presentUpload),
    usedBytes: await usedBytes(deps, signedIn(person)),
    quotaBytes: quotaOf(signedIn(person)),
  }));
  route(router, deps, getUpload, async ({ person, params }) => ({
    upload: presentUpload(await ownUpload(deps, signedIn(person), params.uploadId)),
  }));
  route(router, deps, signUploadPart, async ({ person, params }) => ({
    address: await signPart(deps, signedIn(person), params.uploadId, params.number),
    expiresIn: partSeconds,
  }));
  route(router, deps, noteUploadPart, async ({ person, params, body }) =>
    notePart(deps, signedIn(person), params.uploadId, { number: params.number, ...body }),
  );
  route(router, deps, completeUpload, async ({ person, params }) => ({
    upload: presentUpload(await finishUpload(deps, signedIn(person), params.uploadId)),
  }));
  route(router, deps, cancelUpload, async ({ person, params }) =>
    cancel(deps, signedIn(person), params.uploadId),
  );
}

import { mkdirSync, unlink } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { type RequestHandler, type Router } from 'express';
import multer, { MulterError } from 'multer';
import {
  listMedia,
  uploadCaptions,
  uploadClip,
  uploadPhoto,
  type Media,
} from '../../../shared/api/media';
import { type UploadSpec } from '../../../shared/api/contract';
import { type MediaEntity } from '../../db/entities/media';
import { type PersonEntity } from '../../db/entities/person';
import { type Deps } from '../../deps';
import { ApiError } from '../../http/errors';
import { route, signedIn } from '../../http/route';
import { keepCaptions, keepClip, keepPhoto, type Arrived } from './media.service';

const folder = join(tmpdir(), 'scantling-uploads');

const presentMedia = (m: MediaEntity, name: string): Media => ({
  hash: m.hash,
  kind: m.kind,
  bytes: Number(m.bytes),
  type: m.type,
  name,
  width: m.width,
  height: m.height,
  duration: m.duration,
  renditions: Object.keys(m.renditions),
  createdAt: m.createdAt.toISOString(),
});

/** Takes one file to disk, and takes it away again when the request is over. */
function receive(spec: UploadSpec): RequestHandler {
  mkdirSync(folder, { recursive: true });
  const take = multer({
    dest: folder,
    limits: { fileSize: spec.maxBytes, files: 1, fields: 4 },
  }).single(spec.field);
  return (req, res, next) => {
    res.on('close', () => {
      if (req.file) unlink(req.file.path, () => undefined);
    });
    take(req, res, (error: unknown) => {
      if (!(error instanceof MulterError)) return next(error);
      const tooLarge = error.code === 'LIMIT_FILE_SIZE';
      next(
        tooLarge
          ? new ApiError(
              'request/too-large',
              `The file is over ${Math.floor(spec.maxBytes / 1024 / 1024)} MB. Nothing was stored; choose a smaller one.`,
            )
          : new ApiError(
              'uploads/missing',
              `Send one file in the field “${spec.field}”. Nothing was stored.`,
            ),
      );
    });
  };
}

function arrived(file: Express.Multer.File | undefined): Arrived {
  if (!file)
    throw new ApiError(
      'uploads/missing',
      'No file came with the request. Nothing was stored; choose a file.',
    );
  return { path: file.path, name: Buffer.from(file.originalname, 'latin1').toString('utf8') };
}

type Keep = (deps: Deps, person: PersonEntity, file: Arrived) => Promise<MediaEntity>;

export function registerMedia(router: Router, deps: Deps): void {
  const mount = (contract: typeof uploadPhoto, keep: Keep) =>
    route(
      router,
      deps,
      contract,
      async ({ req, person }) => {
        const file = arrived(req.file);
        return { media: presentMedia(await keep(deps, signedIn(person), file), file.name) };
      },
      receive(contract.upload ?? { field: 'file', maxBytes: 1 }),
    );
  mount(uploadPhoto, keepPhoto);
  mount(uploadClip, keepClip);
  mount(uploadCaptions, keepCaptions);
  route(router, deps, listMedia, async ({ person }) => {
    const rows: (MediaEntity & { name: string; owned_at: Date; created_at: Date })[] =
      await deps.db.query(
        `SELECT m.*, o.name FROM media_owners o JOIN media m ON m.hash = o.hash WHERE o.person_id = $1 ORDER BY o.created_at DESC LIMIT 200`,
        [signedIn(person).id],
      );
    return {
      items: rows.map((row) => presentMedia({ ...row, createdAt: row.created_at }, row.name)),
    };
  });
}

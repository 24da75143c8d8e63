import { mkdirSync, unlink } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { type RequestHandler, type Router } from 'express';
import multer, { MulterError } from 'multer';
import {
  getMedia,
  getRenditions,
  listMedia,
  uploadCaptions,
  uploadClip,
  uploadPhoto,
  workAgain,
} from '../../../shared/api/media';
import { type UploadSpec } from '../../../shared/api/contract';
import { MediaEntity } from '../../db/entities/media';
import { type PersonEntity } from '../../db/entities/person';
import { type Deps } from '../../deps';
import { ApiError, missing } from '../../http/errors';
import { route, signedIn } from '../../http/route';
import { maySee } from './media.files';
import { presentMedia } from './media.presenter';
import { ownFile, ownFiles, workOnAgain } from './media.repository';
import { keepCaptions, keepClip, keepPhoto, type Arrived } from './media.service';

const folder = join(tmpdir(), 'scantling-uploads');

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
    const files = await ownFiles(deps, signedIn(person));
    return { items: files.map(({ media, name }) => presentMedia(media, name)) };
  });
  route(router, deps, getMedia, async ({ person, params }) => {
    const { media, name } = await ownFile(deps, signedIn(person), params.hash);
    return { media: presentMedia(media, name) };
  });
  route(router, deps, getRenditions, async ({ person, params: { hash } }) => {
    const media = (await maySee(deps, hash, person))
      ? await deps.db.getRepository(MediaEntity).findOneBy({ hash })
      : null;
    if (!media) throw missing('That picture or clip');
    return { renditions: Object.keys(media.renditions) };
  });
  route(router, deps, workAgain, async ({ person, params }) => {
    await workOnAgain(deps, signedIn(person), params.hash);
    const { media, name } = await ownFile(deps, signedIn(person), params.hash);
    return { media: presentMedia(media, name) };
  });
}

import { createHash } from 'node:crypto';
import { createReadStream } from 'node:fs';
import { readFile, stat } from 'node:fs/promises';
import { pipeline } from 'node:stream/promises';
import sharp from 'sharp';
import { readCaptions, toVtt } from '../../../shared/captions';
import { MediaEntity, MediaOwnerEntity } from '../../db/entities/media';
import { type PersonEntity } from '../../db/entities/person';
import { type Deps } from '../../deps';
import { ApiError } from '../../http/errors';
import { clipTypes, contentType, mp4Duration, photoTypes } from './content';
import { requireRoom } from './quota';
import { maxPixels, photoSizes } from './photo-sizes';
import { queueWork } from './work/queues';

/** A file as it arrived, in the temporary folder. */
export interface Arrived {
  path: string;
  name: string;
}

async function hashFile(path: string): Promise<string> {
  const hash = createHash('sha256');
  await pipeline(createReadStream(path), hash);
  return hash.digest('hex');
}

const hashOf = (bytes: Buffer): string => createHash('sha256').update(bytes).digest('hex');

async function requireSize(file: Arrived): Promise<number> {
  const { size } = await stat(file.path);
  if (size === 0)
    throw new ApiError(
      'uploads/empty',
      'The file is empty; nothing was stored. Choose it again, or another one.',
    );
  return size;
}

type New = Omit<MediaEntity, 'createdAt' | 'leaseUntil' | 'progress' | 'reason'>;

/** Keeps the row and its owner; an identical file is stored once. */
async function keep(
  deps: Deps,
  person: PersonEntity,
  media: New,
  name: string,
): Promise<MediaEntity> {
  return deps.db.transaction(async (manager) => {
    await manager
      .createQueryBuilder()
      .insert()
      .into(MediaEntity)
      .values(media)
      .orIgnore()
      .execute();
    const stored = await manager.getRepository(MediaEntity).findOneByOrFail({ hash: media.hash });
    if (stored.state === 'waiting') await queueWork(deps, stored, manager);
    await manager
      .createQueryBuilder()
      .insert()
      .into(MediaOwnerEntity)
      .values({ hash: media.hash, personId: person.id, name: name.slice(0, 200) })
      .orIgnore()
      .execute();
    return stored;
  });
}

/** Keeps a clip and queues the work on it. `asShown`: it is already as it is to be shown (the demo's own drawings). */
export async function keepClip(
  deps: Deps,
  person: PersonEntity,
  file: Arrived,
  asShown = false,
): Promise<MediaEntity> {
  const bytes = await requireSize(file);
  await requireRoom(deps, person, bytes, file.name);
  const type = await contentType(file.path);
  if (!type || !(clipTypes as readonly string[]).includes(type)) {
    throw new ApiError(
      'uploads/type',
      `“${file.name}” is not a clip we can play, whatever its name says. Nothing was stored; take an MP4, WebM or QuickTime file.`,
    );
  }
  const duration = type === 'video/webm' ? null : await mp4Duration(file.path, bytes);
  if (duration === null && type !== 'video/webm') {
    throw new ApiError(
      'uploads/unreadable',
      `“${file.name}” has no readable end; it may have been cut off on its way. Nothing was stored; export it again and try once more.`,
    );
  }
  const hash = await hashFile(file.path);
  const key = asShown ? `clip/${hash}/720` : `source/${hash}`;
  if (!(await deps.storage.has(key)))
    await deps.storage.put(key, createReadStream(file.path), { type, bytes });
  return keep(
    deps,
    person,
    {
      hash,
      kind: 'clip',
      type,
      bytes: String(bytes),
      width: null,
      height: null,
      duration,
      // Shown only when the work on it is done: the file itself may tell where it was made.
      renditions: asShown ? { 720: { key, type }, 360: { key, type } } : {},
      state: asShown ? 'ready' : 'waiting',
      sourceKey: asShown ? null : key,
    },
    file.name,
  );
}

type Scaled = Awaited<ReturnType<typeof scale>>;

function scale(path: string, width: number) {
  return sharp(path, { limitInputPixels: maxPixels })
    .autoOrient()
    .resize({ width, height: width, fit: 'inside', withoutEnlargement: true })
    .webp({ quality: 82 })
    .toBuffer({ resolveWithObject: true });
}

async function scaled(file: Arrived): Promise<[string, Scaled][]> {
  const sizes: [string, Scaled][] = [];
  try {
    for (const [name, width] of Object.entries(photoSizes))
      sizes.push([name, await scale(file.path, width)]);
    return sizes;
  } catch {
    throw new ApiError(
      'uploads/unreadable',
      `“${file.name}” could not be read as a picture; it may have been cut off on its way. Nothing was stored; save it again and try once more.`,
    );
  }
}

/** Refuses a picture that would not fit in memory, by what its first bytes say of it. */
async function requireFewPixels(file: Arrived): Promise<void> {
  const { width = 0, height = 0 } = await sharp(file.path, { limitInputPixels: false })
    .metadata()
    .catch(() => ({ width: 0, height: 0 }));
  if (width * height > maxPixels)
    throw new ApiError(
      'uploads/unreadable',
      `“${file.name}” is ${width} × ${height} points; 100 million in all is the most. Nothing was stored; save it smaller and try again.`,
    );
}

/** Turned upright, everything about place and device left out, as WebP at once; the other formats follow. */
export async function keepPhoto(
  deps: Deps,
  person: PersonEntity,
  file: Arrived,
): Promise<MediaEntity> {
  const size = await requireSize(file);
  await requireRoom(deps, person, size, file.name);
  const type = await contentType(file.path);
  if (!type || !(photoTypes as readonly string[]).includes(type)) {
    throw new ApiError(
      'uploads/type',
      `“${file.name}” is not a picture we can show, whatever its name says. Nothing was stored; take a JPEG, PNG or WebP file.`,
    );
  }
  await requireFewPixels(file);
  const sizes = await scaled(file);
  const { info, data } = sizes[0]![1];
  const hash = hashOf(data);
  const renditions: New['renditions'] = {};
  for (const [name, { data: picture }] of sizes) {
    const key = `photo/${hash}/${name}`;
    if (!(await deps.storage.has(key)))
      await deps.storage.put(key, picture, { type: 'image/webp', bytes: picture.length });
    renditions[name] = { key, type: 'image/webp' };
  }
  // Kept out of reach until the other formats are made of it, then removed.
  const sourceKey = `source/photo-${hash}`;
  if (!(await deps.storage.has(`photo/${hash}/large.jpeg`)))
    await deps.storage.put(sourceKey, createReadStream(file.path), { type, bytes: size });
  const row: New = {
    hash,
    kind: 'photo',
    type: 'image/webp',
    bytes: String(data.length),
    width: info.width,
    height: info.height,
    duration: null,
    renditions,
    state: 'waiting',
    sourceKey,
  };
  return keep(deps, person, row, file.name);
}

/** Read by its content, kept as WebVTT. */
export async function keepCaptions(
  deps: Deps,
  person: PersonEntity,
  file: Arrived,
): Promise<MediaEntity> {
  await requireSize(file);
  const text = (await readFile(file.path)).toString('utf8');
  const captions = readCaptions(text);
  if (captions.cues.length === 0) {
    const fault = captions.faults[0];
    throw new ApiError(
      'uploads/unreadable',
      `“${file.name}” holds no captions we can read${fault ? ` (line ${fault.line}: ${fault.sentence})` : ''}. Nothing was stored; export it as .vtt or .srt and try again.`,
    );
  }
  const vtt = Buffer.from(toVtt(captions.cues));
  const hash = hashOf(vtt);
  const key = `captions/${hash}`;
  const type = 'text/vtt';
  if (!(await deps.storage.has(key))) await deps.storage.put(key, vtt, { type, bytes: vtt.length });
  const duration = captions.cues.reduce((end, cue) => Math.max(end, cue.end), 0);
  return keep(
    deps,
    person,
    {
      hash,
      kind: 'captions',
      type,
      bytes: String(vtt.length),
      width: null,
      height: null,
      duration,
      renditions: { original: { key, type } },
      state: 'ready',
      sourceKey: null,
    },
    file.name,
  );
}

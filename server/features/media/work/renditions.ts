import { join } from 'node:path';
import sharp from 'sharp';
import { stripFrames } from '../../../../shared/api/media';
import { quietly, runTool } from './ffmpeg';
import { readAs, Refusal, type ClipFacts } from './probe';

/** A file that was made, and what it is. */
export interface Made {
  name: string;
  path: string;
  type: string;
}

/** Nothing of the source but its first picture and sound; no titles, places, chapters, dates, devices. */
const onlyFilm = [
  ...['-map', '0:v:0', '-map', '0:a:0?', '-map_metadata', '-1', '-map_metadata:s', '-1'],
  ...['-map_chapters', '-1', '-dn', '-sn', '-fflags', '+bitexact'],
];
const fastStart = ['-movflags', '+faststart', '-f', 'mp4'];

/** The shorter side to so many points, never enlarged; even sides, as H.264 wants them. */
const scaled = (points: number) =>
  `scale='if(gt(iw,ih),-2,min(${points},trunc(iw/2)*2))':'if(gt(iw,ih),min(${points},trunc(ih/2)*2),-2)'`;

/** H.264 and AAC with a key picture each second, so that a step's stretch starts at once. Loudness as it came. */
const encoded = (points: number, quality: number) => [
  ...onlyFilm,
  ...['-vf', scaled(points), '-c:v', 'libx264', '-preset', 'veryfast', '-crf', String(quality)],
  ...['-pix_fmt', 'yuv420p', '-force_key_frames', 'expr:gte(t,n_forced)'],
  ...['-flags:v', '+bitexact', '-flags:a', '+bitexact'],
  ...['-c:a', 'aac', '-b:a', '128k', '-ac', '2', ...fastStart],
];

/** Streams taken over as they are, without what a camera writes between the pictures (SEI units). */
const takenOver = [
  ...onlyFilm,
  ...['-c', 'copy', '-bsf:v', 'filter_units=remove_types=6', ...fastStart],
];

export interface Making {
  source: string;
  type: string;
  facts: ClipFacts;
  folder: string;
  signal: AbortSignal;
  /** 0…1 */
  onShare: (share: number) => void;
}

/** The clip at 720 and 360 points, from one reading of the source. A small plain one is taken over once. */
export async function makeFilms(making: Making): Promise<Made[]> {
  const { source, type, facts, folder, signal, onShare } = making;
  const short = Math.min(facts.width, facts.height);
  const large = { name: '720', path: join(folder, '720.mp4'), type: 'video/mp4' };
  const small = { name: '360', path: join(folder, '360.mp4'), type: 'video/mp4' };
  const two = short > 400;
  const first = facts.plain ? takenOver : encoded(720, 23);
  const outputs = [...first, large.path, ...(two ? [...encoded(360, 25), small.path] : [])];
  const args = [
    ...quietly,
    '-y',
    '-threads',
    '2',
    '-progress',
    'pipe:1',
    ...readAs(type, source),
    ...outputs,
  ];
  const { status, stderr } = await runTool('ffmpeg', args, {
    signal,
    onSeconds: (seconds) => onShare(facts.duration ? Math.min(1, seconds / facts.duration) : 0),
  });
  signal.throwIfAborted();
  if (status !== 0) {
    if (/no space left/i.test(stderr)) throw new Error(stderr);
    throw new Refusal(
      'Its pictures cannot be decoded; the file may be damaged. Nothing of it is shown. Export it again and upload that.',
    );
  }
  return two ? [large, small] : [large, { ...small, path: large.path }];
}

/** One picture to stand for the clip, and `stripFrames` of them side by side for the story stick. */
export async function makePictures(
  film: string,
  duration: number,
  folder: string,
  signal: AbortSignal,
): Promise<Made[]> {
  const shot = join(folder, 'poster.png');
  const row = join(folder, 'strip.png');
  const input = readAs('video/mp4', film);
  const at = String(Math.min(3, duration / 3));
  const poster = [...quietly, '-y', '-ss', at, ...input, '-frames:v', '1', shot];
  // Key pictures alone are enough for a long clip, and many times faster.
  const keys = duration > 120 ? ['-skip_frame', 'nokey'] : [];
  const filter = `fps=${stripFrames}/${duration.toFixed(3)},scale=160:-2,tile=${stripFrames}x1`;
  const strip = [...quietly, '-y', ...keys, ...input, '-vf', filter, '-frames:v', '1', row];
  const made: Made[] = [];
  for (const [name, args, png] of [
    ['poster', poster, shot],
    ['strip', strip, row],
  ] as const) {
    const { status, stderr } = await runTool('ffmpeg', args, { signal });
    signal.throwIfAborted();
    // A clip of a single moment may have no picture there; it then goes without.
    if (status !== 0 && stderr !== '') throw new Error(stderr);
    const path = join(folder, `${name}.webp`);
    const ok = await sharp(png)
      .resize({ width: name === 'poster' ? 1280 : 3840, withoutEnlargement: true })
      .webp({ quality: 80 })
      .toFile(path)
      .then(() => true)
      .catch(() => false);
    if (ok) made.push({ name, path, type: 'image/webp' });
  }
  return made;
}

/** A stretch of a film as a file of its own, cut to the frame. */
export async function cutStretch(
  film: string,
  stretch: { name: string; start: number; end: number },
  folder: string,
  signal: AbortSignal,
): Promise<Made> {
  const path = join(folder, `${stretch.name}.mp4`);
  const length = String(stretch.end - stretch.start);
  const input = ['-ss', String(stretch.start), ...readAs('video/mp4', film), '-t', length];
  const args = [...quietly, '-y', '-threads', '2', ...input, ...encoded(720, 24), path];
  const { status, stderr } = await runTool('ffmpeg', args, { signal });
  signal.throwIfAborted();
  if (status !== 0) throw new Error(stderr);
  return { name: stretch.name, path, type: 'video/mp4' };
}

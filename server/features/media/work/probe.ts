import { z } from 'zod';
import { runTool } from './ffmpeg';

/** Not a file we take, and why: a person reads it. It is not tried again. */
export class Refusal extends Error {
  override readonly name = 'Refusal';
}

const probeSchema = z.object({
  format: z.object({
    duration: z.coerce.number().optional(),
    bit_rate: z.coerce.number().optional(),
  }),
  streams: z.array(
    z.object({
      codec_type: z.string().optional(),
      codec_name: z.string().optional(),
      pix_fmt: z.string().optional(),
      width: z.number().optional(),
      height: z.number().optional(),
      disposition: z.object({ attached_pic: z.number() }).optional(),
      side_data_list: z.array(z.object({ rotation: z.number().optional() })).optional(),
    }),
  ),
});

/** What is known of a clip before anything is made of it. */
export interface ClipFacts {
  /** Seconds; null when the file does not say. */
  duration: number | null;
  /** As it is shown: turned upright. */
  width: number;
  height: number;
  /** H.264 and AAC, upright, small: its streams can be taken over as they are. */
  plain: boolean;
}

const longestSeconds = 6 * 3600;
const largestSide = 8192;
/** The readers we let loose on a file; none of them opens other files or addresses. */
const readers: Record<string, string> = {
  'video/mp4': 'mov',
  'video/quicktime': 'mov',
  'video/x-m4v': 'mov',
  'video/webm': 'matroska',
  'video/matroska': 'matroska',
};

/** Arguments that make ffmpeg read a local file, or one of our own signed addresses, as just its type. */
export const readAs = (type: string, path: string): string[] => [
  '-protocol_whitelist',
  /^https?:/.test(path) ? 'http,https,tcp,tls' : 'file',
  '-f',
  readers[type] ?? 'mov',
  '-i',
  path,
];

/** Looks into a clip with ffprobe. Throws `Refusal` when there is no film in it that can be shown. */
export async function probeClip(
  path: string,
  type: string,
  signal: AbortSignal,
): Promise<ClipFacts> {
  const show = ['-v', 'error', '-print_format', 'json', '-show_format', '-show_streams'];
  const { status, stdout } = await runTool('ffprobe', [...show, ...readAs(type, path)], { signal });
  const read = status === 0 ? probeSchema.safeParse(JSON.parse(stdout.toString() || '{}')) : null;
  if (!read?.success)
    throw new Refusal(
      'It cannot be read as a film; it may have been cut off on its way. Nothing of it is kept. Export it again and upload that.',
    );
  const { streams, format } = read.data;
  const film = streams.find(
    (s) => s.codec_type === 'video' && s.disposition?.attached_pic !== 1 && s.width && s.height,
  );
  if (!film?.width || !film.height)
    throw new Refusal(
      'There is sound in it at most, no picture. Nothing of it is kept. Upload the film.',
    );
  const duration = format.duration ?? null;
  if (duration !== null && duration > longestSeconds)
    throw new Refusal(
      'It lasts over six hours. Nothing of it is kept. Cut it to the build and upload that.',
    );
  if (Math.max(film.width, film.height) > largestSide)
    throw new Refusal(
      `Its picture is ${film.width} × ${film.height} points; ${largestSide} a side is the most. Nothing of it is kept. Export it smaller.`,
    );
  const turn = film.side_data_list?.find((s) => s.rotation !== undefined)?.rotation ?? 0;
  const sound = streams.filter((s) => s.codec_type === 'audio');
  const onSide = Math.abs(turn % 180) === 90;
  return {
    duration,
    width: onSide ? film.height : film.width,
    height: onSide ? film.width : film.height,
    plain:
      film.codec_name === 'h264' &&
      film.pix_fmt === 'yuv420p' &&
      turn === 0 &&
      Math.min(film.width, film.height) <= 720 &&
      (format.bit_rate ?? Infinity) < 3_000_000 &&
      sound.every((s) => s.codec_name === 'aac'),
  };
}

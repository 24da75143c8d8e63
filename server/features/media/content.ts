import { open } from 'node:fs/promises';
import { fromFile } from '../../http/file-type';

/** What a clip may be, by its content. */
export const clipTypes = ['video/mp4', 'video/webm', 'video/quicktime', 'video/x-m4v'] as const;
export const photoTypes = [
  'image/jpeg',
  'image/png',
  'image/webp',
  'image/avif',
  'image/gif',
] as const;

/** The type of a file by its first bytes; null when nothing known begins like that. */
export async function contentType(path: string): Promise<string | null> {
  return (await fromFile(path))?.mime ?? null;
}

interface Box {
  type: string;
  start: number;
  size: number;
}

async function readAt(path: string, start: number, length: number): Promise<Buffer> {
  const file = await open(path);
  try {
    const buffer = Buffer.alloc(length);
    const { bytesRead } = await file.read(buffer, 0, length, start);
    return buffer.subarray(0, bytesRead);
  } finally {
    await file.close();
  }
}

/** Boxes of an MP4 between two places (ISO/IEC 14496-12: 32-bit size and type; size 1 means 64-bit, 0 to the end). */
async function boxes(path: string, from: number, to: number): Promise<Box[]> {
  const found: Box[] = [];
  let at = from;
  while (at + 8 <= to && found.length < 200) {
    const head = await readAt(path, at, 16);
    if (head.length < 8) break;
    const small = head.readUInt32BE(0);
    const size =
      small === 1 && head.length === 16
        ? Number(head.readBigUInt64BE(8))
        : small === 0
          ? to - at
          : small;
    if (size < 8 || at + size > to) break;
    found.push({ type: head.toString('latin1', 4, 8), start: at, size });
    at += size;
  }
  return found;
}

/** Seconds an MP4 lasts, from its movie header; null when it has none that can be read (cut off, say). */
export async function mp4Duration(path: string, bytes: number): Promise<number | null> {
  const moov = (await boxes(path, 0, bytes)).find((b) => b.type === 'moov');
  if (!moov) return null;
  const mvhd = (await boxes(path, moov.start + 8, moov.start + moov.size)).find(
    (b) => b.type === 'mvhd',
  );
  if (!mvhd) return null;
  const body = await readAt(path, mvhd.start + 8, 32);
  const long = body[0] === 1;
  const scale = body.readUInt32BE(long ? 20 : 12);
  const length = long ? Number(body.readBigUInt64BE(24)) : body.readUInt32BE(16);
  return scale > 0 ? length / scale : null;
}

import { execFileSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import sharp from 'sharp';

/** Coordinates planted in test files; invented, in the open sea. */
export const place = {
  iso6709: '+12.3456-045.6789/',
  latitude: '12.3456',
  camera: 'Planted Camera 7',
};

/** A short test film with sound, with a place in its boxes as phones write it. `more` goes before the output. */
export function makeClip(seconds: number, size = '1280x720', more: readonly string[] = []): Buffer {
  const folder = mkdtempSync(join(tmpdir(), 'scantling-clip-'));
  const path = join(folder, 'clip.mp4');
  const at = (source: string) => ['-f', 'lavfi', '-t', String(seconds), '-i', source];
  const where = ['location', 'location-eng', 'com.apple.quicktime.location.ISO6709'];
  execFileSync('ffmpeg', [
    ...['-loglevel', 'error', ...at(`testsrc2=size=${size}:rate=25`), ...at('sine=frequency=440')],
    ...['-c:v', 'libx264', '-preset', 'ultrafast', '-pix_fmt', 'yuv420p', '-c:a', 'aac'],
    ...where.flatMap((name) => ['-metadata', `${name}=${place.iso6709}`]),
    ...[
      '-metadata',
      `com.apple.quicktime.model=${place.camera}`,
      '-metadata:s:v',
      `title=${place.camera}`,
    ],
    ...['-metadata', `comment=${place.camera} ${place.iso6709}`, '-movflags', '+use_metadata_tags'],
    ...more,
    path,
  ]);
  const bytes = readFileSync(path);
  rmSync(folder, { recursive: true });
  return bytes;
}

/** The same film with a note that it is to be turned by a quarter, as a phone held upright writes it. */
export function turned(clip: Buffer): Buffer {
  const folder = mkdtempSync(join(tmpdir(), 'scantling-clip-'));
  const [from, to] = [join(folder, 'from.mp4'), join(folder, 'to.mp4')];
  writeFileSync(from, clip);
  const turn = ['-c', 'copy', '-metadata:s:v:0', 'rotate=90'];
  execFileSync('ffmpeg', ['-loglevel', 'error', '-i', from, ...turn, to]);
  const bytes = readFileSync(to);
  rmSync(folder, { recursive: true });
  return bytes;
}

/** A photo lying on its side, with place and device in EXIF and XMP. */
export function makePhoto(): Promise<Buffer> {
  const exif = {
    IFD0: { Make: place.camera, ImageDescription: `at ${place.iso6709}` },
    IFD3: { GPSLatitudeRef: 'N', GPSLatitude: '12/1 20/1 4416/100', GPSLongitudeRef: 'W' },
  };
  const xmp = `<?xpacket begin="" id="W5M0MpCehiHzreSzNTczkc9d"?><x:xmpmeta xmlns:x="adobe:ns:meta/"><rdf:RDF xmlns:rdf="http://www.w3.org/1999/02/22-rdf-syntax-ns#"><rdf:Description xmlns:exif="http://ns.adobe.com/exif/1.0/" exif:GPSLatitude="${place.latitude}N"/></rdf:RDF></x:xmpmeta>`;
  return sharp({ create: { width: 640, height: 400, channels: 3, background: '#8899aa' } })
    .jpeg()
    .withMetadata({ orientation: 6 })
    .withExifMerge(exif)
    .withXmp(xmp)
    .toBuffer();
}

/** What of a file tells where or with what it was made; empty is the goal. */
export function tells(bytes: Buffer): string[] {
  const text = bytes.toString('latin1');
  const words = [
    place.iso6709,
    place.latitude,
    place.camera,
    'Exif\0\0',
    'GPSLatitude',
    'adobe:ns:meta',
  ];
  // A box's name, with the first bytes of its small size: bare it may turn up in any pictures.
  const box = /\0\0[^]{2}(loci|\xa9xyz)/.exec(text)?.[1];
  return [...[...words, 'ISO6709'].filter((word) => text.includes(word)), ...(box ? [box] : [])];
}

/** The header of a PNG that says it is so large, with nothing behind it. CRCs as PNG (ISO/IEC 15948) wants them. */
export function hugePng(side: number): Buffer {
  const chunk = (type: string, data: Buffer) => {
    const body = Buffer.concat([Buffer.from(type, 'latin1'), data]);
    const head = Buffer.alloc(4);
    head.writeUInt32BE(data.length);
    const crc = Buffer.alloc(4);
    crc.writeUInt32BE(crc32(body));
    return Buffer.concat([head, body, crc]);
  };
  const ihdr = Buffer.alloc(13);
  ihdr.writeUInt32BE(side, 0);
  ihdr.writeUInt32BE(side, 4);
  ihdr.set([8, 2, 0, 0, 0], 8);
  return Buffer.concat([
    Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]),
    chunk('IHDR', ihdr),
    chunk('IDAT', Buffer.from([0x78, 0x9c, 0x03, 0x00, 0x00, 0x00, 0x00, 0x01])),
    chunk('IEND', Buffer.alloc(0)),
  ]);
}

function crc32(bytes: Buffer): number {
  let crc = 0xffffffff;
  for (const byte of bytes) {
    crc ^= byte;
    for (let i = 0; i < 8; i += 1) crc = (crc >>> 1) ^ (crc & 1 ? 0xedb88320 : 0);
  }
  return (crc ^ 0xffffffff) >>> 0;
}

/** A clip made longer to so many bytes by a `free` box behind it (ISO/IEC 14496-12 §8.1.2), filled by a seed. */
export function padded(clip: Buffer, bytes: number): Buffer {
  const box = Buffer.alloc(bytes - clip.length);
  let x = 2463534242;
  for (let i = 8; i < box.length; i += 4096) {
    x ^= x << 13;
    x ^= x >>> 17;
    x ^= x << 5;
    box.writeUInt32LE(x >>> 0, Math.min(i, box.length - 4));
  }
  box.writeUInt32BE(box.length, 0);
  box.write('free', 4, 'latin1');
  return Buffer.concat([clip, box]);
}

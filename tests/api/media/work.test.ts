import { createHash } from 'node:crypto';
import { execFileSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import sharp from 'sharp';
import { type Media } from '../../../shared/api/media';
import { type Problem } from '../../../shared/api/problem';
import { startMediaWork } from '../../../server/features/media/work';
import { startJobs } from '../../../server/jobs/jobs';
import { testApp, type TestApp } from '../setup/app';
import { hugePng, makeClip, makePhoto, tells, turned } from './files';

let app: TestApp;
let maker: Awaited<ReturnType<TestApp['as']>>;
beforeAll(async () => {
  app = await testApp({ mediaWork: true });
  maker = await app.as(await app.person(['viewer', 'creator']));
}, 60_000);
afterAll(async () => {
  await app.close();
}, 30_000);

const send = (kind: 'clip' | 'photo', bytes: Buffer, name: string) =>
  maker.post(`/api/uploads/${kind}`).attach('file', bytes, name);
const mediaOf = (answer: { body: unknown }) => (answer.body as { media: Media }).media;

/** Asks until the work on a file is over. */
async function worked(hash: string): Promise<Media> {
  for (;;) {
    const media = mediaOf(await maker.get(`/api/uploads/files/${hash}`));
    if (media.state !== 'waiting' && media.state !== 'working') return media;
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
}

async function fetched(hash: string, rendition: string, accept = '*/*') {
  const lead = await maker.get(`/media/${hash}/${rendition}`).set('Accept', accept);
  expect(lead.status).toBe(302);
  const answer = await fetch(lead.headers.location as string);
  return {
    bytes: Buffer.from(await answer.arrayBuffer()),
    type: answer.headers.get('content-type'),
  };
}

interface Streams {
  streams: { codec_name: string; width?: number; height?: number }[];
  format: { duration: string; tags?: Record<string, string> };
}
function probe(bytes: Buffer): Streams {
  const folder = mkdtempSync(join(tmpdir(), 'scantling-probe-'));
  writeFileSync(join(folder, 'f'), bytes);
  const args = ['-v', 'error', '-print_format', 'json', '-show_format', '-show_streams'];
  const out = execFileSync('ffprobe', [...args, join(folder, 'f')]).toString();
  rmSync(folder, { recursive: true });
  return JSON.parse(out) as Streams;
}
const beginsWithMoov = (bytes: Buffer) =>
  bytes.indexOf('moov', 0, 'latin1') < bytes.indexOf('mdat', 0, 'latin1');

describe('the work on a clip', () => {
  it('makes 720 and 360 points, a poster and a contact strip, and tells no place or device', async () => {
    const source = makeClip(3, '1600x900');
    expect(tells(source)).not.toEqual([]);
    const sent = mediaOf(await send('clip', source, 'a walk.mp4'));
    expect(['waiting', 'working']).toContain(sent.state);
    expect(sent.hash).toBe(createHash('sha256').update(source).digest('hex'));
    const media = await worked(sent.hash);
    expect(media).toMatchObject({ state: 'ready', width: 1600, height: 900, reason: null });
    expect(media.renditions.sort()).toEqual(['360', '720', 'poster', 'strip']);
    for (const [name, width, height] of [
      ['720', 1280, 720],
      ['360', 640, 360],
    ] as const) {
      const { bytes, type } = await fetched(sent.hash, name);
      const { streams, format } = probe(bytes);
      expect([type, ...streams.map((s) => s.codec_name)]).toEqual(['video/mp4', 'h264', 'aac']);
      expect(streams[0]).toMatchObject({ width, height });
      expect(Number(format.duration)).toBeCloseTo(3, 0);
      expect([tells(bytes), beginsWithMoov(bytes)]).toEqual([[], true]);
    }
    const strip = await sharp((await fetched(sent.hash, 'strip')).bytes).metadata();
    expect([strip.width, strip.height]).toEqual([3840, 90]);
    // The file as it was sent answers under no name.
    expect(probe((await fetched(sent.hash, 'original')).bytes).streams[0]?.height).toBe(720);
  }, 60_000);

  it('takes a small plain clip over as it is, without what the camera wrote into it', async () => {
    const sent = mediaOf(await send('clip', makeClip(2, '480x360'), 'small.mp4'));
    expect((await worked(sent.hash)).state).toBe('ready');
    const { bytes } = await fetched(sent.hash, '720');
    expect([tells(bytes), beginsWithMoov(bytes)]).toEqual([[], true]);
    expect((await fetched(sent.hash, '360')).bytes.equals(bytes)).toBe(true);
  }, 60_000);

  it('turns a clip upright that was filmed on its side', async () => {
    const lying = turned(makeClip(1, '1280x720'));
    const media = await worked(mediaOf(await send('clip', lying, 'upright.mov')).hash);
    expect([media.state, media.width, media.height]).toEqual(['ready', 720, 1280]);
    expect(probe((await fetched(media.hash, '360')).bytes).streams[0]).toMatchObject({
      width: 360,
      height: 640,
    });
  }, 60_000);
});

describe('the work on a photo', () => {
  it('bakes the turn in and leaves no EXIF or XMP in any size or format', async () => {
    const source = await makePhoto();
    expect(tells(source).length).toBeGreaterThan(2);
    const sent = mediaOf(await send('photo', source, 'bench.jpg'));
    // Lying 640 × 400 with orientation 6: upright it is 400 × 640 (EXIF 2.32, tag 274).
    expect([sent.width, sent.height]).toEqual([400, 640]);
    const media = await worked(sent.hash);
    expect(media.state).toBe('ready');
    for (const size of ['large', 'medium', 'thumb']) {
      for (const [accept, format] of [
        ['image/avif,image/webp,*/*', 'heif'],
        ['image/webp,*/*', 'webp'],
        ['*/*', 'jpeg'],
      ] as const) {
        const { bytes } = await fetched(sent.hash, size, accept);
        const meta = await sharp(bytes).metadata();
        expect([meta.format, meta.exif, meta.xmp, tells(bytes)]).toEqual([
          format,
          undefined,
          undefined,
          [],
        ]);
        expect(meta.height).toBe(size === 'thumb' ? 480 : 640);
      }
    }
    // And the file it came as is gone from the store.
    expect(await app.deps.storage.has(`source/photo-${sent.hash}`)).toBe(false);
  }, 60_000);
});

describe('bad files', () => {
  it('are refused each with its reason, and the queue is well afterwards', async () => {
    const whole = makeClip(2, '640x360');
    const early = makeClip(4, '640x360', ['-movflags', '+faststart+use_metadata_tags']);
    const reason = async (kind: 'clip' | 'photo', bytes: Buffer, name: string) => {
      const answer = await send(kind, bytes, name);
      if (answer.status === 422) return (answer.body as Problem).detail;
      const media = await worked(mediaOf(answer).hash);
      return `${media.state}: ${media.reason}`;
    };
    const zip = Buffer.from('504b030414000000080000000000', 'hex');
    const svg = '<svg xmlns="http://www.w3.org/2000/svg"><script>alert(1)</script></svg>';
    expect(await reason('clip', whole.subarray(0, whole.length - 4000), 'cut.mp4')).toMatch(
      /cut off/,
    );
    expect(await reason('clip', early.subarray(0, early.length / 2), 'cut too.mp4')).toMatch(
      /cut off/,
    );
    expect(await reason('clip', zip, 'zip.mp4')).toMatch(/not a clip/);
    expect(await reason('clip', Buffer.alloc(0), 'none.mp4')).toMatch(/empty/);
    expect(await reason('photo', hugePng(50_000), 'huge.png')).toMatch(/50000 × 50000/);
    expect(await reason('photo', Buffer.from(svg), 'drawing.svg')).toMatch(/not a picture/);
    expect(await reason('photo', Buffer.from(svg), 'drawing.png')).toMatch(/not a picture/);
    expect(await reason('photo', Buffer.alloc(0), 'none.jpg')).toMatch(/empty/);
    expect(await reason('photo', (await makePhoto()).subarray(0, 900), 'half.jpg')).toMatch(
      /could not be read/,
    );
    const after = await worked(
      mediaOf(await send('clip', makeClip(1, '320x240'), 'well.mp4')).hash,
    );
    expect(after.state).toBe('ready');
  }, 90_000);
});

describe('several processes', () => {
  it('work on each file once, and take over what a process left behind', async () => {
    const jobs = await startJobs(app.deps.env, app.deps.log);
    try {
      await startMediaWork({ ...app.deps, jobs });
      const hashes: string[] = [];
      for (const size of ['320x200', '320x220', '320x240'])
        hashes.push(mediaOf(await send('clip', makeClip(1, size), `${size}.mp4`)).hash);
      for (const hash of hashes) expect((await worked(hash)).state).toBe('ready');
      // As a process leaves it that was killed in the middle: working, its lease run out, its job gone.
      const left = hashes[0]!;
      await app.deps.db.query(`DELETE FROM pgboss.job WHERE name = 'media-clip'`);
      await app.deps.db.query(
        `UPDATE media SET state = 'working', renditions = '{}', lease_until = now() - interval '1 minute' WHERE hash = $1`,
        [left],
      );
      const { sweepMedia } = await import('../../../server/features/media/work');
      expect(await sweepMedia(app.deps)).toBe(1);
      const media = await worked(left);
      expect([media.state, media.renditions.length]).toEqual(['ready', 4]);
    } finally {
      await jobs.stop();
    }
  }, 90_000);

  it('tries again after a fault, says so meanwhile, and gives up with a way to begin again', async () => {
    const sent = mediaOf(await send('clip', makeClip(1, '300x200'), 'gone.mp4'));
    await worked(sent.hash);
    const [{ source_key: key }] = await app.deps.db
      .query<[{ source_key: string }]>(
        `UPDATE media SET state = 'failed', reason = 'x', renditions = '{}' WHERE hash = $1 RETURNING source_key`,
        [sent.hash],
      )
      .then((answer) => (answer as unknown as [[{ source_key: string }]])[0]);
    expect(await app.deps.storage.has(key)).toBe(true);
    const again = await maker.post(`/api/uploads/files/${sent.hash}/again`);
    expect(mediaOf(again).state).toBe('waiting');
    expect((await worked(sent.hash)).state).toBe('ready');
    const stranger = await app.as(await app.person(['viewer', 'creator']));
    expect((await stranger.get(`/api/uploads/files/${sent.hash}`)).status).toBe(404);
    expect((await stranger.post(`/api/uploads/files/${sent.hash}/again`)).status).toBe(404);
  }, 60_000);
});

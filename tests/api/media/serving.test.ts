import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { type Media } from '../../../shared/api/media';
import { mp4Duration } from '../../../server/features/media/content';
import { startMediaWork } from '../../../server/features/media/work';
import { workOnStretches } from '../../../server/features/media/work/stretch-work';
import { queueStretches, type StretchJob } from '../../../server/features/media/work/queues';
import { type PlanDocument } from '../../../shared/plan/document';
import { testApp, type TestApp } from '../setup/app';
import { makeClip, tells } from './files';

let app: TestApp;
let maker: Awaited<ReturnType<TestApp['as']>>;
let media: Media;
const clip = makeClip(7, '640x360');
beforeAll(async () => {
  app = await testApp();
  await startMediaWork(app.deps);
  maker = await app.as(await app.person(['viewer', 'creator']));
  const sent = await maker.post('/api/uploads/clip').attach('file', clip, 'clip.mp4');
  media = (sent.body as { media: Media }).media;
  await until(async () => (await own()).state === 'ready');
}, 60_000);
afterAll(async () => {
  await app.close();
}, 30_000);

const own = async () =>
  ((await maker.get(`/api/uploads/files/${media.hash}`)).body as { media: Media }).media;
async function until(done: () => Promise<boolean>) {
  while (!(await done())) await new Promise((resolve) => setTimeout(resolve, 100));
}
const lead = async (name: string) => {
  const answer = await maker.get(`/media/${media.hash}/${name}`);
  return answer.headers.location as string;
};

describe('a file at its signed address', () => {
  it('stays at one address within a window, and moves on in the next', async () => {
    const now = new Date('2026-01-01T10:05:00Z');
    const sign = (minutes: number) =>
      app.deps.storage.signedUrl('a', 'video/mp4', new Date(now.getTime() + minutes * 60_000));
    expect(await sign(0)).toBe(await sign(20));
    expect(await sign(0)).not.toBe(await sign(30));
  });

  it('answers ranges and validators, caches for long, with the type we say (RFC 9110 §14, §13.1.2)', async () => {
    const address = await lead('360');
    const whole = await fetch(address);
    const bytes = Buffer.from(await whole.arrayBuffer());
    expect(whole.headers.get('content-type')).toBe('video/mp4');
    expect(whole.headers.get('cache-control')).toMatch(/max-age=31536000, immutable/);
    const etag = whole.headers.get('etag') ?? '';
    expect(etag).toMatch(/^"\w+"$/);
    const part = await fetch(address, { headers: { Range: 'bytes=100-199' } });
    expect([part.status, part.headers.get('content-range')]).toEqual([
      206,
      `bytes 100-199/${bytes.length}`,
    ]);
    expect(Buffer.from(await part.arrayBuffer()).equals(bytes.subarray(100, 200))).toBe(true);
    const same = await fetch(address, { headers: { 'If-None-Match': etag } });
    expect(same.status).toBe(304);
    const told = await maker.head(`/media/${media.hash}/360`);
    expect(told.headers).toMatchObject({
      'accept-ranges': 'bytes',
      'content-length': String(bytes.length),
    });
  });

  it('lies on another origin than the pages, and never the file as it was sent', async () => {
    expect(new URL(await lead('720')).origin).not.toBe(app.deps.env.APP_ORIGIN);
    for (const name of ['source', 'original', '..%2Fsource']) {
      const answer = await maker.get(`/media/${media.hash}/${name}`);
      if (answer.status === 302) {
        const got = Buffer.from(
          await (await fetch(answer.headers.location as string)).arrayBuffer(),
        );
        expect([got.equals(clip), tells(got)]).toEqual([false, []]);
      } else expect(answer.status).toBe(404);
    }
  });
});

describe('stretches of a clip', () => {
  it('are cut when a plan that shows them is published, each once, to the second', async () => {
    const stretches = [
      { start: 1.2, end: 2.7 },
      { start: 4, end: 6 },
    ];
    const document = { clip: { source: 'upload', media: media.hash }, steps: [{ stretches }] };
    const sent: StretchJob[] = [];
    const jobs = {
      ...app.deps.jobs,
      send: (_queue: string, _key: string, data: object) =>
        Promise.resolve(void sent.push(data as StretchJob)),
    };
    await app.deps.db.transaction((manager) =>
      queueStretches({ ...app.deps, jobs }, document as unknown as PlanDocument, manager),
    );
    const { signal } = new AbortController();
    // So small a clip goes whole.
    await workOnStretches(app.deps, sent[0]!, { signal });
    const names = async () =>
      (await own()).renditions.filter((name) => name.startsWith('cut')).sort();
    expect(await names()).toEqual([]);
    await workOnStretches(app.deps, sent[0]!, { signal }, 0);
    expect(await names()).toEqual(['cut-1-3', 'cut-4-6']);
    const cut = Buffer.from(await (await fetch(await lead('cut-1-3'))).arrayBuffer());
    expect(tells(cut)).toEqual([]);
    expect((await mp4Seconds(cut)) ?? 0).toBeCloseTo(2, 1);
    // Who may see the clip is told what there is of it; nobody else.
    expect((await app.anonymous().get(`/api/files/${media.hash}`)).status).toBe(404);
    const mine = await maker.get(`/api/files/${media.hash}`);
    expect((mine.body as { renditions: string[] }).renditions).toContain('cut-4-6');
  }, 60_000);
});

async function mp4Seconds(bytes: Buffer): Promise<number | null> {
  const folder = mkdtempSync(join(tmpdir(), 'scantling-cut-'));
  writeFileSync(join(folder, 'cut.mp4'), bytes);
  const seconds = await mp4Duration(join(folder, 'cut.mp4'), bytes.length);
  rmSync(folder, { recursive: true });
  return seconds;
}

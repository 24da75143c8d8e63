import { createHash, randomBytes } from 'node:crypto';
import { v7 as uuid } from 'uuid';
import { type Media } from '../../../shared/api/media';
import { type Problem } from '../../../shared/api/problem';
import { partBytesFor, partCount, type Upload } from '../../../shared/api/uploads';
import { abandonedAfterMs, sweepUploads } from '../../../server/features/uploads/work';
import { testApp, type TestApp } from '../setup/app';
import { makeClip, padded } from './files';

let app: TestApp;
type Agent = Awaited<ReturnType<TestApp['as']>>;
let maker: Agent;
beforeAll(async () => {
  app = await testApp({ mediaWork: true });
  maker = await app.as(await app.person(['viewer', 'creator']));
}, 60_000);
afterAll(async () => {
  await app.close();
}, 30_000);

const uploadOf = (answer: { body: unknown }) => (answer.body as { upload: Upload }).upload;
const start = (agent: Agent, bytes: number, mark = uuid(), name = 'build.mp4') =>
  agent.post('/api/clip-uploads').send({ id: uuid(), planId: null, name, mark, bytes });

async function sendPart(agent: Agent, upload: Upload, file: Buffer, number: number): Promise<void> {
  const from = (number - 1) * upload.partBytes;
  const body = file.subarray(from, from + upload.partBytes);
  const path = `/api/clip-uploads/${upload.id}/parts/${number}`;
  const { address } = (await agent.post(path)).body as { address: string };
  const put = await fetch(address, { method: 'PUT', body: new Uint8Array(body) });
  const noted = await agent.put(path).send({ etag: put.headers.get('etag'), bytes: body.length });
  expect(noted.status).toBe(204);
}

async function sendWhole(agent: Agent, file: Buffer, name = 'build.mp4'): Promise<Upload> {
  const upload = uploadOf(await start(agent, file.length, uuid(), name));
  for (let n = 1; n <= partCount(upload); n += 1) await sendPart(agent, upload, file, n);
  const done = await agent.post(`/api/clip-uploads/${upload.id}/complete`);
  expect(done.status).toBe(200);
  return looked(agent, upload.id);
}

async function looked(agent: Agent, id: string): Promise<Upload> {
  for (;;) {
    const upload = uploadOf(await agent.get(`/api/clip-uploads/${id}`));
    if (upload.state !== 'waiting' && upload.state !== 'working') return upload;
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
}

/** 20 MB: three parts. */
const clip = padded(makeClip(1, '320x240'), 20 * 1024 * 1024);
const sha256 = (bytes: Buffer) => createHash('sha256').update(bytes).digest('hex');

describe('a clip in parts', () => {
  it('breaks off, is found again by the same file with its ledger, and arrives byte for byte', async () => {
    const mark = `build.mp4 ${clip.length} 1`;
    const upload = uploadOf(await start(maker, clip.length, mark));
    expect([upload.partBytes, partCount(upload)]).toEqual([partBytesFor(clip.length), 3]);
    await sendPart(maker, upload, clip, 3);
    const early = await maker.post(`/api/clip-uploads/${upload.id}/complete`);
    expect([early.status, (early.body as Problem).code]).toEqual([409, 'uploads/incomplete']);
    const again = uploadOf(await start(maker, clip.length, mark));
    expect([again.id, again.parts.map((p) => p.number)]).toEqual([upload.id, [3]]);
    await sendPart(maker, upload, clip, 1);
    await sendPart(maker, upload, clip, 2);
    // The answer to the first asking is lost; asking twice does no harm.
    await maker.post(`/api/clip-uploads/${upload.id}/complete`);
    await maker.post(`/api/clip-uploads/${upload.id}/complete`);
    const done = await looked(maker, upload.id);
    expect(done).toMatchObject({ state: 'done', hash: sha256(clip), reason: null });
    expect(done.duration).toBeCloseTo(1, 1);
    const [row] = await app.deps.db.query<{ source_key: string }[]>(
      `SELECT source_key FROM media WHERE hash = $1`,
      [done.hash],
    );
    expect(sha256(await app.deps.storage.get(row!.source_key))).toBe(sha256(clip));
  }, 60_000);

  it('is stored once when somebody else has sent the same, and belongs to both', async () => {
    const other = await app.as(await app.person(['viewer', 'creator']));
    const done = await sendWhole(other, clip, 'the same.mp4');
    expect(done).toMatchObject({ state: 'done', hash: sha256(clip) });
    expect(await app.deps.storage.has(`source/upload-${done.id}`)).toBe(false);
    const mine = await other.get(`/api/uploads/files/${done.hash}`);
    expect((mine.body as { media: Media }).media.name).toBe('the same.mp4');
  }, 60_000);

  it('is nobody else’s: neither its ledger nor its addresses', async () => {
    const upload = uploadOf(await start(maker, clip.length));
    const stranger = await app.as(await app.person(['viewer', 'creator']));
    const at = `/api/clip-uploads/${upload.id}`;
    for (const answer of [
      await stranger.get(at),
      await stranger.post(`${at}/parts/1`),
      await stranger.put(`${at}/parts/1`).send({ etag: 'x', bytes: 1 }),
      await stranger.post(`${at}/complete`),
      await stranger.delete(at),
    ])
      expect(answer.status).toBe(404);
    const viewer = await app.as(await app.person(['viewer']));
    expect((await start(viewer, 100)).status).toBe(403);
    const wrong = await maker.put(`${at}/parts/1`).send({ etag: 'x', bytes: 7 });
    expect((wrong.body as Problem).detail).toMatch(/7 bytes instead of 8388608/);
    expect((await maker.post(`${at}/parts/9`)).status).toBe(422);
    expect((await maker.delete(at)).status).toBe(204);
    expect((await maker.get(at)).status).toBe(404);
  }, 30_000);
});

describe('what cannot be a clip', () => {
  it('is refused with its reason when it has arrived; the next one is well', async () => {
    const zip = Buffer.concat([Buffer.from('504b0304140000000800', 'hex'), randomBytes(2000)]);
    expect((await sendWhole(maker, zip, 'zip.mp4')).reason).toMatch(/not a clip we can play/);
    const whole = makeClip(1, '320x240');
    const cut = await sendWhole(maker, whole.subarray(0, whole.length - 3000), 'cut.mp4');
    expect([cut.state, cut.hash]).toEqual(['refused', null]);
    expect(cut.reason).toMatch(/cut off/);
    expect(await app.deps.storage.has(`source/upload-${cut.id}`)).toBe(false);
    const none = await start(maker, 0);
    expect([none.status, (none.body as Problem).issues?.[0]?.message]).toEqual([
      422,
      'The file is empty',
    ]);
    const over = await start(maker, 5 * 1024 ** 3);
    expect((over.body as Problem).issues?.[0]?.message).toBe('Over 4 GB');
    expect((await sendWhole(maker, makeClip(1, '340x240'))).state).toBe('done');
  }, 60_000);
});

describe('the room of a person', () => {
  it('counts what is on its way, and says how much is left', async () => {
    const person = await app.as(await app.person(['viewer', 'creator']));
    for (let i = 0; i < 9; i += 1) expect((await start(person, 4 * 1024 ** 3)).status).toBe(201);
    const tenth = await start(person, 4 * 1024 ** 3, uuid(), 'tenth.mp4');
    expect(tenth.status).toBe(201);
    const over = await start(person, 1024 ** 3, uuid(), 'over.mp4');
    expect([over.status, (over.body as Problem).code]).toEqual([409, 'uploads/quota']);
    expect((over.body as Problem).detail).toBe(
      '“over.mp4” is 1.0 GB; you have 0.00 GB left of your 40.0 GB. Nothing was stored. Upload a smaller file, or remove some you no longer show.',
    );
    await person.delete(`/api/clip-uploads/${uploadOf(tenth).id}`);
    expect((await start(person, 1024 ** 3)).status).toBe(201);
  }, 30_000);
});

describe('the sweep', () => {
  it('removes what nobody went on with, and takes up what a process left', async () => {
    const old = uploadOf(await start(maker, clip.length));
    const left = uploadOf(await start(maker, 9_000_000));
    const file = padded(makeClip(1, '360x240'), 9_000_000);
    for (let n = 1; n <= partCount(left); n += 1) await sendPart(maker, left, file, n);
    await app.deps.db.query(
      `UPDATE uploads SET state = 'working', lease_until = now() - interval '1 minute' WHERE id = $1`,
      [left.id],
    );
    await app.deps.db.query(`UPDATE uploads SET touched_at = $2 WHERE id = $1`, [
      old.id,
      new Date(Date.now() - abandonedAfterMs - 1000),
    ]);
    expect(await sweepUploads(app.deps)).toEqual({ taken: 1, removed: 1 });
    expect((await maker.get(`/api/clip-uploads/${old.id}`)).status).toBe(404);
    expect((await looked(maker, left.id)).state).toBe('done');
  }, 60_000);
});

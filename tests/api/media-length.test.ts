import { testApp, type TestApp } from './setup/app';

let app: TestApp;
beforeAll(async () => {
  app = await testApp();
}, 60_000);
afterAll(async () => {
  await app.close();
}, 30_000);

const captions = 'WEBVTT\n\n00:01.000 --> 00:02.000\nMark it with a knife.\n';

describe('the length of a stored file', () => {
  it('is told by HEAD without a redirect, to those who may see it only', async () => {
    const maker = await app.as(await app.person(['creator']));
    const sent = await maker
      .post('/api/uploads/captions')
      .attach('file', Buffer.from(captions), 'a.vtt');
    expect(sent.status).toBe(201);
    const { media } = sent.body as { media: { hash: string; bytes: number } };
    const path = `/media/${media.hash}/original`;

    const told = await maker.head(path);
    expect([told.status, told.headers['content-length']]).toEqual([200, String(media.bytes)]);
    expect(told.headers['content-type']).toMatch(/^text\/vtt/);
    expect((await maker.get(path)).status).toBe(302);
    expect((await maker.head(`/media/${media.hash}/poster`)).status).toBe(404);

    const stranger = await app.as(await app.person(['viewer']));
    expect((await stranger.head(path)).status).toBe(404);
    expect((await app.anonymous().head(path)).status).toBe(404);
  });
});

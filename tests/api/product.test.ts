import { v7 as uuid } from 'uuid';
import { contracts } from '../../shared/api';
import { type Problem } from '../../shared/api/problem';
import { readEnv } from '../../server/env';
import { mountedContracts } from '../../server/http/route';
import { verifyLog } from '../../server/features/log/log.service';
import { builtDemoPlans } from '../../server/demo';
import { password, testApp, type TestApp } from './setup/app';

let app: TestApp;
beforeAll(async () => {
  app = await testApp();
}, 60_000);
afterAll(async () => {
  await app.close();
}, 30_000);

const problem = (answer: { body: unknown }) => answer.body as Problem;
const filled = (path: string) => `/api${path.replace(/:(\w+)/g, () => uuid())}`;
type Verb = 'get' | 'post' | 'put' | 'patch' | 'delete';
const verb = (method: string) => method.toLowerCase() as Verb;

describe('every route', () => {
  it('is mounted once, under its own id', () => {
    const ids = contracts.map((c) => c.id);
    expect(new Set(ids).size).toBe(ids.length);
    expect([...mountedContracts().keys()].sort()).toEqual([...ids].sort());
  });

  it.each(contracts.filter((c) => c.access !== 'public').map((c) => [c.id, c] as const))(
    '%s refuses those below its floor',
    async (_, c) => {
      const nobody = await app.anonymous()[verb(c.method)](filled(c.path)).send({});
      expect(nobody.status).toBe(401);
      expect(nobody.type).toBe('application/problem+json');
      expect(problem(nobody).code).toBe('auth/needed');
      if (c.access === 'person') return;
      const low = await app.as(await app.person(['viewer'], c.access !== 'confirmed'));
      const answer = await low[verb(c.method)](filled(c.path)).send({});
      expect(answer.status).toBe(c.access === 'confirmed' ? 403 : 403);
      expect(problem(answer).code).toMatch(/^auth\//);
    },
  );

  it('answers strange requests with problems, never a stack', async () => {
    const answers = await Promise.all([
      app.anonymous().get('/api/nowhere'),
      app.anonymous().post('/api/sessions').set('Content-Type', 'application/json').send('{broken'),
      app.anonymous().get('/api/plans/%E0%A4%A'),
      app.anonymous().post('/api/accounts').send({}),
    ]);
    for (const answer of answers) {
      expect(answer.type).toBe('application/problem+json');
      expect(answer.text).not.toMatch(/\n\s+at |node_modules/);
    }
    expect(answers.map((a) => a.status)).toEqual([404, 400, 400, 422]);
    const fields = problem(answers[3]).issues?.map((i) => i.path.join('.')) ?? [];
    expect(fields).toEqual(
      expect.arrayContaining(['email', 'password', 'displayName', 'acceptTerms']),
    );
  });

  it('refuses changes that come from another site', async () => {
    const plain = await app.anonymous().post('/api/sessions').set('X-Scantling', '').send({});
    expect(plain.status).toBe(403);
    const elsewhere = await app
      .anonymous()
      .post('/api/sessions')
      .set('Origin', 'https://elsewhere.example')
      .send({});
    expect(problem(elsewhere).code).toBe('request/cross-site');
  });
});

it('publishes the OpenAPI document and the schema of a plan', async () => {
  const open = (await app.anonymous().get('/api/openapi.json')).body as {
    openapi: string;
    paths: Record<string, unknown>;
  };
  expect(open.openapi).toBe('3.1.0');
  expect(Object.keys(open.paths)).toContain('/api/plans/{slug}');
  const schema = (await app.anonymous().get('/api/plan-schema.json')).body as {
    title: string;
    properties: object;
  };
  expect(Object.keys(schema.properties)).toContain('dimensions');
});

describe('the environment', () => {
  it('names every fault at once', () => {
    expect(() => readEnv({ DATABASE_URL: 'mysql://x', SESSION_SECRET: 'short' })).toThrow(
      /DATABASE_URL[\s\S]*S3_ENDPOINT[\s\S]*SMTP_URL[\s\S]*SESSION_SECRET/,
    );
  });
});

describe('accounts', () => {
  it('answers the same whether an e-mail is known or not, and writes fitting letters', async () => {
    const known = await app.person();
    const body = { password, displayName: 'New', acceptTerms: true };
    const fresh = await app
      .anonymous()
      .post('/api/accounts')
      .send({ ...body, email: `${uuid()}@new.example` });
    const again = await app
      .anonymous()
      .post('/api/accounts')
      .send({ ...body, email: known.email });
    expect([fresh.status, fresh.body]).toEqual([201, { ok: true }]);
    expect([again.status, again.body]).toEqual([fresh.status, fresh.body]);
    const letter = await app.mail.waitFor((m) => m.to.includes(known.email), 10_000);
    expect(letter.text).toContain('There is one already');
  });

  it('confirms once, signs in, lists and ends sessions', async () => {
    const email = `${uuid()}@confirm.example`;
    await app
      .anonymous()
      .post('/api/accounts')
      .send({ email, password, displayName: 'Conny', acceptTerms: true });
    const letter = await app.mail.waitFor((m) => m.to.includes(email), 10_000);
    const token = /token=(\S+)/.exec(letter.text)?.[1];
    expect((await app.anonymous().post('/api/accounts/confirm').send({ token })).status).toBe(200);
    expect(problem(await app.anonymous().post('/api/accounts/confirm').send({ token })).code).toBe(
      'auth/token',
    );
    const wrong = await app
      .anonymous()
      .post('/api/sessions')
      .send({ email, password: 'not the one at all' });
    expect(problem(wrong).code).toBe('auth/wrong');
    const one = app.anonymous();
    const two = app.anonymous();
    for (const agent of [one, two])
      expect((await agent.post('/api/sessions').send({ email, password })).status).toBe(200);
    const list = (await one.get('/api/sessions')).body as {
      items: { id: string; current: boolean }[];
    };
    expect(list.items).toHaveLength(2);
    const other = list.items.find((s) => !s.current);
    expect((await one.delete(`/api/sessions/${other?.id ?? ''}`)).status).toBe(204);
    expect(((await two.get('/api/me')).body as { me: unknown }).me).toBeNull();
  });

  it('keeps the other preferences when one changes', async () => {
    const agent = await app.as(await app.person());
    const answer = await agent.patch('/api/me').send({ preferences: { theme: 'night' } });
    expect((answer.body as { me: { preferences: unknown } }).me.preferences).toMatchObject({
      units: 'in',
      inchGrid: 16,
      theme: 'night',
    });
  });
});

/** A published plan of a new creator. */
async function publish() {
  const maker = await app.person(['viewer', 'creator']);
  const agent = await app.as(maker);
  const id = uuid();
  const document = { ...builtDemoPlans()[0]!.built.document, id, title: `Board ${id.slice(-6)}` };
  const begun = await agent
    .post('/api/drafts')
    .send({ id, title: document.title, units: 'in', document });
  expect(begun.status).toBe(201);
  const published = await agent.post(`/api/drafts/${id}/revisions`).send({ version: 1 });
  expect(published.status).toBe(201);
  const { slug, revision } = published.body as {
    slug: string;
    revision: { id: string; letter: string; sha256: string };
  };
  return { maker, agent, id, slug, revision, document };
}

describe('drafts and plans', () => {
  it('lets exactly one of two saves win and gives the other what is there', async () => {
    const { agent, id, document } = await publish();
    const save = (title: string) =>
      agent.put(`/api/drafts/${id}`).send({ version: 1, document: { ...document, title } });
    const answers = await Promise.all([save('One'), save('Two')]);
    expect(answers.map((a) => a.status).sort()).toEqual([200, 409]);
    const lost = problem(answers.find((a) => a.status === 409)!);
    expect(lost.code).toBe('drafts/stale-version');
    expect(lost.meta).toMatchObject({ version: 2 });
  });

  it('lists every fault of a document and refuses strangers', async () => {
    const { agent, id, document } = await publish();
    const bad = await agent
      .put(`/api/drafts/${id}`)
      .send({ version: 1, document: { ...document, units: 'ells', skill: 7 } });
    expect(bad.status).toBe(422);
    expect(problem(bad).issues?.map((i) => i.path.join('.'))).toEqual(
      expect.arrayContaining(['document.units', 'document.skill']),
    );
    const stranger = await app.as(await app.person(['viewer', 'creator']));
    expect((await stranger.get(`/api/drafts/${id}`)).status).toBe(404);
  });

  it('publishes A and B, freezes them, refuses a failing sheet and finds by a word', async () => {
    const { agent, id, slug, revision, document } = await publish();
    expect(revision).toMatchObject({ letter: 'A' });
    expect(revision.sha256).toMatch(/^[0-9a-f]{64}$/);
    await expect(
      app.deps.db.query(`UPDATE revisions SET note = 'x' WHERE id = $1`, [revision.id]),
    ).rejects.toThrow(/append-only/);
    await agent.put(`/api/drafts/${id}`).send({ version: 1, document: { ...document, parts: [] } });
    const refused = await agent.post(`/api/drafts/${id}/revisions`).send({ version: 2 });
    expect(problem(refused).code).toBe('plans/check-sheet');
    const word = document.title.split(' ')[1]!;
    const found = (
      await app
        .anonymous()
        .get('/api/plans')
        .query({ q: word.slice(0, 5) })
    ).body as { items: { slug: string }[] };
    expect(found.items.map((i) => i.slug)).toContain(slug);
    expect((await agent.post(`/api/drafts/${id}/unpublish`)).status).toBe(200);
    expect((await app.anonymous().get(`/api/plans/${slug}`)).status).toBe(404);
  });
});

describe('media', () => {
  it('refuses a renamed executable and an empty file, each with its reason', async () => {
    const agent = await app.as(await app.person(['viewer', 'creator']));
    const exe = await agent
      .post('/api/uploads/clip')
      .attach('file', Buffer.from('MZ\u0090\u0000not a clip'), 'shop.mp4');
    expect([exe.status, problem(exe).code]).toEqual([422, 'uploads/type']);
    const empty = await agent
      .post('/api/uploads/captions')
      .attach('file', Buffer.alloc(0), 'a.vtt');
    expect(problem(empty).code).toBe('uploads/empty');
    const none = await agent
      .post('/api/uploads/captions')
      .attach('file', Buffer.from('just words'), 'a.vtt');
    expect(problem(none).code).toBe('uploads/unreadable');
  });
});

describe('the bench', () => {
  it('stores an entry once and refuses other content under its id', async () => {
    const { id, revision, document } = await publish();
    const agent = await app.as(await app.person());
    const copyId = uuid();
    expect(
      (await agent.put(`/api/bench/${copyId}`).send({ planId: id, revisionId: revision.id }))
        .status,
    ).toBe(201);
    expect(
      (await agent.put(`/api/bench/${copyId}`).send({ planId: id, revisionId: revision.id }))
        .status,
    ).toBe(201);
    const entry = {
      id: uuid(),
      kind: 'note',
      elementId: document.steps[0]!.id,
      revisionId: revision.id,
      device: 'd',
      deviceSequence: 1,
      deviceTime: '2026-01-01T10:00:00Z',
      text: 'Bowed.',
    };
    for (let i = 0; i < 2; i += 1)
      expect((await agent.put(`/api/bench/${copyId}/entries/${entry.id}`).send(entry)).status).toBe(
        200,
      );
    const list = (await agent.get(`/api/bench/${copyId}/entries`)).body as { items: unknown[] };
    expect(list.items).toHaveLength(1);
    const other = await agent
      .put(`/api/bench/${copyId}/entries/${entry.id}`)
      .send({ ...entry, text: 'Flat.' });
    expect(problem(other).code).toBe('bench/entry-differs');
    const stranger = await app.as(await app.person());
    expect((await stranger.get(`/api/bench/${copyId}`)).status).toBe(404);
  });

  it('keeps the shop card by version', async () => {
    const agent = await app.as(await app.person());
    const card = { kerf: '1/8 in' };
    expect((await agent.put('/api/shop-card').send({ version: 0, card })).status).toBe(200);
    expect((await agent.put('/api/shop-card').send({ version: 1, card })).status).toBe(200);
    expect(problem(await agent.put('/api/shop-card').send({ version: 1, card })).code).toBe(
      'shop-card/stale-version',
    );
  });
});

describe('talk and order', () => {
  it('critique, answer, settled by the maker only; report, one case, removal with reasons by mail; the log holds', async () => {
    const { id, agent: maker } = await publish();
    const writer = await app.person();
    const asWriter = await app.as(writer);
    const critique = {
      id: uuid(),
      kind: 'critique',
      anchor: { on: 'plan' },
      stance: 'change',
      text: 'Leave the guard off.',
      why: 'Quicker.',
    };
    expect((await asWriter.post(`/api/plans/${id}/talk`).send(critique)).status).toBe(201);
    expect((await asWriter.post(`/api/plans/${id}/talk`).send(critique)).status).toBe(201);
    const answer = { id: uuid(), kind: 'answer', parentId: critique.id, text: 'No.' };
    await maker.post(`/api/plans/${id}/talk`).send(answer);
    const settled = { answerId: answer.id };
    expect((await asWriter.put(`/api/talk/${critique.id}/settled`).send(settled)).status).toBe(403);
    expect((await maker.put(`/api/talk/${critique.id}/settled`).send(settled)).status).toBe(200);

    const report = (extra: object) =>
      app
        .anonymous()
        .post('/api/reports')
        .send({
          id: uuid(),
          subject: { kind: 'comment', id: critique.id },
          problem: 'dangerous-advice',
          reason: 'Tells people to go without a guard.',
          ...extra,
        });
    expect((await report({})).status).toBe(422);
    const both = await Promise.all([
      report({ email: 'a@x.example' }),
      report({ email: 'b@x.example' }),
    ]);
    expect(both.map((b) => b.status)).toEqual([201, 201]);
    const moderator = await app.as(await app.person(['moderator']));
    const cases = (
      (await moderator.get('/api/cases')).body as {
        items: { id: string; reports: number; subject: { id: string } }[];
      }
    ).items.filter((c) => c.subject.id === critique.id);
    expect(cases).toHaveLength(1);
    expect(cases[0]!.reports).toBe(2);
    const other = await app.as(await app.person(['moderator']));
    expect((await moderator.put(`/api/cases/${cases[0]!.id}/worker`).send({})).status).toBe(200);
    expect(problem(await other.put(`/api/cases/${cases[0]!.id}/worker`).send({})).code).toBe(
      'cases/taken',
    );
    const ruling = {
      id: uuid(),
      act: 'remove',
      rule: 'S2',
      reasons: 'It tells builders to take the guard off.',
    };
    expect((await moderator.post(`/api/cases/${cases[0]!.id}/rulings`).send(ruling)).status).toBe(
      201,
    );
    const letter = await app.mail.waitFor((m) => m.to.includes(writer.email), 10_000);
    expect(letter.text).toContain('Working without a guard');
    expect(letter.text).toContain('six months');
    const seen = (await app.anonymous().get(`/api/plans/${id}/talk`)).body as {
      items: { id: string; text: string }[];
    };
    expect(seen.items.find((c) => c.id === critique.id)?.text).toBe('');
    await expect(app.deps.db.query(`DELETE FROM log`)).rejects.toThrow(/append-only/);
    const check = await verifyLog(app.deps.db);
    expect(check.rows).toBeGreaterThan(2);
    expect(check.brokenAt).toBeNull();
  });
});

import { v7 as uuid } from 'uuid';
import { contracts } from '../../shared/api';
import { type Problem } from '../../shared/api/problem';
import { builtDemoPlans } from '../../server/demo';
import { testApp, type TestApp } from './setup/app';

let app: TestApp;
beforeAll(async () => {
  app = await testApp();
}, 60_000);
afterAll(async () => {
  await app.close();
}, 30_000);

type Verb = 'get' | 'post' | 'put' | 'patch' | 'delete';
const verb = (method: string) => method.toLowerCase() as Verb;
const problem = (answer: { body: unknown }) => answer.body as Problem;
const path = (text: string, id: () => string) => `/api${text.replace(/:(\w+)/g, () => id())}`;

describe('bad input', () => {
  const withBody = contracts.filter((c) => c.body && !c.body.safeParse({}).success);
  it.each(withBody.map((c) => [c.id, c] as const))(
    '%s names every fault of an empty body',
    async (_, c) => {
      const agent = await app.as(await app.person(['viewer', 'creator', 'moderator', 'admin']));
      const answer = await agent[verb(c.method)](path(c.path, uuid)).send({});
      expect(answer.status).toBe(422);
      expect(problem(answer).code).toBe('request/invalid');
      const wanted = c.body?.safeParse({}).error?.issues.map((i) => i.path.join('.')) ?? [];
      expect(problem(answer).issues?.map((i) => i.path.join('.'))).toEqual(
        expect.arrayContaining(wanted),
      );
    },
  );

  const withId = contracts.filter((c) => /:\w+Id\b/.test(c.path) && c.id !== 'endSession');
  it.each(withId.map((c) => [c.id, c] as const))('%s refuses an id that is none', async (_, c) => {
    const agent = await app.as(await app.person(['viewer', 'creator', 'moderator', 'admin']));
    const answer = await agent[verb(c.method)](path(c.path, () => 'not-an-id')).send({});
    expect(answer.status).toBe(422);
    expect(problem(answer).issues?.some((i) => i.path[0] === 'params')).toBe(true);
  });
});

describe('strangers', () => {
  it('find nothing of a draft, a bench copy, a session or somebody’s words', async () => {
    const owner = await app.as(await app.person(['viewer', 'creator']));
    const stranger = await app.as(await app.person(['viewer', 'creator']));
    const id = uuid();
    const document = { ...builtDemoPlans()[0]!.built.document, id };
    await owner.post('/api/drafts').send({ id, title: 'Mine', units: 'in', document });
    const published = await owner.post(`/api/drafts/${id}/revisions`).send({ version: 1 });
    const { slug, revision } = published.body as { slug: string; revision: { id: string } };
    const copyId = uuid();
    await owner.put(`/api/bench/${copyId}`).send({ planId: id, revisionId: revision.id });
    const entry = {
      id: uuid(),
      kind: 'note',
      elementId: document.steps[0]!.id,
      revisionId: revision.id,
      device: 'd',
      deviceSequence: 1,
      deviceTime: '2026-01-01T10:00:00Z',
      text: 'Mine.',
    };
    await owner.put(`/api/bench/${copyId}/entries/${entry.id}`).send(entry);
    const question = { id: uuid(), kind: 'question', anchor: { on: 'plan' }, text: 'Why?' };
    await owner.post(`/api/plans/${id}/talk`).send(question);
    const [session] = ((await owner.get('/api/sessions')).body as { items: { id: string }[] })
      .items;

    const tries: [Verb, string, object, number][] = [
      ['get', `/api/drafts/${id}`, {}, 404],
      ['put', `/api/drafts/${id}`, { version: 1, document }, 404],
      ['delete', `/api/drafts/${id}`, {}, 404],
      ['post', `/api/drafts/${id}/revisions`, { version: 1 }, 404],
      ['post', `/api/drafts/${id}/unpublish`, {}, 404],
      ['post', `/api/drafts/${id}/republish`, {}, 404],
      ['get', `/api/bench/${copyId}`, {}, 404],
      ['get', `/api/bench/${copyId}/entries`, {}, 404],
      ['put', `/api/bench/${copyId}/entries/${entry.id}`, entry, 404],
      ['put', `/api/bench/${copyId}`, { planId: id, revisionId: revision.id }, 409],
      ['delete', `/api/bench/${copyId}`, {}, 404],
      ['patch', `/api/talk/${question.id}`, { text: 'Because.' }, 403],
      ['delete', `/api/talk/${question.id}`, {}, 403],
      ['put', `/api/talk/${question.id}/settled`, { answerId: null }, 403],
      ['delete', `/api/sessions/${session!.id}`, {}, 404],
    ];
    for (const [method, url, body, status] of tries) {
      const answer = await stranger[method](url).send(body);
      expect([method, url, answer.status]).toEqual([method, url, status]);
    }
    // And the owner still has all of it.
    expect((await owner.get(`/api/bench/${copyId}`)).status).toBe(200);
    expect((await owner.get(`/api/drafts/${id}`)).status).toBe(200);
    expect((await app.anonymous().get(`/api/plans/${slug}`)).status).toBe(200);
    const removed = await owner.delete(`/api/drafts/${id}`);
    expect(problem(removed).code).toBe('drafts/published');
  });
});

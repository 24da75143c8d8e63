import { v7 as uuid } from 'uuid';
import { type BenchCopy } from '../../../shared/api/bench';
import { type CorrectionPreview, type NoticeView } from '../../../shared/api/notices';
import { type PlanDocument } from '../../../shared/plan/document';
import { builtDemoPlans } from '../../../server/demo';
import { type PersonEntity } from '../../../server/db/entities/person';
import { spreadCorrection } from '../../../server/features/notices/corrections.service';
import { sendLetters } from '../../../server/features/notices/letters.service';
import { makeMailer, type Mailer } from '../../../server/mail/mailer';
import { testApp, type TestApp } from '../setup/app';

let app: TestApp;
let mailer: Mailer;
beforeAll(async () => {
  app = await testApp();
  mailer = makeMailer(app.deps.env);
}, 60_000);
afterAll(async () => {
  mailer.close();
  await app.close();
}, 30_000);

const board = builtDemoPlans()[0]!.built.document;
const part = (mark: string) => board.parts.find((p) => p.mark === mark)!;
const sizing = board.steps.find((s) =>
  s.parts.some((p) => p.partId === part('A').id && p.to === 'sized'),
)!;
type Agent = Awaited<ReturnType<TestApp['as']>>;

async function published(
  owner: Agent,
): Promise<{ id: string; slug: string; revisionId: string; document: PlanDocument }> {
  const id = uuid();
  const document = { ...board, id };
  await owner.post('/api/drafts').send({ id, title: board.title, units: 'in', document });
  const answer = await owner.post(`/api/drafts/${id}/revisions`).send({ version: 1 });
  const { slug, revision } = answer.body as { slug: string; revision: { id: string } };
  return { id, slug, revisionId: revision.id, document };
}

async function startCopy(agent: Agent, plan: { id: string; revisionId: string }): Promise<string> {
  const copyId = uuid();
  await agent.put(`/api/bench/${copyId}`).send({ planId: plan.id, revisionId: plan.revisionId });
  return copyId;
}

let sequence = 0;
async function entry(agent: Agent, copyId: string, revisionId: string, given: object) {
  const id = uuid();
  sequence += 1;
  const body = {
    id,
    revisionId,
    device: 'd',
    deviceSequence: sequence,
    deviceTime: '2026-06-01T10:00:00Z',
    ...given,
  };
  const answer = await agent.put(`/api/bench/${copyId}/entries/${id}`).send(body);
  expect(answer.status).toBe(200);
}

const longer = (document: PlanDocument, expression: string): PlanDocument => ({
  ...document,
  dimensions: document.dimensions.map((d) => (d.symbol === 'board_l' ? { ...d, expression } : d)),
});

interface Bench {
  owner: Agent;
  plan: Awaited<ReturnType<typeof published>>;
  people: PersonEntity[];
  agents: Agent[];
  copies: string[];
}

/** A published plan with two builders: the first has begun nothing, the second has cut A and B. */
async function twoBuilders(): Promise<Bench> {
  const owner = await app.as(await app.person(['viewer', 'creator']));
  const plan = await published(owner);
  const people = [await app.person(), await app.person()];
  const agents = [await app.as(people[0]!), await app.as(people[1]!)];
  const copies = [await startCopy(agents[0]!, plan), await startCopy(agents[1]!, plan)];
  await entry(agents[1]!, copies[1]!, plan.revisionId, { kind: 'tick', elementId: sizing.id });
  return { owner, plan, people, agents, copies };
}

async function publishLonger({ owner, plan }: Bench, correction: object) {
  const saved = await owner
    .put(`/api/drafts/${plan.id}`)
    .send({ version: 1, document: longer(plan.document, '20 1/2 in') });
  expect(saved.status).toBe(200);
  const preview = (await owner.post(`/api/drafts/${plan.id}/correction-preview`).send({}))
    .body as CorrectionPreview;
  const answer = await owner
    .post(`/api/drafts/${plan.id}/revisions`)
    .send({ version: 2, correction });
  expect(answer.status).toBe(201);
  return preview;
}

const copyOf = async (agent: Agent, copyId: string) =>
  (await agent.get(`/api/bench/${copyId}`)).body as BenchCopy;

describe('a correction', () => {
  it('is seen before it is sent, then reaches each bench copy with what it means there', async () => {
    const bench = await twoBuilders();
    const { agents, copies, people, owner, plan } = bench;
    const id = uuid();
    const preview = await publishLonger(bench, { id, reason: 'The plane ran off the far end.' });
    expect(preview).toMatchObject({
      copies: 2,
      touched: 2,
      worst: { cannot: 1, 'not-reached': 1 },
    });
    expect(preview.byChange[`part/${part('A').id}`]).toEqual({ cannot: 1, 'not-reached': 1 });
    expect(await spreadCorrection(app.deps, id)).toBe(2);
    expect(await spreadCorrection(app.deps, id)).toBe(0);
    const [first, second] = await Promise.all(agents.map((a, i) => copyOf(a, copies[i]!)));
    expect(new Set(first?.correction?.items.map((i) => i.means))).toEqual(new Set(['not-reached']));
    const cut = second?.correction?.items.find((i) => i.change.elementId === part('A').id);
    expect(cut).toMatchObject({ means: 'cannot', assumed: true, needs: [{ mark: 'A' }] });
    expect(second?.correction?.notes).toMatchObject([{ id, letter: 'B', safety: false }]);
    for (const [i, agent] of agents.entries()) {
      const list = (await agent.get('/api/notices')).body as {
        items: NoticeView[];
        unread: number;
      };
      expect(list.unread).toBe(1);
      expect(list.items[0]).toMatchObject({ kind: 'correction', path: `/bench/${copies[i]!}` });
      expect(list.items[0]?.text).toContain(
        i === 0 ? 'not come to this yet' : 'cannot be put back',
      );
      await agent.post('/api/notices/read').send({});
      expect(((await agent.get('/api/notices')).body as { unread: number }).unread).toBe(0);
    }
    const mine = (await owner.get('/api/notices')).body as { items: NoticeView[] };
    expect(mine.items).toEqual([]);
    const changes = await app.anonymous().get(`/api/plans/${plan.id}/changes?from=A&to=B`);
    expect(changes.body).toMatchObject({
      notes: [{ id }],
      changes: expect.arrayContaining([expect.objectContaining({ how: 'changed' })]) as unknown,
    });
    expect(people).toHaveLength(2);
  });

  it('moves a bench copy on when its builder says so; ticks come along, no way back', async () => {
    const bench = await twoBuilders();
    const { agents, copies, plan } = bench;
    const id = uuid();
    await publishLonger(bench, { id, reason: 'The plane ran off the far end.' });
    const agent = agents[1]!;
    const before = await copyOf(agent, copies[1]!);
    await entry(agent, copies[1]!, plan.revisionId, { kind: 'acknowledge', elementId: id });
    const to = before.correction!.revisionId;
    const stranger = await agents[0]!
      .put(`/api/bench/${copies[1]!}/revision`)
      .send({ revisionId: to });
    expect(stranger.status).toBe(404);
    const moved = await agent.put(`/api/bench/${copies[1]!}/revision`).send({ revisionId: to });
    expect(moved.body).toMatchObject({
      revision: { letter: 'B' },
      correction: null,
      stepsDone: 1,
      newerLetter: null,
    });
    const back = await agent
      .put(`/api/bench/${copies[1]!}/revision`)
      .send({ revisionId: plan.revisionId });
    expect(back.status).toBe(409);
    const nowhere = await agent
      .put(`/api/bench/${copies[1]!}/revision`)
      .send({ revisionId: uuid() });
    expect(nowhere.status).toBe(404);
  });

  it('says nothing to a builder whom it does not touch', async () => {
    const owner = await app.as(await app.person(['viewer', 'creator']));
    const plan = await published(owner);
    const builders = [await app.as(await app.person()), await app.as(await app.person())];
    const copies = [await startCopy(builders[0]!, plan), await startCopy(builders[1]!, plan)];
    const taken = board.dimensions.find((d) => d.origin === 'taken')!;
    await entry(builders[0]!, copies[0]!, plan.revisionId, {
      kind: 'reading',
      form: 'figure',
      elementId: taken.id,
      instrument: 'calipers',
      place: '',
      value: { text: '17.9 mm', mm: '179/10' },
    });
    const dimensions = plan.document.dimensions.map((d) =>
      d.id === taken.id ? { ...d, expression: '0.71 in' } : d,
    );
    await owner
      .put(`/api/drafts/${plan.id}`)
      .send({ version: 1, document: { ...plan.document, dimensions } });
    const id = uuid();
    await owner
      .post(`/api/drafts/${plan.id}/revisions`)
      .send({ version: 2, correction: { id, reason: 'My own sheet was re-measured.' } });
    expect(await spreadCorrection(app.deps, id)).toBe(1);
    expect((await copyOf(builders[0]!, copies[0]!)).correction).toBeNull();
    expect((await copyOf(builders[1]!, copies[1]!)).correction?.items.length).toBeGreaterThan(0);
  });

  it('wants a reason, and only its maker may look ahead', async () => {
    const bench = await twoBuilders();
    const short = await bench.owner
      .post(`/api/drafts/${bench.plan.id}/revisions`)
      .send({ version: 1, correction: { id: uuid(), reason: 'no' } });
    expect(short.status).toBe(422);
    const other = await app.as(await app.person(['viewer', 'creator']));
    expect(
      (await other.post(`/api/drafts/${bench.plan.id}/correction-preview`).send({})).status,
    ).toBe(404);
    expect(
      (await bench.owner.post(`/api/drafts/${uuid()}/correction-preview`).send({})).status,
    ).toBe(404);
  });
});

describe('letters', () => {
  it('sends safety at once, each by itself, with one-click headers that work', async () => {
    const bench = await twoBuilders();
    const id = uuid();
    await publishLonger(bench, {
      id,
      reason: 'Cut past the end and the guard is off.',
      safety: true,
    });
    await spreadCorrection(app.deps, id);
    await sendLetters(app.deps, mailer);
    const person = bench.people[1]!;
    const letter = await app.mail.waitFor((m) => m.to.includes(person.email));
    expect(letter.subject).toBe('Safety: Shooting board, rev B');
    expect(letter.text).toContain('Cut past the end and the guard is off.');
    expect(letter.text).toContain('cannot be put back');
    expect(letter.html).toContain('<p>');
    expect(letter.headers['list-unsubscribe-post']).toBe('List-Unsubscribe=One-Click');
    expect(letter.headers['message-id']).toMatch(/^<notice-[0-9a-f-]{36}@/);
    const address =
      /^<(.+)>$/.exec((letter.headers['list-unsubscribe'] ?? '').replace(/\s+/g, ''))?.[1] ?? '';
    const url = new URL(address);
    // RFC 8058 section 3.1: an HTTPS (here local) POST with this body, no cookies, no other header of ours.
    const post = (path: string) =>
      app
        .anonymous()
        .post(path)
        .unset('X-Scantling')
        .type('form')
        .send('List-Unsubscribe=One-Click');
    const stopped = await post(url.pathname + url.search);
    expect([stopped.status, stopped.body]).toEqual([200, { kinds: ['safety'] }]);
    expect((await post(`${url.pathname}${url.search}x`)).status).toBe(422);
    const settings = (await bench.agents[1]!.get('/api/notices/settings')).body as {
      items: { kind: string; mail: boolean }[];
    };
    expect(settings.items.filter((s) => !s.mail).map((s) => s.kind)).toEqual(['safety']);
    const other = (await bench.agents[0]!.get('/api/notices/settings')).body as {
      items: { mail: boolean }[];
    };
    expect(other.items.every((s) => s.mail)).toBe(true);
  });

  it('gathers a busy plan into one letter a day', async () => {
    const makerPerson = await app.person(['viewer', 'creator']);
    const owner = await app.as(makerPerson);
    const plan = await published(owner);
    const asker = await app.as(await app.person());
    const ask = (text: string) =>
      asker
        .post(`/api/plans/${plan.id}/talk`)
        .send({ id: uuid(), kind: 'question', anchor: { on: 'plan' }, text });
    const hours = (n: number) => new Date(Date.now() + n * 3_600_000);
    const at = (now: Date) => sendLetters({ ...app.deps, now: () => now }, mailer);
    for (const n of [1, 2, 3]) expect((await ask(`Question ${n}?`)).status).toBe(201);
    await sendLetters(app.deps, mailer);
    const mine = () => app.mail.messages().filter((m) => m.to.includes(makerPerson.email));
    expect(mine()).toHaveLength(0);
    await at(hours(1));
    expect(mine().map((m) => m.subject)).toEqual(['Shooting board, 3 notices']);
    expect(mine()[0]?.text).toMatch(/Question 1\?[\s\S]*Question 2\?[\s\S]*Question 3\?/);
    await ask('Question 4?');
    await ask('Question 5?');
    await at(hours(20));
    expect(mine()).toHaveLength(1);
    await at(hours(26));
    expect(mine().map((m) => m.subject)).toEqual([
      'Shooting board, 3 notices',
      'Shooting board, 2 notices',
    ]);
  });

  it('leaves out what a person turned off, in the letter and in the product', async () => {
    const makerPerson = await app.person(['viewer', 'creator']);
    const owner = await app.as(makerPerson);
    const plan = await published(owner);
    const asker = await app.as(await app.person());
    await owner.put('/api/notices/settings').send({ kind: 'talk', mail: false, product: false });
    const always = await owner
      .put('/api/notices/settings')
      .send({ kind: 'safety', mail: true, product: false });
    expect((always.body as { items: unknown[] }).items[0]).toEqual({
      kind: 'safety',
      mail: true,
      product: true,
    });
    await asker
      .post(`/api/plans/${plan.id}/talk`)
      .send({ id: uuid(), kind: 'question', anchor: { on: 'plan' }, text: 'Heard?' });
    const list = (await owner.get('/api/notices')).body as { items: unknown[]; unread: number };
    expect(list).toMatchObject({ items: [], unread: 0 });
    await sendLetters({ ...app.deps, now: () => new Date(Date.now() + 3_600_000) }, mailer);
    expect(
      app.mail
        .messages()
        .some((m) => m.to.includes(makerPerson.email) && m.text.includes('Heard?')),
    ).toBe(false);
  });
});

import { v7 as uuid } from 'uuid';
import { type Problem } from '../../shared/api/problem';
import { PersonEntity } from '../../server/db/entities/person';
import { password, testApp, type TestApp } from './setup/app';

let app: TestApp;
beforeAll(async () => {
  app = await testApp();
}, 60_000);
afterAll(async () => {
  await app.close();
}, 30_000);

const problem = (answer: { body: unknown }) => answer.body as Problem;
const signUp = (email: string, displayName = 'Nell Rabbet') =>
  app.anonymous().post('/api/accounts').send({ email, password, displayName, acceptTerms: true });
const tokenFor = async (email: string, subject: RegExp) => {
  const letter = await app.mail.waitFor(
    (m) => m.to.includes(email) && subject.test(m.subject),
    10_000,
  );
  return /token=(\S+)/.exec(letter.text)?.[1] ?? '';
};

describe('signing up', () => {
  it('lets several people of one name in at once', async () => {
    const answers = await Promise.all(
      Array.from({ length: 4 }, () => signUp(`${uuid()}@same.example`, 'Same Name')),
    );
    expect(answers.map((a) => a.status)).toEqual([201, 201, 201, 201]);
  });

  it('answers alike when one e-mail comes twice at once', async () => {
    const email = `${uuid()}@twice.example`;
    const answers = await Promise.all([signUp(email), signUp(email)]);
    expect(answers.map((a) => [a.status, a.body as unknown])).toEqual([
      [201, { ok: true }],
      [201, { ok: true }],
    ]);
    const kept = await app.deps.db.getRepository(PersonEntity).countBy({ email });
    expect(kept).toBe(1);
  });

  it('names every fault of the form', async () => {
    const answer = await app
      .anonymous()
      .post('/api/accounts')
      .send({ email: 'no', password: 'short', displayName: ' ' });
    expect(answer.status).toBe(422);
    expect(problem(answer).issues?.map((i) => i.path[0])).toEqual(
      expect.arrayContaining(['email', 'password', 'displayName', 'acceptTerms']),
    );
  });

  it('refuses a zero character without a stack', async () => {
    const answer = await signUp(`${uuid()}@zero.example`, 'Ne\u0000ll');
    expect(answer.status).toBe(422);
  });
});

describe('a forgotten password', () => {
  it('answers alike for known and unknown, ends sessions, and its letters work once', async () => {
    const person = await app.person();
    const agent = await app.as(person);
    const ask = (email: string) => app.anonymous().post('/api/accounts/reset').send({ email });
    const [known, unknown] = [await ask(person.email), await ask('nobody@nowhere.example')];
    expect([known.status, known.body]).toEqual([unknown.status, unknown.body]);
    const first = await tokenFor(person.email, /new password/);
    app.mail.clear();
    await ask(person.email);
    const second = await tokenFor(person.email, /new password/);
    const set = (token: string) =>
      app
        .anonymous()
        .post('/api/accounts/password')
        .send({ token, password: 'another long phrase' });
    expect((await set(second)).status).toBe(200);
    expect(problem(await set(second)).code).toBe('auth/token');
    // The older letter is void as well.
    expect(problem(await set(first)).code).toBe('auth/token');
    expect(((await agent.get('/api/me')).body as { me: unknown }).me).toBeNull();
    const back = await app
      .anonymous()
      .post('/api/sessions')
      .send({ email: person.email, password: 'another long phrase' });
    expect(back.status).toBe(200);
  });
});

describe('roles', () => {
  it('makes a confirmed viewer a creator by accepting the rules, and nobody else', async () => {
    const agent = await app.as(await app.person());
    expect((await agent.post('/api/me/creator').send({})).status).toBe(422);
    const answer = await agent.post('/api/me/creator').send({ acceptRules: true });
    expect((answer.body as { me: { roles: string[] } }).me.roles).toContain('creator');
    const unconfirmed = await app.as(await app.person(['viewer'], false));
    expect(
      problem(await unconfirmed.post('/api/me/creator').send({ acceptRules: true })).code,
    ).toBe('auth/unconfirmed');
  });

  it('lets an admin grant roles, logs it, and not take the own', async () => {
    const admin = await app.person(['admin']);
    const agent = await app.as(admin);
    const other = await app.person();
    const answer = await agent
      .put(`/api/admin/people/${other.id}/roles`)
      .send({ roles: ['viewer', 'moderator'] });
    expect((answer.body as { roles: string[] }).roles).toEqual(['viewer', 'moderator']);
    expect(
      (await agent.put(`/api/admin/people/${admin.id}/roles`).send({ roles: ['viewer'] })).status,
    ).toBe(403);
    const rows: unknown[] = await app.deps.db.query(
      `SELECT 1 FROM log WHERE act = 'roles/set' AND subject_id = $1`,
      [other.id],
    );
    expect(rows).toHaveLength(1);
    const list = await agent.get('/api/admin/people').query({ q: other.email });
    expect((list.body as { items: { id: string }[] }).items.map((i) => i.id)).toEqual([other.id]);
    expect((await agent.get('/api/admin/people').query({ cursor: 'x' })).status).toBe(422);
  });

  it('tells a suspended person why, in the middle of a session and at the door', async () => {
    const person = await app.person();
    const agent = await app.as(person);
    await app.deps.db
      .getRepository(PersonEntity)
      .update(
        { id: person.id },
        { suspendedUntil: new Date(Date.now() + 86_400_000), suspendedFor: 'Two threats in talk.' },
      );
    const inside = await agent.get('/api/sessions');
    expect([inside.status, problem(inside).code]).toEqual([403, 'auth/suspended']);
    expect(problem(inside).detail).toContain('Two threats in talk.');
    const door = await app
      .anonymous()
      .post('/api/sessions')
      .send({ email: person.email, password });
    expect(problem(door).code).toBe('auth/suspended');
  });
});

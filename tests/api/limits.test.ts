import { type Problem } from '../../shared/api/problem';
import { rates } from '../../server/http/limits';
import { testApp, type TestApp } from './setup/app';

let app: TestApp;
beforeAll(async () => {
  app = await testApp({ rateFactor: 1 });
}, 60_000);
afterAll(async () => {
  await app.close();
}, 30_000);

it('stops a flood of sign-ins, says how long to wait, and keeps the count in the database', async () => {
  const statuses: number[] = [];
  for (let i = 0; i <= rates['sign-in'].points; i += 1) {
    const answer = await app
      .anonymous()
      .post('/api/sessions')
      .send({ email: 'nobody@nowhere.example', password: 'x' });
    statuses.push(answer.status);
    if (answer.status !== 429) continue;
    expect(Number(answer.headers['retry-after'])).toBeGreaterThan(0);
    expect((answer.body as Problem).retryAfter).toBeGreaterThan(0);
  }
  expect(statuses.slice(0, -1).every((s) => s === 401)).toBe(true);
  expect(statuses[statuses.length - 1]).toBe(429);
  const rows: unknown[] = await app.deps.db.query(`SELECT 1 FROM rate_limits`);
  expect(rows.length).toBeGreaterThan(0);
});

/** @jest-environment node */
import 'fake-indexeddb/auto';
import { type Entry } from '../../../shared/plan/bench/entry';
import {
  dropSent,
  flushOutbox,
  keepEntry,
  nextDeviceMark,
  outboxStore,
  resetOutbox,
  retryRefused,
} from '../../../components/data/outbox';

// Nobody else listens here, and an open channel would keep the runner alive.
Reflect.deleteProperty(globalThis, 'BroadcastChannel');

const uuid = (n: number) => `00000000-0000-7000-8000-${n.toString(16).padStart(12, '0')}`;
const entry = (n: number): Entry => ({
  kind: 'tick',
  id: uuid(n),
  elementId: uuid(500),
  revisionId: uuid(900),
  device: 'd',
  deviceSequence: n,
  deviceTime: '2026-01-01T10:00:00Z',
});
const copy = uuid(1000);
const states = () => outboxStore.snapshot().map((job) => [job.entry.id, job.state]);

/** A server that answers by the entry's id. */
function serve(answers: Record<string, () => { status: number; body: unknown }>) {
  const seen: string[] = [];
  let sequence = 0;
  globalThis.fetch = jest.fn((url: string) => {
    const id = url.split('/').pop() ?? '';
    seen.push(id);
    const answer = answers[id]?.() ?? { status: 200, body: { sequence: (sequence += 1) } };
    if (answer.status === 0) return Promise.reject(new TypeError('Failed to fetch'));
    return Promise.resolve({
      ok: answer.status < 400,
      status: answer.status,
      json: () => Promise.resolve(answer.body),
    });
  }) as unknown as typeof fetch;
  return seen;
}

const refusal = {
  status: 409,
  body: {
    type: 'about:blank',
    title: 'No',
    status: 409,
    code: 'bench/full',
    detail: 'The bench copy is full.',
  },
};

beforeEach(() => resetOutbox());

describe('the outbox', () => {
  it('sends in order, each once, and holds what is sent until the kept answers have it', async () => {
    const seen = serve({});
    for (const n of [1, 2, 3]) await keepEntry('me', copy, entry(n));
    const result = await flushOutbox('me');
    expect(result).toEqual({ sent: [uuid(1), uuid(2), uuid(3)], stopped: 'no' });
    await flushOutbox('me');
    expect(seen).toEqual([uuid(1), uuid(2), uuid(3)]);
    expect(states()).toEqual([1, 2, 3].map((n) => [uuid(n), 'sent']));
    await dropSent(`{"entries":["${uuid(1)}","${uuid(3)}"]}`);
    expect(states()).toEqual([[uuid(2), 'sent']]);
  });

  it('stops at silence and goes on later from the same place', async () => {
    const silent = serve({ [uuid(2)]: () => ({ status: 0, body: null }) });
    for (const n of [1, 2, 3]) await keepEntry('me', copy, entry(n));
    expect((await flushOutbox('me')).stopped).toBe('no-signal');
    expect(silent).toEqual([uuid(1), uuid(2)]);
    const back = serve({});
    expect((await flushOutbox('me')).sent).toEqual([uuid(2), uuid(3)]);
    expect(back).toEqual([uuid(2), uuid(3)]);
  });

  it.each([500, 503, 429])('keeps an entry waiting when the server answers %i', async (status) => {
    serve({ [uuid(1)]: () => ({ status, body: {} }) });
    await keepEntry('me', copy, entry(1));
    expect((await flushOutbox('me')).stopped).toBe('no-signal');
    expect(states()).toEqual([[uuid(1), 'waiting']]);
  });

  it('keeps what was refused with the reason, goes on with the rest, and tries again when asked', async () => {
    serve({ [uuid(1)]: () => refusal });
    for (const n of [1, 2]) await keepEntry('me', copy, entry(n));
    expect((await flushOutbox('me')).sent).toEqual([uuid(2)]);
    const [refused] = outboxStore.snapshot();
    expect(refused).toMatchObject({
      state: 'refused',
      reason: 'The bench copy is full.',
      code: 'bench/full',
    });
    serve({});
    await retryRefused('me');
    expect((await flushOutbox('me')).sent).toEqual([uuid(1)]);
  });

  it('stops when the session is over, losing nothing', async () => {
    serve({
      [uuid(1)]: () => ({
        status: 401,
        body: { ...refusal.body, status: 401, code: 'auth/needed' },
      }),
    });
    await keepEntry('me', copy, entry(1));
    expect((await flushOutbox('me')).stopped).toBe('signed-out');
    expect(states()).toEqual([[uuid(1), 'waiting']]);
  });

  it('never sends one person’s entries under another sign-in', async () => {
    const seen = serve({});
    await keepEntry('other', copy, entry(1));
    await keepEntry('me', copy, entry(2));
    await flushOutbox('me');
    expect(seen).toEqual([uuid(2)]);
    expect(states()).toContainEqual([uuid(1), 'waiting']);
  });

  it('numbers the entries of a device without a gap or a repeat', async () => {
    const marks = await Promise.all([1, 2, 3].map(() => nextDeviceMark(() => 'new')));
    expect(new Set(marks.map((m) => m.device)).size).toBe(1);
    expect(marks.map((m) => m.deviceSequence).sort()).toEqual([1, 2, 3]);
  });
});

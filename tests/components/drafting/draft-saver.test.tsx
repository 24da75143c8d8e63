/** @jest-environment node */
import { DraftSaver, type Kept } from '../../../components/drafting/draft-saver';
import { type KeptDraft } from '../../../components/data/kept-draft';
import { ApiProblem, NoSignal } from '../../../components/data/problems';
import { emptyPlan, type PlanDocument } from '../../../shared/plan/document';

const plan = (title: string): PlanDocument =>
  emptyPlan('00000000-0000-7000-8000-000000000001', title, 'mm');
const titled = (title: string) => (d: PlanDocument) => ({ ...d, title });
const refusal = (status: number, code: string, meta?: Record<string, unknown>) =>
  new ApiProblem({
    type: 'about:blank',
    title: 'No',
    status,
    code,
    detail: 'No.',
    ...(meta ? { meta } : {}),
  });

/** A saver on a server whose answers are given by hand. */
function bench(
  put?: (
    version: number,
    document: PlanDocument,
  ) => Promise<{ version: number; updatedAt: string }>,
) {
  const sent: [number, string][] = [];
  const kept: (KeptDraft | null)[] = [];
  const states: Kept['state'][] = [];
  const saver = new DraftSaver(1, plan('start'), {
    put: async (version, document) => {
      sent.push([version, document.title]);
      return put
        ? put(version, document)
        : { version: version + 1, updatedAt: '2026-01-01T00:00:00Z' };
    },
    keep: (draft) => kept.push(draft),
    drop: () => kept.push(null),
    changed: (_, state) => states.push(state.state),
  });
  return { saver, sent, kept, states };
}

beforeEach(() => jest.useFakeTimers());
afterEach(() => jest.useRealTimers());

describe('the saver of a draft', () => {
  it('saves once after the last change, and lets go of the local copy', async () => {
    const { saver, sent, kept, states } = bench();
    for (const title of ['a', 'ab', 'abc']) saver.change(titled(title));
    await jest.advanceTimersByTimeAsync(800);
    expect(sent).toEqual([[1, 'abc']]);
    expect(saver.version).toBe(2);
    expect(kept[kept.length - 1]).toBeNull();
    expect(states[states.length - 1]).toBe('kept');
  });

  it('sends what is typed while a slow save is under way', async () => {
    const { saver, sent } = bench(
      (version) =>
        new Promise((resolve) =>
          setTimeout(
            () => resolve({ version: version + 1, updatedAt: '2026-01-01T00:00:00Z' }),
            3000,
          ),
        ),
    );
    saver.change(titled('a'));
    await jest.advanceTimersByTimeAsync(1000);
    saver.change(titled('ab'));
    await jest.advanceTimersByTimeAsync(60_000);
    expect(sent).toEqual([
      [1, 'a'],
      [2, 'ab'],
    ]);
  });

  it('does not send again by itself what was refused', async () => {
    const { saver, sent, states } = bench(() => Promise.reject(refusal(422, 'request/invalid')));
    saver.change(titled('a'));
    await jest.advanceTimersByTimeAsync(120_000);
    expect(sent).toHaveLength(1);
    expect(states[states.length - 1]).toBe('refused');
  });

  it('tries again after silence', async () => {
    let silent = true;
    const { saver, sent, states } = bench((version) =>
      silent
        ? Promise.reject(new NoSignal())
        : Promise.resolve({ version: version + 1, updatedAt: '2026-01-01T00:00:00Z' }),
    );
    saver.change(titled('a'));
    await jest.advanceTimersByTimeAsync(6000);
    expect(states[states.length - 1]).toBe('no-signal');
    silent = false;
    await jest.advanceTimersByTimeAsync(6000);
    expect(states[states.length - 1]).toBe('kept');
    expect(sent.length).toBeGreaterThan(1);
  });

  const stale = () =>
    bench(() =>
      Promise.reject(
        refusal(409, 'drafts/stale-version', { version: 5, document: plan('theirs') }),
      ),
    );

  it('waits for a choice when another window was first, and keeps what is typed meanwhile', async () => {
    const { saver, sent, kept, states } = stale();
    saver.change(titled('mine'));
    await jest.advanceTimersByTimeAsync(800);
    saver.change(titled('mine too'));
    await jest.advanceTimersByTimeAsync(60_000);
    expect(sent).toHaveLength(1);
    expect(states[states.length - 1]).toBe('stale');
    expect(kept[kept.length - 1]?.document.title).toBe('mine too');
    expect(await saver.saveNow()).toBe(false);
  });

  it('takes the other and lets go of the local copy', async () => {
    const { saver, kept } = stale();
    saver.change(titled('mine'));
    await jest.advanceTimersByTimeAsync(800);
    saver.choose('other');
    expect(saver.document.title).toBe('theirs');
    expect(saver.version).toBe(5);
    expect(kept[kept.length - 1]).toBeNull();
    expect(await saver.saveNow()).toBe(true);
  });

  it('puts a closed tab’s state on the server only when it was made from the same version', async () => {
    const same = bench();
    same.saver.restore({ version: 1, document: plan('from the closed tab') });
    await jest.advanceTimersByTimeAsync(10);
    expect(same.sent).toEqual([[1, 'from the closed tab']]);
    const older = bench();
    older.saver.restore({ version: 0, document: plan('old') });
    await jest.advanceTimersByTimeAsync(60_000);
    expect(older.sent).toEqual([]);
    expect(older.states[older.states.length - 1]).toBe('stale');
    older.saver.choose('mine');
    await jest.advanceTimersByTimeAsync(10);
    expect(older.sent).toEqual([[1, 'old']]);
  });

  it('says truthfully whether everything has landed', async () => {
    const fine = bench();
    fine.saver.change(titled('a'));
    expect(await fine.saver.saveNow()).toBe(true);
    const refused = bench(() => Promise.reject(refusal(422, 'request/invalid')));
    refused.saver.change(titled('a'));
    expect(await refused.saver.saveNow()).toBe(false);
  });
});

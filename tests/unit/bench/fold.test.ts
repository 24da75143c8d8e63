import fc from 'fast-check';
import { type Entry } from '../../../shared/plan/bench/entry';
import {
  foldEntries,
  inOrder,
  withdrawn,
  type OrderedEntry,
} from '../../../shared/plan/bench/fold';

const uuid = (n: number) => `00000000-0000-7000-8000-${n.toString(16).padStart(12, '0')}`;
const base = (n: number, about: number) => ({
  id: uuid(n),
  elementId: uuid(about),
  revisionId: uuid(9999),
  device: `d${n % 2}`,
  deviceSequence: n,
  deviceTime: '2026-01-01T10:00:00Z',
});
const tick = (n: number, about: number): Entry => ({ ...base(n, about), kind: 'tick' });
const note = (n: number, about: number, text: string): Entry => ({
  ...base(n, about),
  kind: 'note',
  text,
});
const withdraw = (n: number, of: number): Entry => ({
  ...base(n, 0),
  kind: 'withdraw',
  withdraws: uuid(of),
});
const stored = (entries: Entry[]): OrderedEntry[] =>
  entries.map((entry, i) => ({ entry, sequence: i + 1 }));

describe('the fold of a bench copy', () => {
  it('un-ticks by an entry that withdraws the tick', () => {
    expect(foldEntries(stored([tick(1, 100)])).ticks.has(uuid(100))).toBe(true);
    expect(foldEntries(stored([tick(1, 100), withdraw(2, 1)])).ticks.size).toBe(0);
  });

  it('brings a tick back when its withdrawal is withdrawn', () => {
    expect(
      foldEntries(stored([tick(1, 100), withdraw(2, 1), withdraw(3, 2)])).ticks.has(uuid(100)),
    ).toBe(true);
  });

  it('keeps what was read and understood, until that is taken back', () => {
    const read: Entry = { ...base(1, 70), kind: 'acknowledge' };
    expect([...foldEntries(stored([read])).acknowledged]).toEqual([uuid(70)]);
    expect(foldEntries(stored([read, withdraw(2, 1)])).acknowledged.size).toBe(0);
  });

  it('puts withdrawal links before the order of arrival', () => {
    expect(foldEntries(stored([withdraw(2, 1), tick(1, 100)])).ticks.size).toBe(0);
  });

  it('replaces a corrected reading and keeps the others', () => {
    const reading = (n: number, mm: string, withdraws?: string): Entry => ({
      ...base(n, 50),
      kind: 'reading',
      form: 'figure',
      value: { text: mm, mm },
      instrument: 'calipers',
      place: '',
      ...(withdraws ? { withdraws } : {}),
    });
    const state = foldEntries(
      stored([reading(1, '18'), reading(2, '17'), reading(3, '176/10', uuid(2))]),
    );
    expect(state.readings.get(uuid(50))?.map((r) => r.value.mm)).toEqual(['18', '176/10']);
  });

  it('keeps two notes on one thing side by side', () => {
    const state = foldEntries(stored([note(1, 7, 'near end'), note(2, 7, 'far end')]));
    expect(state.notes.get(uuid(7))?.map((n) => n.text)).toEqual(['near end', 'far end']);
  });

  it('ends only a wait that was started', () => {
    const start: Entry = { ...base(1, 8), kind: 'wait-start', startedAt: '2026-01-01T10:00:00Z' };
    const end: Entry = { ...base(2, 8), kind: 'wait-end' };
    expect(foldEntries(stored([start, end])).waits.get(uuid(8))?.ended).toBe(true);
    expect(foldEntries(stored([end])).waits.size).toBe(0);
  });

  it('counts an entry once whether waiting, stored or both', () => {
    const entry = note(1, 7, 'once');
    const state = foldEntries([
      { entry, sequence: null },
      { entry, sequence: 4 },
      { entry, sequence: null },
    ]);
    expect(state.notes.get(uuid(7))).toHaveLength(1);
  });

  it('survives a ring of withdrawals', () => {
    const a: Entry = { ...tick(1, 100), withdraws: uuid(2) };
    const b: Entry = { ...tick(2, 101), withdraws: uuid(1) };
    expect(() => withdrawn([a, b])).not.toThrow();
  });
});

const anyEntries = fc
  .array(
    fc.record({
      about: fc.integer({ min: 100, max: 104 }),
      takes: fc.option(fc.integer({ min: 0, max: 30 })),
    }),
    { maxLength: 30 },
  )
  .map((list) =>
    list.map((item, n): Entry =>
      item.takes === null || item.takes >= n
        ? tick(n + 1, item.about)
        : withdraw(n + 1, item.takes + 1),
    ),
  );

describe('properties of the fold', () => {
  it('does not depend on the order in which stored entries arrive', () => {
    fc.assert(
      fc.property(anyEntries, fc.integer(), (entries, seed) => {
        const list = stored(entries);
        const shuffled = [...list].sort(
          (a, b) => ((a.sequence! * 7919 + seed) % 101) - ((b.sequence! * 7919 + seed) % 101),
        );
        expect(foldEntries(shuffled)).toEqual(foldEntries(list));
      }),
    );
  });

  it('is the same when entries are sent twice', () => {
    fc.assert(
      fc.property(anyEntries, (entries) => {
        const list = stored(entries);
        expect(foldEntries([...list, ...list])).toEqual(foldEntries(list));
      }),
    );
  });

  it('orders waiting entries after stored ones by the device’s own number', () => {
    fc.assert(
      fc.property(anyEntries, fc.nat(), (entries, cut) => {
        const at = entries.length ? cut % entries.length : 0;
        const mixed = entries.map((entry, i): OrderedEntry => ({
          entry,
          sequence: i < at ? i + 1 : null,
        }));
        const ids = inOrder(mixed).map((e) => e.id);
        expect(ids.slice(0, at)).toEqual(entries.slice(0, at).map((e) => e.id));
        expect(new Set(ids).size).toBe(entries.length);
      }),
    );
  });
});

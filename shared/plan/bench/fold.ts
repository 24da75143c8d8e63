import { type Entry } from './entry';

/** An entry with its place in the order: the server's sequence, or none while it waits to be sent. */
export interface OrderedEntry {
  entry: Entry;
  /** null while it waits; waiting entries come after all stored ones, in the device's own order. */
  sequence: number | null;
}

type Of<K extends Entry['kind']> = Extract<Entry, { kind: K }>;

/** What a bench copy says now. Every list keeps the order of the entries. */
export interface BenchState {
  /** Step ids that are ticked. */
  ticks: ReadonlySet<string>;
  /** Figures per dimension id. */
  readings: ReadonlyMap<string, readonly Of<'reading'>[]>;
  /** The last trial per dimension or check id. */
  trials: ReadonlyMap<string, Of<'trial'>>;
  /** The last look per dimension or check id. */
  looks: ReadonlyMap<string, Of<'look'>>;
  /** All notes per element, side by side. */
  notes: ReadonlyMap<string, readonly Of<'note'>[]>;
  photos: ReadonlyMap<string, readonly Of<'photo'>[]>;
  /** Running or ended waits by wait id. */
  waits: ReadonlyMap<string, { startedAt: string; ended: boolean }>;
  /** Chosen group per alternatives id. */
  choices: ReadonlyMap<string, string>;
  /** Corrections and safety notes that were read, by id. */
  acknowledged: ReadonlySet<string>;
}

/**
 * Puts entries in order: by the server's sequence; those not sent yet after them, by device and the
 * device's own number. Device time never counts. The same entry twice counts once, and its stored
 * form wins over its waiting one.
 */
export function inOrder(entries: readonly OrderedEntry[]): Entry[] {
  const byId = new Map<string, OrderedEntry>();
  for (const item of entries) {
    const known = byId.get(item.entry.id);
    if (!known || (known.sequence === null && item.sequence !== null))
      byId.set(item.entry.id, item);
  }
  return [...byId.values()]
    .sort((a, b) => {
      if (a.sequence !== null && b.sequence !== null) return a.sequence - b.sequence;
      if (a.sequence !== null) return -1;
      if (b.sequence !== null) return 1;
      const device = a.entry.device < b.entry.device ? -1 : a.entry.device > b.entry.device ? 1 : 0;
      return device || a.entry.deviceSequence - b.entry.deviceSequence;
    })
    .map((item) => item.entry);
}

/**
 * Ids that no longer count. Withdrawal links come before order: an entry is out when an entry that
 * itself still counts withdraws it, so withdrawing a withdrawal brings the first one back.
 * A ring of withdrawals (only broken clients make one) leaves its members counting.
 */
export function withdrawn(entries: readonly Entry[]): ReadonlySet<string> {
  const by = new Map<string, string[]>();
  for (const e of entries) {
    if (e.withdraws && e.withdraws !== e.id)
      by.set(e.withdraws, [...(by.get(e.withdraws) ?? []), e.id]);
  }
  const known = new Map<string, boolean>();
  const settle = (start: string): void => {
    const stack = [start];
    const open = new Set<string>();
    while (stack.length > 0) {
      const id = stack[stack.length - 1]!;
      const takers = by.get(id) ?? [];
      open.add(id);
      const next = takers.find((t) => !known.has(t) && !open.has(t));
      if (next) stack.push(next);
      else {
        known.set(
          id,
          takers.some((t) => known.get(t) === false),
        );
        open.delete(id);
        stack.pop();
      }
    }
  };
  for (const e of entries) if (!known.has(e.id)) settle(e.id);
  return new Set(entries.filter((e) => known.get(e.id)).map((e) => e.id));
}

const push = <T>(map: Map<string, T[]>, key: string, value: T): void => {
  const list = map.get(key);
  if (list) list.push(value);
  else map.set(key, [value]);
};

/** The state of a bench copy as a pure fold over its entries, in any order of arrival. */
export function foldEntries(entries: readonly OrderedEntry[]): BenchState {
  const ordered = inOrder(entries);
  const out = withdrawn(ordered);
  const ticks = new Set<string>();
  const readings = new Map<string, Of<'reading'>[]>();
  const trials = new Map<string, Of<'trial'>>();
  const looks = new Map<string, Of<'look'>>();
  const notes = new Map<string, Of<'note'>[]>();
  const photos = new Map<string, Of<'photo'>[]>();
  const waits = new Map<string, { startedAt: string; ended: boolean }>();
  const choices = new Map<string, string>();
  const acknowledged = new Set<string>();
  for (const e of ordered) {
    if (out.has(e.id)) continue;
    if (e.kind === 'tick') ticks.add(e.elementId);
    else if (e.kind === 'reading') push(readings, e.elementId, e);
    else if (e.kind === 'trial') trials.set(e.elementId, e);
    else if (e.kind === 'look') looks.set(e.elementId, e);
    else if (e.kind === 'note') push(notes, e.elementId, e);
    else if (e.kind === 'photo') push(photos, e.elementId, e);
    else if (e.kind === 'wait-start')
      waits.set(e.elementId, { startedAt: e.startedAt, ended: false });
    else if (e.kind === 'wait-end') {
      const wait = waits.get(e.elementId);
      if (wait) waits.set(e.elementId, { ...wait, ended: true });
    } else if (e.kind === 'choice') choices.set(e.elementId, e.groupId);
    else if (e.kind === 'acknowledge') acknowledged.add(e.elementId);
  }
  return { ticks, readings, trials, looks, notes, photos, waits, choices, acknowledged };
}

import { get, update } from 'idb-keyval';
import { type PlanDocument } from '../../shared/plan/document';
import {
  cachesThere,
  clipFilesOf,
  clearKeptCache,
  dropFromCache,
  fetchIntoCache,
  filesOf,
  isKept,
  measureFile,
  type KeptFile,
} from './kept-cache';
import { askToStay, roomLeft } from './storage-room';
import { tell } from './problems';

/** How it stands with the pictures and the clip of one bench copy on this device. */
export type KeptState =
  | { at: 'measuring' | 'nothing' | 'unmeasured' }
  | { at: 'offered' | 'left-out' | 'kept'; bytes: number }
  | { at: 'keeping'; bytes: number; done: number }
  | { at: 'stopped'; bytes: number; reason: string }
  | { at: 'no-room'; bytes: number; room: number | null };

/** What the records of this version mean: since 2 a clip is kept as it is shown, not as it was uploaded. */
const form = 2;
interface KeptRecord {
  /** Missing in those of the first version. */
  form?: number;
  choice: 'keep' | 'leave-out' | 'undecided';
  files: KeptFile[];
  /** Some file was not to be had: they are measured again at the next opening. */
  partly?: boolean;
}
type Records = Record<string, KeptRecord>;

/** Up to here opening a copy keeps its files by itself; beyond, or when data is to be saved, it asks. */
export const keptUnasked = 50_000_000;
const storeKey = 'scantling-kept-files';
const measuring: KeptState = { at: 'measuring' };
const states = new Map<string, KeptState>();
const running = new Map<string, AbortController>();
/** Addresses of files that are here whole. */
const here = new Set<string>();
const listeners = new Set<() => void>();

function set(copyId: string, state: KeptState): void {
  states.set(copyId, state);
  listeners.forEach((listener) => listener());
}

/** For `useSyncExternalStore`. */
export const keptStore = {
  subscribe: (listener: () => void): (() => void) => {
    listeners.add(listener);
    return () => listeners.delete(listener);
  },
  of: (copyId: string): KeptState => states.get(copyId) ?? measuring,
  /** Whether a file is known to be on this device. */
  isHere: (path: string): boolean => here.has(path),
};

const total = (files: readonly KeptFile[]) => files.reduce((sum, file) => sum + file.bytes, 0);
const readAll = async (): Promise<Records> => (await get<Records>(storeKey)) ?? {};
const change = (fn: (records: Records) => Records) =>
  update<Records>(storeKey, (records) => fn(records ?? {}));
const record = (copyId: string, what: KeptRecord) =>
  change((records) => ({ ...records, [copyId]: what }));

function savesData(): boolean {
  const { connection } = navigator as { connection?: { saveData?: boolean } };
  return connection?.saveData === true;
}

/** Sizes of the copy's files: as noted when they were measured before, or asked of the server. */
async function measured(copyId: string, document: PlanDocument): Promise<KeptRecord> {
  const known = (await readAll())[copyId];
  if (known?.form === form && !known.partly) return known;
  const signal = new AbortController().signal;
  // The clip last: it is by far the largest, and the rest should not wait for it.
  const paths = [...filesOf(document), ...(await clipFilesOf(document, signal))];
  const found = await Promise.all(paths.map((path) => measureFile(path, signal)));
  const files = found.filter((file) => file !== null);
  const choice = known?.choice ?? 'undecided';
  const stale = only(await readAll(), copyId).filter((path) => !paths.includes(path));
  const fresh: KeptRecord = { form, choice, files, partly: files.length < found.length };
  await record(copyId, fresh);
  await dropFromCache(stale);
  return fresh;
}

/**
 * To be called when a bench copy is opened: finds out the size of its pictures, captions and clip and
 * keeps them here, or asks first. Goes on where it broke off; does nothing twice.
 */
export async function openKept(copyId: string, document: PlanDocument): Promise<void> {
  if (!cachesThere() || running.has(copyId)) return;
  if (filesOf(document).length === 0 && document.clip.source !== 'upload')
    return set(copyId, { at: 'nothing' });
  void askToStay();
  try {
    const { choice, files } = await measured(copyId, document);
    const bytes = total(files);
    if (choice === 'leave-out') return set(copyId, { at: 'left-out', bytes });
    if (choice === 'keep' || (bytes <= keptUnasked && !savesData())) return await keepFiles(copyId);
    set(copyId, { at: 'offered', bytes });
  } catch {
    set(copyId, { at: 'unmeasured' });
  }
}

async function fetchAll(copyId: string, files: KeptFile[], stop: AbortSignal): Promise<void> {
  const bytes = total(files);
  const there = await Promise.all(files.map(isKept));
  const missing = files.filter((_, i) => !there[i]);
  let done = bytes - total(missing);
  files.forEach((file, i) => there[i] && here.add(file.path));
  if (missing.length === 0) return set(copyId, { at: 'kept', bytes });
  const room = await roomLeft();
  if (room !== null && room < bytes - done) return set(copyId, { at: 'no-room', bytes, room });
  set(copyId, { at: 'keeping', bytes, done });
  for (const file of missing) {
    await fetchIntoCache(file, stop, (more) => {
      done += more;
      if (!stop.aborted) set(copyId, { at: 'keeping', bytes, done });
    });
    here.add(file.path);
  }
  set(copyId, { at: 'kept', bytes });
}

/** Keeps the files of an opened copy on this device. */
export async function keepFiles(copyId: string): Promise<void> {
  if (running.has(copyId)) return;
  const stop = new AbortController();
  running.set(copyId, stop);
  const known: KeptRecord = (await readAll())[copyId] ?? { form, choice: 'keep', files: [] };
  const { files } = known;
  const bytes = total(files);
  try {
    await record(copyId, { ...known, choice: 'keep' });
    await fetchAll(copyId, files, stop.signal);
  } catch (error) {
    if (stop.signal.aborted) return;
    if (error instanceof DOMException && error.name === 'QuotaExceededError')
      set(copyId, { at: 'no-room', bytes, room: await roomLeft() });
    else set(copyId, { at: 'stopped', bytes, reason: tell(error).code });
  } finally {
    if (running.get(copyId) === stop) running.delete(copyId);
  }
}

/** Paths of the first that none of the others need. */
function only(records: Records, copyId: string): string[] {
  const others = new Set(
    Object.entries(records)
      .filter(([id, other]) => id !== copyId && other.choice === 'keep')
      .flatMap(([, other]) => other.files.map((file) => file.path)),
  );
  return (records[copyId]?.files ?? []).map((file) => file.path).filter((p) => !others.has(p));
}

/** Stops keeping a copy's files, removes what is here of them, and remembers that. */
export async function leaveOut(copyId: string): Promise<void> {
  running.get(copyId)?.abort();
  running.delete(copyId);
  const records = await readAll();
  const files = records[copyId]?.files ?? [];
  await record(copyId, { form, choice: 'leave-out', files });
  const gone = only(records, copyId);
  gone.forEach((path) => here.delete(path));
  await dropFromCache(gone);
  set(copyId, { at: 'left-out', bytes: total(files) });
}

/** Forgets copies that are no longer on the bench, with their files. */
export async function dropStrays(copyIds: readonly string[]): Promise<void> {
  if (!cachesThere()) return;
  const there = new Set(copyIds);
  for (const copyId of Object.keys(await readAll()).filter((id) => !there.has(id))) {
    running.get(copyId)?.abort();
    await dropFromCache(only(await readAll(), copyId));
    await change(({ [copyId]: _gone, ...rest }) => rest);
    states.delete(copyId);
  }
}

/** Everything kept of every copy goes: at signing out. */
export async function clearKeptFiles(): Promise<void> {
  if (!cachesThere()) return;
  running.forEach((stop) => stop.abort());
  running.clear();
  states.clear();
  here.clear();
  await change(() => ({}));
  await clearKeptCache();
  listeners.forEach((listener) => listener());
}

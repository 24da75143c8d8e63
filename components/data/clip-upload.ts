import { v7 as uuid } from 'uuid';
import {
  cancelUpload,
  completeUpload,
  getUpload,
  startUpload,
  type Upload,
} from '../../shared/api/uploads';
import { call } from './api-client';
import { patiently } from './patience';
import { tell } from './problems';

/** How it stands with the clip a draft is being given. */
export type Sending =
  | { at: 'none' }
  | { at: 'sending' | 'paused' | 'no-signal'; name: string; bytes: number; sent: number }
  | { at: 'looking'; name: string }
  | { at: 'stopped'; name: string; reason: string }
  | { at: 'done'; name: string; hash: string; duration: number | null };

interface Run {
  file: File;
  state: Sending;
  stop: AbortController;
  uploadId?: string;
  pauser?: { pause(): void; resume(): void };
}

const none: Sending = { at: 'none' };
const runs = new Map<string, Run>();
const listeners = new Set<() => void>();

/** For `useSyncExternalStore`, by plan. Uploads go on while other pages of the application are open. */
export const sendingStore = {
  subscribe: (listener: () => void): (() => void) => {
    listeners.add(listener);
    return () => listeners.delete(listener);
  },
  of: (planId: string): Sending => runs.get(planId)?.state ?? none,
};

function tellAll(): void {
  listeners.forEach((listener) => listener());
}
function show(run: Run, state: Sending): void {
  run.state = state;
  tellAll();
}

/** What the same file is known by, today and after a reload. */
export const markOf = (file: File): string =>
  `${file.name.slice(0, 200)} ${file.size} ${file.lastModified}`;

/** Asks until the server has looked into an upload. */
async function looked(id: string, run: Run): Promise<Upload> {
  const { signal } = run.stop;
  for (;;) {
    const ask = () => call(getUpload, { params: { uploadId: id }, signal });
    const { upload } = await patiently(ask, signal, () => undefined);
    if (upload.state !== 'waiting' && upload.state !== 'working') return upload;
    await new Promise((resolve) => setTimeout(resolve, 700));
  }
}

async function begin(planId: string, run: Run): Promise<Upload> {
  const { file, stop } = run;
  const body = {
    id: uuid(),
    planId,
    name: file.name.slice(0, 200),
    mark: markOf(file),
    bytes: file.size,
  };
  const ask = () => call(startUpload, { body, signal: stop.signal });
  const { upload } = await patiently(ask, stop.signal, waiting(run));
  run.uploadId = upload.id;
  return upload;
}

const waiting = (run: Run) => (isWaiting: boolean) => {
  const { state } = run;
  if (state.at === 'sending' || state.at === 'no-signal')
    show(run, { ...state, at: isWaiting ? 'no-signal' : 'sending' });
};

async function send(planId: string, run: Run): Promise<void> {
  const { file, stop } = run;
  const upload = await begin(planId, run);
  // Only those who upload pay for the uploader.
  const { sendParts } = await import('./clip-parts');
  await sendParts({
    upload,
    file,
    signal: stop.signal,
    onWait: waiting(run),
    onSent: (sent) => {
      const { state } = run;
      if (state.at === 'sending' || state.at === 'no-signal')
        show(run, { ...state, at: 'sending', sent });
    },
    onReady: (pauser) => (run.pauser = pauser),
  });
  show(run, { at: 'looking', name: file.name });
  const params = { uploadId: upload.id };
  await patiently(
    () => call(completeUpload, { params }),
    stop.signal,
    () => undefined,
  );
  const done = await looked(upload.id, run);
  if (done.state === 'done' && done.hash)
    show(run, { at: 'done', name: file.name, hash: done.hash, duration: done.duration });
  else show(run, { at: 'stopped', name: file.name, reason: done.reason ?? '' });
}

/** Sends a clip for a draft straight to the object store; goes on where the same file broke off before. */
export async function sendClip(planId: string, file: File): Promise<void> {
  runs.get(planId)?.stop.abort();
  const { name, size: bytes } = file;
  const state: Sending = { at: 'sending', name, bytes, sent: 0 };
  const run: Run = { file, stop: new AbortController(), state };
  runs.set(planId, run);
  tellAll();
  try {
    await send(planId, run);
  } catch (error) {
    if (run.stop.signal.aborted) return;
    show(run, { at: 'stopped', name, reason: tell(error).text });
  }
}

export function pauseClip(planId: string): void {
  const run = runs.get(planId);
  if (!run || (run.state.at !== 'sending' && run.state.at !== 'no-signal')) return;
  run.pauser?.pause();
  show(run, { ...run.state, at: 'paused' });
}

export function resumeClip(planId: string): void {
  const run = runs.get(planId);
  if (run?.state.at === 'paused') {
    show(run, { ...run.state, at: 'sending' });
    run.pauser?.resume();
  } else if (run?.state.at === 'stopped') void sendClip(planId, run.file);
}

/** Gives an upload up, here and at the server; throws when the server cannot be told. */
export async function giveClipUp(planId: string, uploadId?: string): Promise<void> {
  const run = runs.get(planId);
  run?.stop.abort();
  runs.delete(planId);
  tellAll();
  const id = uploadId ?? run?.uploadId;
  if (id && run?.state.at !== 'done') await call(cancelUpload, { params: { uploadId: id } });
}

/** Forgets a run that is over. */
export function clearSending(planId: string): void {
  runs.delete(planId);
  tellAll();
}

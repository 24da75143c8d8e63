import { passing } from './problems';

const pauses = [500, 1000, 2000, 4000, 8000];

/** Resolves after a while, sooner when the browser says that the signal is back; rejects when aborted. */
function rest(ms: number, signal: AbortSignal): Promise<void> {
  return new Promise((resolve, reject) => {
    const end = () => {
      clearTimeout(timer);
      window.removeEventListener('online', end);
      signal.removeEventListener('abort', end);
      if (signal.aborted) reject(signal.reason as Error);
      else resolve();
    };
    const timer = setTimeout(end, ms);
    window.addEventListener('online', end);
    signal.addEventListener('abort', end);
  });
}

/**
 * Tries until it works, fails for good, or is aborted: what passes by itself (no signal, a server that
 * starts again) is waited out. `onWait` is told when a wait begins and when it is over.
 */
export async function patiently<T>(
  work: () => Promise<T>,
  signal: AbortSignal,
  onWait: (waiting: boolean) => void,
  passes: (error: unknown) => boolean = passing,
): Promise<T> {
  for (let tries = 0; ; tries += 1) {
    signal.throwIfAborted();
    try {
      const result = await work();
      if (tries > 0) onWait(false);
      return result;
    } catch (error) {
      if (signal.aborted || !passes(error)) throw error;
      onWait(true);
      await rest(pauses[Math.min(tries, pauses.length - 1)] ?? 8000, signal);
    }
  }
}

/** Bytes this browser would still take; null when it does not say. */
export async function roomLeft(): Promise<number | null> {
  try {
    const { quota, usage } = await navigator.storage.estimate();
    return quota === undefined || usage === undefined ? null : Math.max(0, quota - usage);
  } catch {
    return null;
  }
}

let answer: Promise<boolean> | undefined;

/**
 * Asks the browser not to clear what is stored here when the device runs short of room; once per page.
 * False when it refuses or knows no such promise.
 */
export function askToStay(): Promise<boolean> {
  answer ??= (async () => {
    try {
      return (await navigator.storage.persisted()) || (await navigator.storage.persist());
    } catch {
      return false;
    }
  })();
  return answer;
}

const storeKey = (aid: string, units: string) => `scantling-aid:${aid}:${units}`;

/** What was last typed into an aid on this device; null when nothing was or it cannot be read. */
export function keptInput(aid: string, units: string): Record<string, string> | null {
  try {
    const kept: unknown = JSON.parse(localStorage.getItem(storeKey(aid, units)) ?? 'null');
    if (kept === null || typeof kept !== 'object') return null;
    return Object.fromEntries(
      Object.entries(kept).filter(
        (entry): entry is [string, string] => typeof entry[1] === 'string',
      ),
    );
  } catch {
    return null;
  }
}

/** Keeps what is typed; a full or blocked store forgets it with the page. */
export function keepInput(
  aid: string,
  units: string,
  values: Readonly<Record<string, string>>,
): void {
  try {
    localStorage.setItem(storeKey(aid, units), JSON.stringify(values));
  } catch {
    // Kept for this page only.
  }
}

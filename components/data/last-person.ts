const storeKey = 'scantling-last-person';

/** Who was last signed in at this browser and has not signed out. */
export interface LastPerson {
  id: string;
  email: string;
}

export function lastPerson(): LastPerson | null {
  try {
    const known = JSON.parse(
      localStorage.getItem(storeKey) ?? 'null',
    ) as Partial<LastPerson> | null;
    return typeof known?.id === 'string' && typeof known.email === 'string'
      ? { id: known.id, email: known.email }
      : null;
  } catch {
    return null;
  }
}

export function noteLastPerson({ id, email }: LastPerson): void {
  try {
    localStorage.setItem(storeKey, JSON.stringify({ id, email }));
  } catch {
    // Full or blocked: the e-mail has to be typed again, no more.
  }
}

export function forgetLastPerson(): void {
  try {
    localStorage.removeItem(storeKey);
  } catch {
    // As above.
  }
}

import { useSyncExternalStore } from 'react';
import { preferencesSchema, updateProfile, type Preferences } from '../../shared/api/accounts';
import { call } from './api-client';

const storeKey = 'scantling-preferences';
const listeners = new Set<() => void>();
const standard: Preferences = preferencesSchema.parse({});
let current: Preferences | undefined;

function read(): Preferences {
  if (current) return current;
  try {
    const text = localStorage.getItem(storeKey);
    current = text ? preferencesSchema.catch(standard).parse(JSON.parse(text)) : standard;
  } catch {
    current = standard;
  }
  return current;
}

function write(next: Preferences): void {
  current = next;
  try {
    localStorage.setItem(storeKey, JSON.stringify(next));
  } catch {
    // A full or blocked store: the choice holds for this page only.
  }
  listeners.forEach((listener) => listener());
}

const subscribe = (listener: () => void) => {
  listeners.add(listener);
  return () => listeners.delete(listener);
};

/** Takes over what the account says, at sign-in and on load. */
export function adoptPreferences(preferences: Preferences): void {
  if (JSON.stringify(preferences) !== JSON.stringify(read())) write(preferences);
}

/**
 * Units, inch grid, terms and hand of whoever looks; kept in this browser at once, and with the
 * account when there is one (best effort: the browser's copy counts here).
 */
export function usePreferences(
  signedIn = false,
): [Preferences, (change: Partial<Preferences>) => void] {
  const preferences = useSyncExternalStore(subscribe, read, () => standard);
  const change = (part: Partial<Preferences>) => {
    write({ ...read(), ...part });
    if (signedIn) call(updateProfile, { body: { preferences: part } }).catch(() => undefined);
  };
  return [preferences, change];
}

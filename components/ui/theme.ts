import { useSyncExternalStore } from 'react';
import { useMedia } from './use-media';

/** What a person chose; `system` follows the device. */
export type ThemeChoice = 'day' | 'night' | 'system';

export interface Theme {
  choice: ThemeChoice;
  /** What is on screen now. On the pre-rendered page it is `day`. */
  shown: 'day' | 'night';
  choose: (choice: ThemeChoice) => void;
}

/** Same key as public/theme.js, which sets the theme before the first paint. */
const storageKey = 'scantling.theme';
const listeners = new Set<() => void>();

function readChoice(): ThemeChoice {
  const set = document.documentElement.dataset.theme;
  return set === 'day' || set === 'night' ? set : 'system';
}

/** Shows the theme at once and keeps the choice for the next visit, where storage allows. */
export function chooseTheme(choice: ThemeChoice): void {
  const root = document.documentElement;
  if (choice === 'system') delete root.dataset.theme;
  else root.dataset.theme = choice;
  try {
    if (choice === 'system') window.localStorage.removeItem(storageKey);
    else window.localStorage.setItem(storageKey, choice);
  } catch {
    // Storage is closed: the choice lasts as long as the page.
  }
  listeners.forEach((changed) => changed());
}

function subscribe(changed: () => void): () => void {
  listeners.add(changed);
  return () => listeners.delete(changed);
}

/** The theme and how to change it. Colours themselves are CSS variables and need no hook. */
export function useTheme(): Theme {
  const choice = useSyncExternalStore<ThemeChoice>(subscribe, readChoice, () => 'system');
  const dark = useMedia('(prefers-color-scheme: dark)');
  const shown = choice === 'system' ? (dark ? 'night' : 'day') : choice;
  return { choice, shown, choose: chooseTheme };
}

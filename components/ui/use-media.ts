import { useCallback, useSyncExternalStore } from 'react';
import { breakpoint } from './tokens';

const hasMatchMedia = () =>
  typeof window !== 'undefined' && typeof window.matchMedia === 'function';

/**
 * True while the media query matches. False on the pre-rendered page and at hydration, so use it
 * for behaviour; what must look right at first paint belongs to the style sheet (`data-show`).
 */
export function useMedia(query: string): boolean {
  const subscribe = useCallback(
    (changed: () => void) => {
      if (!hasMatchMedia()) return () => undefined;
      const list = window.matchMedia(query);
      list.addEventListener('change', changed);
      return () => list.removeEventListener('change', changed);
    },
    [query],
  );
  return useSyncExternalStore(
    subscribe,
    () => hasMatchMedia() && window.matchMedia(query).matches,
    () => false,
  );
}

/** From 1024 px: rail, content, third pane. */
export const useWide = () => useMedia(`(min-width: ${breakpoint.wide}px)`);

/** Below 640 px. */
export const usePhone = () => useMedia(`(max-width: ${breakpoint.phone - 0.02}px)`);

/** Nothing moves for who asked for that. */
export const useReducedMotion = () => useMedia('(prefers-reduced-motion: reduce)');

const nothing = () => () => undefined;

/** False on the pre-rendered page and at hydration, true right after: for what depends on the address or the device. */
export const useMounted = () =>
  useSyncExternalStore(
    nothing,
    () => true,
    () => false,
  );

import { useCallback, useSyncExternalStore } from 'react';

type Typed = Readonly<Record<string, string>>;

const none: Typed = {};
const key = (planId: string) => `scantling-own-${planId}`;
const listeners = new Set<() => void>();
const known = new Map<string, Typed>();

function read(planId: string): Typed {
  const held = known.get(planId);
  if (held) return held;
  let typed = none;
  try {
    const parsed: unknown = JSON.parse(localStorage.getItem(key(planId)) ?? '{}');
    if (parsed !== null && typeof parsed === 'object') {
      typed = Object.fromEntries(
        Object.entries(parsed).filter((e): e is [string, string] => typeof e[1] === 'string'),
      );
    }
  } catch {
    // A store that is blocked or broken: nothing was kept.
  }
  known.set(planId, typed);
  return typed;
}

function write(planId: string, typed: Typed): void {
  known.set(planId, typed);
  try {
    localStorage.setItem(key(planId), JSON.stringify(typed));
  } catch {
    // Full or blocked: the figures hold for this page only.
  }
  listeners.forEach((listener) => listener());
}

const subscribe = (listener: () => void) => {
  listeners.add(listener);
  return () => listeners.delete(listener);
};

/** A reader's own figures for a plan, by dimension id, kept in this browser. */
export function useOwnFigures(planId: string) {
  const typed = useSyncExternalStore(
    subscribe,
    () => read(planId),
    () => none,
  );
  const keep = useCallback(
    (next: Typed) =>
      write(
        planId,
        Object.fromEntries(Object.entries(next).filter(([, text]) => text.trim() !== '')),
      ),
    [planId],
  );
  const clear = useCallback(() => write(planId, none), [planId]);
  return { typed, keep, clear };
}

import { type KeyboardEvent } from 'react';

/** How far an arrow key moves in a list of that direction; Home and End go to the ends. */
const steps: Record<'row' | 'column' | 'both', Record<string, number>> = {
  row: { ArrowLeft: -1, ArrowRight: 1 },
  column: { ArrowUp: -1, ArrowDown: 1 },
  both: { ArrowLeft: -1, ArrowUp: -1, ArrowRight: 1, ArrowDown: 1 },
};

export interface ArrowKeysOptions {
  /** Role of the group around the items, e.g. `radiogroup`. */
  group: string;
  /** Role of the items, e.g. `radio`. */
  item: string;
  axis: 'row' | 'column' | 'both';
  /** The item focus moved to, by its place among those that are not disabled. */
  onMove?: (element: HTMLElement) => void;
}

/**
 * Arrow keys, Home and End among the items of a group with one tab stop. Goes round at the ends.
 * Returns true when the key was one of them.
 */
export function arrowKeys(event: KeyboardEvent<HTMLElement>, options: ArrowKeysOptions): boolean {
  const step = steps[options.axis][event.key];
  const toEnd = event.key === 'Home' || event.key === 'End';
  if (step === undefined && !toEnd) return false;
  const group = event.currentTarget.closest(`[role="${options.group}"]`);
  const items = [
    ...(group?.querySelectorAll<HTMLElement>(`[role="${options.item}"]`) ?? []),
  ].filter((item) => item.getAttribute('aria-disabled') !== 'true');
  if (items.length === 0) return false;
  event.preventDefault();
  const here = items.indexOf(event.currentTarget);
  const next = toEnd
    ? event.key === 'Home'
      ? 0
      : items.length - 1
    : (here + (step ?? 0) + items.length) % items.length;
  const target = items[next];
  target?.focus();
  if (target) options.onMove?.(target);
  return true;
}

/** Space presses what has a role other than button, where the browser would scroll instead. */
export function spacePresses(event: KeyboardEvent<HTMLElement>, press: () => void): void {
  if (event.key !== ' ') return;
  event.preventDefault();
  press();
}

import { useEffect } from 'react';

const forth = new Set(['PageDown', 'ArrowRight', ' ']);
const back = new Set(['PageUp', 'ArrowLeft']);

/** Keys and foot pedals: page keys, arrows and space, never while something is typed or a control has the focus for them. */
export function useStepKeys(keys: { next: () => void; back: () => void; off: boolean }): void {
  useEffect(() => {
    if (keys.off) return;
    const press = (event: KeyboardEvent) => {
      const target = event.target as HTMLElement | null;
      if (event.defaultPrevented || event.altKey || event.ctrlKey || event.metaKey) return;
      if (
        target?.closest(
          'input, textarea, select, video, [role="slider"], [role="dialog"], [role="radiogroup"]',
        )
      )
        return;
      // Space presses what has the focus.
      if (event.key === ' ' && target?.closest('button, a, summary, [role="button"]')) return;
      if (forth.has(event.key)) keys.next();
      else if (back.has(event.key)) keys.back();
      else return;
      event.preventDefault();
    };
    window.addEventListener('keydown', press);
    return () => window.removeEventListener('keydown', press);
  });
}

import { type KeyboardEvent } from 'react';
import { type StickStep } from '../../shared/plan/stick/types';

/** How many steps PageUp and PageDown go. */
const page = 5;

const moves: Record<string, (index: number, last: number) => number> = {
  ArrowLeft: (i) => i - 1,
  ArrowUp: (i) => i - 1,
  ArrowRight: (i) => i + 1,
  ArrowDown: (i) => i + 1,
  PageUp: (i) => i - page,
  PageDown: (i) => i + page,
  Home: () => 0,
  End: (_, last) => last,
};

export interface StickKeyActions {
  steps: readonly StickStep[];
  /** Id of the step the slider stands on. */
  at: string | undefined;
  onStep?: (id: string) => void;
  onOpen?: (id: string) => void;
}

/** Arrows, Home, End and the page keys go from step to step; Enter opens. True when the key was used. */
export function stickKey(event: KeyboardEvent<HTMLElement>, actions: StickKeyActions): boolean {
  const { steps, at, onStep, onOpen } = actions;
  if (event.altKey || event.ctrlKey || event.metaKey) return false;
  if (event.key === 'Enter' && at && onOpen) {
    event.preventDefault();
    onOpen(at);
    return true;
  }
  const move = moves[event.key];
  if (!move || !onStep) return false;
  event.preventDefault();
  const index = Math.max(
    0,
    steps.findIndex((s) => s.id === at),
  );
  const next = steps[Math.min(steps.length - 1, Math.max(0, move(index, steps.length - 1)))];
  if (next && next.id !== at) onStep(next.id);
  return true;
}

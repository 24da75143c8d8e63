import { useEffect, useRef, type KeyboardEvent } from 'react';
import { markRange, nudgeMark } from '../../shared/plan/stick/snap';
import { type StickStep } from '../../shared/plan/stick/types';

/** What the drafting stick asks of its owner; every change of a mark has its undo there. */
export interface StickDrafting {
  /** Where captions start, seconds: dragged marks snap to them. */
  captionStarts: readonly number[];
  /** A mark was put down at a new start (seconds), after a drag or a nudge. */
  onMoveMark: (id: string, start: number, how: 'drag' | 'nudge') => void;
  /** I and O: the current step's in and out at the place of the clip. */
  onMarkIn?: () => void;
  onMarkOut?: () => void;
  /** S: a step starts at the place. */
  onNewStep?: () => void;
  /** M: a measure is taken at the place. */
  onTakeMeasure?: () => void;
  /** Alt with up and down: the step goes one place back or on. */
  onMoveStep?: (id: string, direction: -1 | 1) => void;
}

interface NudgeOptions {
  drafting: StickDrafting;
  steps: readonly StickStep[];
  duration: number;
  at: string | undefined;
}

const sideways: Record<string, -1 | 1> = { ArrowLeft: -1, ArrowRight: 1 };

/** On the stick itself: left and right nudge the mark 0.1 s (Shift 1 s), Alt with up and down moves the step. */
export function draftingStickKey(event: KeyboardEvent<HTMLElement>, o: NudgeOptions): boolean {
  const step = o.steps.find((s) => s.id === o.at);
  if (!step || event.ctrlKey || event.metaKey) return false;
  if (event.altKey && (event.key === 'ArrowUp' || event.key === 'ArrowDown')) {
    event.preventDefault();
    o.drafting.onMoveStep?.(step.id, event.key === 'ArrowUp' ? -1 : 1);
    return true;
  }
  const direction = sideways[event.key];
  if (!direction || event.altKey) return false;
  event.preventDefault();
  const start = nudgeMark(step, direction, event.shiftKey, markRange(o.steps, step.id, o.duration));
  if (start !== step.start) o.drafting.onMoveMark(step.id, start, 'nudge');
  return true;
}

const inTextField = (target: EventTarget | null) =>
  target instanceof HTMLElement &&
  (target.isContentEditable || /^(input|textarea|select)$/i.test(target.tagName));

/** I, O, S and M anywhere on the drafting page but in a field. */
export function useDraftingKeys(drafting: StickDrafting | undefined): void {
  const latest = useRef(drafting);
  useEffect(() => {
    latest.current = drafting;
  }, [drafting]);
  const active = drafting !== undefined;
  useEffect(() => {
    if (!active) return undefined;
    const press = (event: globalThis.KeyboardEvent) => {
      if (event.altKey || event.ctrlKey || event.metaKey || event.defaultPrevented) return;
      if (inTextField(event.target)) return;
      const d = latest.current;
      const action = { i: d?.onMarkIn, o: d?.onMarkOut, s: d?.onNewStep, m: d?.onTakeMeasure }[
        event.key.toLowerCase()
      ];
      if (!action) return;
      event.preventDefault();
      action();
    };
    document.addEventListener('keydown', press);
    return () => document.removeEventListener('keydown', press);
  }, [active]);
}

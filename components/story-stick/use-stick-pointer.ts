import { useState, type PointerEvent } from 'react';
import { stickScale } from '../../shared/plan/stick/scale';
import { markRange, snapTime } from '../../shared/plan/stick/snap';
import { type StickInput } from '../../shared/plan/stick/types';
import { type StickDrafting } from './drafting-keys';
import { frame } from './stick-drawing';

/** A mark within this many px of the finger is taken hold of. */
const hold = { mouse: 8, touch: 16 } as const;
/** A caption's start this near takes the mark to it, px. */
const snapReach = 8;

interface PointerOptions {
  input: StickInput;
  length: number;
  drafting?: StickDrafting;
  onSeek?: (seconds: number) => void;
  onStep?: (id: string) => void;
}

interface Drag {
  pointer: number;
  id: string | null;
  start: number;
}

/**
 * Pressing and dragging on the stick. In drafting a mark near the finger is dragged with snapping;
 * anywhere else the place in the clip follows the finger (`onSeek`), or the step is chosen (`onStep`).
 */
export function useStickPointer({ input, length, drafting, onSeek, onStep }: PointerOptions) {
  const [drag, setDrag] = useState<Drag | null>(null);
  const scale = stickScale(length, input.duration);
  const timeOf = (event: PointerEvent<HTMLElement>) => {
    const box = event.currentTarget.getBoundingClientRect();
    return scale.timeAt(event.clientX - box.left - frame.left);
  };
  const snapped = (seconds: number, id: string, fine: boolean) => {
    const perPx = scale.timeAt(length) / Math.max(1, length);
    const range = markRange(input.steps, id, input.duration);
    const time = snapTime(seconds, {
      captionStarts: drafting?.captionStarts ?? [],
      reach: snapReach * perPx,
      fine,
    });
    return Math.min(range.to, Math.max(range.from, time));
  };
  const place = (seconds: number) => {
    if (onSeek) onSeek(seconds);
    const step = input.steps.findLast((s) => s.start <= seconds) ?? input.steps[0];
    if (!onSeek && step) onStep?.(step.id);
  };
  const down = (event: PointerEvent<HTMLElement>) => {
    if (event.button !== 0) return;
    const seconds = timeOf(event);
    const reach = event.pointerType === 'mouse' ? hold.mouse : hold.touch;
    const id = drafting
      ? nearestMark(input, (t) => Math.abs(scale.at(t) - scale.at(seconds)), reach)
      : null;
    event.currentTarget.setPointerCapture?.(event.pointerId);
    setDrag({ pointer: event.pointerId, id, start: seconds });
    if (id) onStep?.(id);
    else place(seconds);
  };
  const move = (event: PointerEvent<HTMLElement>) => {
    if (!drag || drag.pointer !== event.pointerId) return;
    const seconds = timeOf(event);
    if (drag.id) setDrag({ ...drag, start: snapped(seconds, drag.id, event.shiftKey) });
    else if (onSeek) onSeek(seconds);
  };
  const up = (event: PointerEvent<HTMLElement>) => {
    if (!drag || drag.pointer !== event.pointerId) return;
    const { id } = drag;
    setDrag(null);
    if (!id) return;
    const start = snapped(timeOf(event), id, event.shiftKey);
    if (start !== input.steps.find((s) => s.id === id)?.start)
      drafting?.onMoveMark(id, start, 'drag');
  };
  return {
    /** The input with the dragged mark where the finger is. */
    shown: drag?.id ? withMark(input, drag.id, drag.start) : input,
    dragging: drag?.id ?? null,
    handlers: {
      onPointerDown: down,
      onPointerMove: move,
      onPointerUp: up,
      onPointerCancel: () => setDrag(null),
    },
  };
}

/** The step whose mark is nearest within reach. The first mark is the stick's zero and stays there. */
function nearestMark(
  input: StickInput,
  distance: (seconds: number) => number,
  reach: number,
): string | null {
  let best: { id: string; px: number } | null = null;
  for (const step of input.steps) {
    const px = distance(step.start);
    if (px <= reach && (!best || px < best.px)) best = { id: step.id, px };
  }
  return best?.id ?? null;
}

/** A copy with one mark moved: its stretch begins there, and the one before ends there if they touched. */
export function withMark(input: StickInput, id: string, start: number): StickInput {
  const index = input.steps.findIndex((s) => s.id === id);
  const was = input.steps[index]?.start;
  return {
    ...input,
    steps: input.steps.map((s, i) => {
      if (i === index) return { ...s, start, end: Math.max(start, s.end) };
      return i === index - 1 && s.end === was ? { ...s, end: start } : s;
    }),
  };
}

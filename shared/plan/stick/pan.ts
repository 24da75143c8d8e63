import { stickFigures } from './figures';

/** Length of the body: the frame's, or longer with more than sixty steps. */
export function bodyLength(frame: number, steps: number): number {
  if (steps <= stickFigures.panFrom) return frame;
  return Math.max(frame, stickFigures.zeroEnd + steps * stickFigures.panSpacing);
}

/**
 * How far a longer stick is shifted in its frame so that the current stretch lies in the middle
 * third. A shift that already does so is kept.
 */
export function panOffset(o: {
  body: number;
  frame: number;
  current: number;
  offset: number;
}): number {
  const { body, frame, current, offset } = o;
  const most = Math.max(0, body - frame);
  const clamp = (px: number) => Math.min(most, Math.max(0, px));
  const seen = current - offset;
  if (seen >= frame / 3 && seen <= (2 * frame) / 3) return clamp(offset);
  return clamp(current - frame / 2);
}

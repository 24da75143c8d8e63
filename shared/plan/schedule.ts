import { type PlanDocument, type Step } from './document';

/** When a step can be done by one pair of hands, in minutes from the start. */
export interface Slot {
  step: Step;
  start: number;
  /** Its hands-on time is over. */
  end: number;
  /** Its waits are over as well. */
  ready: number;
}

/**
 * Lays the steps out in their order. A step starts when the hands are free, when no wait holds it up, and when the steps
 * that must be done before are ready, their waits included.
 */
export function scheduleOf(document: PlanDocument): Slot[] {
  const ready = new Map<string, number>();
  let free = 0;
  return document.steps.map((step) => {
    const start = Math.max(free, ...step.after.map((id) => ready.get(id) ?? 0));
    const end = start + step.handsOn;
    const held = step.waits.reduce((m, w) => (w.nextMayStart ? m : Math.max(m, w.minutes)), 0);
    const slot = {
      step,
      start,
      end,
      ready: end + step.waits.reduce((m, w) => Math.max(m, w.minutes), 0),
    };
    free = end + held;
    ready.set(step.id, slot.ready);
    return slot;
  });
}

/** Minutes until everything is done and ready: the longest chain. */
export const elapsedOf = (slots: readonly Slot[]): number =>
  slots.reduce((latest, slot) => Math.max(latest, slot.ready), 0);

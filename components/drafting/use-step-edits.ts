import { v7 as uuid } from 'uuid';
import { stepSchema, type Step } from '../../shared/plan/document';
import { toast } from '../ui/announcer';
import { type ClipPlace } from './clip-place';
import { type DraftEditor } from './use-draft-editor';

const shortest = 0.1;

/** A step with its in or out at a moment; the other end gives way when they would cross. */
export function withMark(step: Step, which: 'start' | 'end', at: number): Step {
  const known = step.stretches[0] ?? { start: at, end: at + 10 };
  const stretch =
    which === 'start'
      ? { start: at, end: Math.max(known.end, at + shortest) }
      : { start: Math.min(known.start, Math.max(0, at - shortest)), end: Math.max(at, shortest) };
  return { ...step, stretches: [stretch, ...step.stretches.slice(1)] };
}

/** Takes a step out of its place and puts it at another. */
export function reordered(steps: readonly Step[], id: string, to: number): Step[] {
  const step = steps.find((s) => s.id === id);
  if (!step) return [...steps];
  const rest = steps.filter((s) => s.id !== id);
  rest.splice(Math.max(0, Math.min(rest.length, to)), 0, step);
  return rest;
}

/** What can be done to the steps; marks that were dragged can be put back. */
export function useStepEdits(
  { document, change }: DraftEditor,
  place: ClipPlace,
  open: string | null,
  setOpen: (id: string) => void,
) {
  const setSteps = (fn: (steps: Step[]) => Step[]) => change((d) => ({ ...d, steps: fn(d.steps) }));
  const one = (id: string, fn: (step: Step) => Step) =>
    setSteps((steps) => steps.map((s) => (s.id === id ? fn(s) : s)));
  return {
    setSteps,
    replace: (step: Step) => one(step.id, () => step),
    move: (id: string, by: number) =>
      setSteps((steps) => reordered(steps, id, steps.findIndex((s) => s.id === id) + by)),
    moveTo: (id: string, to: number) => setSteps((steps) => reordered(steps, id, to)),
    mark: (which: 'start' | 'end', id: string | null = open) => {
      if (id) one(id, (step) => withMark(step, which, place.now));
    },
    start: (id: string, at: number, how: 'drag' | 'nudge') => {
      const before = document.steps;
      one(id, (step) => withMark(step, 'start', at));
      if (how === 'drag') {
        toast({
          text: 'The mark was moved.',
          action: { label: 'Put it back', onPress: () => change((d) => ({ ...d, steps: before })) },
        });
      }
    },
    add: () => {
      const step = stepSchema.parse({
        id: uuid(),
        title: '',
        stretches:
          document.clip.source === 'none' ? [] : [{ start: place.now, end: place.now + 10 }],
      });
      setSteps((steps) => {
        const after = steps.findIndex((s) => (s.stretches[0]?.start ?? -1) > place.now);
        return reordered(
          [...steps, step],
          step.id,
          document.clip.source === 'none' || after < 0 ? steps.length : after,
        );
      });
      setOpen(step.id);
    },
  };
}

import { v7 as uuid } from 'uuid';
import { stepSchema, type PlanDocument, type Step } from '../../shared/plan/document';
import { toast } from '../ui/announcer';
import { putBack } from './fields/list-editor';
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

/** A step that begins where the clip is. */
function newStep({ clip }: PlanDocument, now: number): Step {
  const stretches = clip.source === 'none' ? [] : [{ start: now, end: now + 10 }];
  return stepSchema.parse({ id: uuid(), title: '', stretches });
}

/** The steps with one more, before the first that begins later in the clip, else at the end. */
function placedByTime(steps: readonly Step[], step: Step): Step[] {
  const start = step.stretches[0]?.start;
  const after =
    start === undefined ? -1 : steps.findIndex((s) => (s.stretches[0]?.start ?? -1) > start);
  return reordered([...steps, step], step.id, after < 0 ? steps.length : after);
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
    change: one,
    remove: (gone: Step) => {
      const at = document.steps.findIndex((s) => s.id === gone.id);
      setSteps((steps) => steps.filter((s) => s.id !== gone.id));
      toast({
        text: `“${gone.title || 'The step'}” is out.`,
        action: {
          label: 'Put it back',
          onPress: () => setSteps((steps) => putBack(steps, gone, at)),
        },
      });
    },
    move: (id: string, by: number) =>
      setSteps((steps) => reordered(steps, id, steps.findIndex((s) => s.id === id) + by)),
    moveTo: (id: string, to: number) => setSteps((steps) => reordered(steps, id, to)),
    mark: (which: 'start' | 'end', id: string | null = open) => {
      if (id) one(id, (step) => withMark(step, which, place.now));
    },
    start: (id: string, at: number, how: 'drag' | 'nudge') => {
      const before = document.steps.find((s) => s.id === id)?.stretches[0];
      one(id, (step) => withMark(step, 'start', at));
      if (how !== 'drag') return;
      toast({
        text: 'The mark was moved.',
        action: {
          label: 'Put it back',
          // Only the mark goes back; what was written since stays.
          onPress: () =>
            one(id, (step) => ({
              ...step,
              stretches: [...(before ? [before] : []), ...step.stretches.slice(1)],
            })),
        },
      });
    },
    add: () => {
      const step = newStep(document, place.now);
      setSteps((steps) => placedByTime(steps, step));
      setOpen(step.id);
    },
  };
}

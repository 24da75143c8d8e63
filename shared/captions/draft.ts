import { type HeardMeasure, type HeardThing, type Jottings, type Phase } from './types';

/** A step as the drafting import takes it: times in seconds, everything heard in it. */
export interface DraftStep {
  id: string;
  title: string;
  start: number;
  end: number;
  phase: Phase;
  measures: HeardMeasure[];
  cautions: { id: string; t: number; text: string }[];
  tools: HeardThing[];
  materials: HeardThing[];
}

export interface HeardStretch {
  measures: HeardMeasure[];
  cautions: Jottings['cautions'];
  tools: HeardThing[];
  materials: HeardThing[];
  corrections: Jottings['corrections'];
}

/** Everything heard from one second up to another. */
export function heardIn(jottings: Jottings, start: number, end: number): HeardStretch {
  const inside = <T extends { t: number }>(items: readonly T[]) =>
    items.filter((item) => item.t >= start && item.t < end);
  return {
    measures: inside(jottings.measures),
    cautions: inside(jottings.cautions),
    tools: inside(jottings.tools),
    materials: inside(jottings.materials),
    corrections: inside(jottings.corrections),
  };
}

/** The timed steps of a plan's draft; opening and sign-off are left to the caller by their phase. */
export function toDraft(jottings: Jottings): DraftStep[] {
  return jottings.steps.map((step, i) => {
    const last = i === jottings.steps.length - 1;
    const { measures, cautions, tools, materials } = heardIn(
      jottings,
      step.start,
      last ? Infinity : step.end,
    );
    return {
      id: step.id,
      title: step.title,
      start: step.start,
      end: step.end,
      phase: step.phase,
      measures,
      cautions: cautions.map(({ id, t, text }) => ({ id, t, text })),
      tools,
      materials,
    };
  });
}

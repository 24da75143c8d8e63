import { stickFigures } from './figures';
import { numberEvery, shownNumbers } from './numbers';
import { stickScale, type StickScale } from './scale';
import { drawnShapes } from './shapes';
import { type StickInput, type StickStep, type StickStepState, type StickVerdict } from './types';

/** A stretch of the body, px along the stick. */
export interface StickSpan {
  id: string;
  number: number;
  from: number;
  to: number;
  state: StickStepState;
}

/** A step's long mark. */
export interface StickMark {
  id: string;
  at: number;
  number: number;
  state: StickStepState;
  /** Its number is written; without it the mark crosses 62 % only. */
  numbered: boolean;
}

/** A dimension's short mark; `shape` is false where a worse one beside it is drawn. */
export interface StickDim {
  at: number;
  verdict: StickVerdict;
  onDye: boolean;
  shape: boolean;
}

/** The square of a step that fails, under its mark. */
export interface StickFailure {
  at: number;
  shape: boolean;
}

/** A broken-stick sign; `at` is the left edge of its gap. */
export interface StickWait {
  at: number;
  running: boolean;
  /** Seconds left while it runs. */
  left: number | null;
}

/** A note hanging from the far side. */
export interface StickTalk {
  at: number;
  count: number;
}

export interface StickLayout {
  scale: StickScale;
  spans: StickSpan[];
  marks: StickMark[];
  dims: StickDim[];
  failures: StickFailure[];
  waits: StickWait[];
  talk: StickTalk[];
  /** Marks stand so close that they are drawn thin. */
  dense: boolean;
}

/** Where everything stands on a stick whose body is `length` px long. */
export function layoutStick(input: StickInput, length: number): StickLayout {
  const scale = stickScale(length, input.duration);
  const { steps } = input;
  const every = numberEvery(length, steps.length);
  const placed = steps.map((s) => ({
    at: scale.at(s.start),
    number: s.number,
    current: s.state === 'current',
  }));
  const shown = shownNumbers(placed, every);
  return {
    scale,
    spans: steps.map((s) => spanOf(s, scale)),
    marks: steps.map((s, i) => ({
      id: s.id,
      at: scale.at(s.start),
      number: s.number,
      state: s.state,
      numbered: shown.has(i),
    })),
    ...hangingShapes(steps, scale),
    waits: steps.flatMap((s, i) => waitsOf(s, steps[i + 1], scale)),
    talk: mergeTalk(
      steps.flatMap((s) => s.talk.map((t) => ({ at: scale.at(t.at), count: t.count }))),
      length,
    ),
    dense: every !== 1,
  };
}

function spanOf(step: StickStep, scale: StickScale): StickSpan {
  const from = scale.at(step.start);
  return {
    id: step.id,
    number: step.number,
    from,
    to: Math.max(from, scale.at(step.end)),
    state: step.state,
  };
}

/** Dimensions' shapes and failing steps' squares share one lane, so they are thinned out together. */
function hangingShapes(
  steps: readonly StickStep[],
  scale: StickScale,
): Pick<StickLayout, 'dims' | 'failures'> {
  const dims = steps.flatMap((s) =>
    s.verdicts.map((v) => ({ at: scale.at(v.at), verdict: v.verdict, onDye: s.state === 'done' })),
  );
  const failures = steps
    .filter((s) => s.failing)
    .map((s) => ({ at: scale.at(s.start), verdict: 'fails' as const }));
  const drawn = new Set<object>(drawnShapes([...failures, ...dims]));
  return {
    dims: dims.map((d) => ({ ...d, shape: drawn.has(d) })),
    failures: failures.map((f) => ({ at: f.at, shape: drawn.has(f) })),
  };
}

/** The gap stands where the wait is, but never over its own long mark or the next one. */
function waitsOf(step: StickStep, next: StickStep | undefined, scale: StickScale): StickWait[] {
  const clear = 2;
  const from = scale.at(step.start) + clear;
  const to = (next ? scale.at(next.start) : scale.length) - clear - stickFigures.waitGap;
  return step.waits.map((w) => ({
    at: Math.max(from, Math.min(to, scale.at(w.at) - stickFigures.waitGap / 2)),
    running: w.running ?? false,
    left: w.running ? (w.left ?? null) : null,
  }));
}

/** Room a note takes with its count, and the air after it. */
const noteRoom = (count: number) => stickFigures.noteWidth + 3 + String(count).length * 7 + 4;

/** Notes that would overlap become one with the counts added up. */
export function mergeTalk(notes: readonly StickTalk[], length: number): StickTalk[] {
  const sorted = [...notes].filter((n) => n.count > 0).sort((a, b) => a.at - b.at);
  const merged: StickTalk[] = [];
  for (const note of sorted) {
    const last = merged.at(-1);
    if (last && note.at < last.at + noteRoom(last.count)) last.count += note.count;
    else merged.push({ ...note });
  }
  return merged.map((n) => ({ ...n, at: Math.max(0, Math.min(n.at, length - noteRoom(n.count))) }));
}

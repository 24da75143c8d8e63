import { stickFigures } from './figures';
import { type StickVerdict } from './types';

/** Worst first: what is drawn where two shapes would overlap. */
export const verdictOrder: readonly StickVerdict[] = ['fails', 'close', 'risk', 'need', 'holds'];

const rank = (v: StickVerdict) => verdictOrder.indexOf(v);

/** The worst of several verdicts, or undefined of none. */
export function worstVerdict(verdicts: readonly StickVerdict[]): StickVerdict | undefined {
  return verdictOrder.find((v) => verdicts.includes(v));
}

/**
 * Which shapes are drawn, in place order: the worst ones first take their place, and none comes
 * nearer than `apart` px to one already there.
 */
export function drawnShapes<S extends { at: number; verdict: StickVerdict }>(
  shapes: readonly S[],
  apart: number = stickFigures.shapeApart,
): S[] {
  const bySeriousness = shapes
    .map((shape, i) => ({ shape, i }))
    .sort(
      (a, b) =>
        rank(a.shape.verdict) - rank(b.shape.verdict) || a.shape.at - b.shape.at || a.i - b.i,
    );
  const kept: S[] = [];
  for (const { shape } of bySeriousness) {
    if (kept.every((k) => Math.abs(k.at - shape.at) >= apart)) kept.push(shape);
  }
  return kept.sort((a, b) => a.at - b.at);
}

export interface SpreadShape {
  /** Share of the stretch from its mark, 0–1. */
  share: number;
  verdict: StickVerdict;
}

/** Most shapes a stretch of text carries; beyond it the worst are kept. */
const mostInRow = 3;

/** Where one, two, three or four things stand in a stretch as long as its text. */
const places = [[], [0.48], [0.28, 0.58], [0.24, 0.48, 0.72], [0.2, 0.4, 0.6, 0.8]] as const;

/**
 * On a plan page a stretch is as long as its text, so what hangs there stands in order and evenly:
 * the shapes first, then the note where there is talk.
 */
export function spreadShapes(
  verdicts: readonly StickVerdict[],
  hasTalk = false,
): { shapes: SpreadShape[]; note: number | null } {
  const kept = verdicts
    .map((verdict, i) => ({ verdict, i }))
    .sort((a, b) => rank(a.verdict) - rank(b.verdict) || a.i - b.i)
    .slice(0, mostInRow)
    .sort((a, b) => a.i - b.i);
  const shares = places[kept.length + (hasTalk ? 1 : 0)] ?? [];
  return {
    shapes: kept.map(({ verdict }, i) => ({ verdict, share: shares[i] ?? 0.5 })),
    note: hasTalk ? (shares[kept.length] ?? 0.5) : null,
  };
}

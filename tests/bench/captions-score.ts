/** Scores jottings against gold notes. Rules: tolerances below, largest one-to-one pairing, F1 = 2PR / (P + R). */
export interface ScoredMeasure {
  t: number;
  value?: number | null;
  values?: number[];
  unit: string;
}
export interface ScoredWord {
  t: number;
  heard: string;
  meant: string;
}
export interface Gold {
  file: string;
  steps: { start: number; phase: string }[];
  measures: ScoredMeasure[];
  cautions: { t: number }[];
  mishearings: ScoredWord[];
}
export interface Result {
  steps: { start: number }[];
  measures: ScoredMeasure[];
  cautions: { t: number }[];
  corrections: ScoredWord[];
}
export interface Tally {
  gold: number;
  result: number;
  matched: number;
}
export type Score = Record<'steps' | 'measures' | 'cautions' | 'corrections', Tally>;

interface Pairing<G, R> {
  matched: number;
  missed: G[];
  extra: R[];
}

/** The largest one-to-one pairing of gold and result items that may be paired. */
function pair<G, R>(
  golds: readonly G[],
  results: readonly R[],
  away: (g: G, r: R) => number,
  may: (g: G, r: R) => boolean,
): Pairing<G, R> {
  const candidates = golds.map((g) =>
    results
      .map((r, j) => ({ j, d: away(g, r), ok: may(g, r) }))
      .filter((each) => each.ok && Number.isFinite(each.d))
      .sort((a, b) => a.d - b.d)
      .map((each) => each.j),
  );
  const goldOf = new Map<number, number>();
  const grow = (i: number, seen: Set<number>): boolean => {
    for (const j of candidates[i] ?? []) {
      if (seen.has(j)) continue;
      seen.add(j);
      const holder = goldOf.get(j);
      if (holder === undefined || grow(holder, seen)) {
        goldOf.set(j, i);
        return true;
      }
    }
    return false;
  };
  golds
    .map((_, i) => i)
    .sort((a, b) => (candidates[a]?.length ?? 0) - (candidates[b]?.length ?? 0))
    .forEach((i) => grow(i, new Set()));
  const hit = new Set(goldOf.values());
  return {
    matched: hit.size,
    missed: golds.filter((_, i) => !hit.has(i)),
    extra: results.filter((_, j) => !goldOf.has(j)),
  };
}

const slack = 1e-9;
const listed = (m: ScoredMeasure): (number | null | undefined)[] =>
  m.values && m.values.length > 0 ? m.values : [m.value];

function sameValue(a: ScoredMeasure, b: ScoredMeasure): boolean {
  const [x, y] = [listed(a), listed(b)];
  return (
    x.length === y.length &&
    x.every((value, i) => (value == null ? y[i] == null : Math.abs(value - (y[i] ?? NaN)) <= 1e-6))
  );
}

const wordsOf = (text: string) =>
  text
    .toLowerCase()
    .replace(/[^a-z0-9' ]+/g, ' ')
    .trim()
    .split(/\s+/)
    .filter((word) => word !== '');

/** What was misheard, without the words both sides share at either end. */
function core({ heard, meant }: ScoredWord): string {
  let [a, b] = [wordsOf(heard), wordsOf(meant)];
  while (a.length > 1 && b.length > 1 && a[0] === b[0]) [a, b] = [a.slice(1), b.slice(1)];
  while (a.length > 1 && b.length > 1 && a.at(-1) === b.at(-1))
    [a, b] = [a.slice(0, -1), b.slice(0, -1)];
  return `${a.join(' ')} => ${b.join(' ')}`;
}

const tally = <G, R>(pairing: Pairing<G, R>): Tally => ({
  gold: pairing.matched + pairing.missed.length,
  result: pairing.matched + pairing.extra.length,
  matched: pairing.matched,
});

const byStart = (a: { start: number }, b: { start: number }) => Math.abs(a.start - b.start);
const byTime = (a: { t: number }, b: { t: number }) => Math.abs(a.t - b.t);

/** Matches a result with its gold. A step at the start of a gold intro or outro is neither right nor wrong. */
export function score(gold: Gold, result: Result): Score {
  const framing = gold.steps.filter((step) => step.phase === 'intro' || step.phase === 'outro');
  const steps = pair(
    gold.steps.filter((step) => !framing.includes(step)),
    result.steps,
    byStart,
    (g, r) => byStart(g, r) <= 8 + slack,
  );
  steps.extra = pair(framing, steps.extra, byStart, (g, r) => byStart(g, r) <= 8 + slack).extra;
  return {
    steps: tally(steps),
    measures: tally(
      pair(
        gold.measures,
        result.measures,
        byTime,
        (g, r) => byTime(g, r) <= 6 + slack && g.unit === r.unit && sameValue(g, r),
      ),
    ),
    cautions: tally(
      pair(gold.cautions, result.cautions, byTime, (g, r) => byTime(g, r) <= 8 + slack),
    ),
    corrections: tally(
      pair(
        gold.mishearings,
        result.corrections,
        byTime,
        (g, r) => byTime(g, r) <= 6 + slack && core(g) === core(r),
      ),
    ),
  };
}

/** Precision, recall and F1 of a tally; nothing wanted and nothing given is 1. */
export function rates({ gold, result, matched }: Tally): {
  precision: number;
  recall: number;
  f1: number;
} {
  const precision = result > 0 ? matched / result : gold > 0 ? 0 : 1;
  const recall = gold > 0 ? matched / gold : 1;
  return {
    precision,
    recall,
    f1: precision + recall > 0 ? (2 * precision * recall) / (precision + recall) : 0,
  };
}

/** Tallies of several files added up. */
export function pooled(scores: readonly Score[]): Score {
  const add = (key: keyof Score): Tally =>
    scores.reduce<Tally>(
      (sum, each) => ({
        gold: sum.gold + each[key].gold,
        result: sum.result + each[key].result,
        matched: sum.matched + each[key].matched,
      }),
      { gold: 0, result: 0, matched: 0 },
    );
  return {
    steps: add('steps'),
    measures: add('measures'),
    cautions: add('cautions'),
    corrections: add('corrections'),
  };
}

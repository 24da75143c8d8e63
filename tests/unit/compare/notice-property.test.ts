import fc from 'fast-check';
import { compareRevisions, type Change } from '../../../shared/plan/compare';
import { type PlanDocument } from '../../../shared/plan/document';
import { noticeFor, type Meaning } from '../../../shared/plan/notice';
import { cautionId, dimensionId, entriesOf, partId, planFrom, stepId, type Rows } from './plan';

/*
 * Complete: nothing that means something else to this builder is left out. Minimal: nothing else is in, and each thing
 * once. Both are checked against an oracle that works out figures, cuts and verdicts by itself from the rows.
 */
const runs = { numRuns: process.env.SCANTLING_LONG ? 5000 : 250 };
const sense = fc.constantFrom(
  'outside' as const,
  'inside' as const,
  'place' as const,
  'setting' as const,
);
const figure = fc.integer({ min: 20, max: 60 });
const counts = { dimensions: 6, parts: 3, steps: 5 };
const some = (max: number) => fc.uniqueArray(fc.nat({ max: max - 1 }), { maxLength: 2 });
const rows: fc.Arbitrary<Rows> = fc.record({
  dimensions: fc.tuple(
    ...Array.from({ length: counts.dimensions }, (_, i) =>
      fc.record({
        of: i < 4 ? figure : fc.oneof(figure, fc.tuple(fc.nat({ max: 3 }), fc.nat({ max: 3 }))),
        tolerance: fc.constantFrom(0.5, 1, 4),
        sense,
        taken: i === 0 ? fc.boolean() : fc.constant(false),
      }),
    ),
  ),
  parts: fc.array(
    fc.record({
      length: fc.nat({ max: 5 }),
      width: figure,
      quantity: fc.integer({ min: 1, max: 2 }),
    }),
    { minLength: counts.parts, maxLength: counts.parts },
  ),
  steps: fc.array(
    fc.record({
      holds: some(counts.dimensions),
      takes: fc.constant<number[]>([]),
      sizes: some(counts.parts),
      text: fc.constantFrom('Do it.', 'Do it well.'),
      caution: fc.constantFrom('Mind the blade.', 'Mind the blade and wait for it.'),
    }),
    { minLength: counts.steps, maxLength: counts.steps },
  ),
});
/** A later revision: some rows of the first replaced by rows of another. */
const pair = fc
  .tuple(rows, rows, fc.array(fc.boolean(), { minLength: 14, maxLength: 14 }))
  .map(([a, other, flips]): [Rows, Rows] => [
    a,
    {
      dimensions: a.dimensions.map((d, i) =>
        flips[i] ? { ...other.dimensions[i]!, taken: d.taken ?? false } : d,
      ),
      parts: a.parts.map((p, i) => (flips[6 + i] ? other.parts[i]! : p)),
      steps: a.steps.map((s, i) => (flips[9 + i] ? other.steps[i]! : s)),
    },
  ]);
const bench = fc.record({
  ticks: fc.uniqueArray(fc.nat({ max: counts.steps - 1 })),
  readings: fc.uniqueArray(fc.tuple(fc.nat({ max: counts.dimensions - 1 }), figure), {
    selector: ([d]) => d,
    maxLength: 4,
  }),
});
type Bench = { ticks: number[]; readings: [number, number][] };

const readOf = (bench: Bench, d: number) => bench.readings.find(([n]) => n === d)?.[1];
/** Nominal and half band of a dimension, worked out from the rows. A taken one is what was read (calipers ±0.03). */
function valueOf(all: Rows, d: number, bench: Bench): { x: number; half: number } {
  const row = all.dimensions[d]!;
  const read = readOf(bench, d);
  if (row.taken && !Array.isArray(row.of) && read !== undefined) return { x: read, half: 0.03 };
  const x = Array.isArray(row.of)
    ? row.of.reduce((sum, n) => sum + valueOf(all, n, bench).x, 0)
    : row.of;
  return { x, half: row.tolerance };
}
const differs = (a: { x: number; half: number }, b: { x: number; half: number }) =>
  Math.abs(a.x - b.x) > 1e-6 || Math.abs(a.half - b.half) > 1e-6;

const setOf = (list: readonly number[]) => [...list].sort().join();
const stepsWith = (both: [Rows, Rows], test: (all: Rows, s: Rows['steps'][number]) => boolean) =>
  both.flatMap((all) => all.steps.flatMap((s, i) => (test(all, s) ? [i] : [])));

const isTaken = (row: Rows['dimensions'][number]) => row.taken === true && !Array.isArray(row.of);

function dimensionMeans(both: [Rows, Rows], d: number, bench: Bench): Meaning | null {
  const [a, b] = both;
  const [was, now] = [a.dimensions[d]!, b.dimensions[d]!];
  const read = readOf(bench, d);
  const [before, after] = [valueOf(a, d, bench), valueOf(b, d, bench)];
  const stands = isTaken(was) && isTaken(now) && read !== undefined;
  const own =
    was.sense !== now.sense ||
    isTaken(was) !== isTaken(now) ||
    Array.isArray(was.of) !== Array.isArray(now.of) ||
    (!stands && (String(was.of) !== String(now.of) || was.tolerance !== now.tolerance));
  const uses = stepsWith(
    both,
    (all, s) => s.holds.includes(d) || s.sizes.some((p) => all.parts[p]?.length === d),
  );
  if (!own && !differs(before, after)) return null;
  if (!own && uses.length === 0 && read === undefined) return null;
  const reached = read !== undefined || uses.some((s) => bench.ticks.includes(s));
  const cut =
    !isTaken(now) &&
    reached &&
    (read !== undefined || cutSteps(both, d).some((s) => bench.ticks.includes(s)));
  if (!reached) return 'not-reached';
  if (!cut) return isTaken(now) ? 'done' : 'nothing-cut';
  if (!differs(before, after)) return 'done';
  const made = read ?? before.x;
  const off =
    made > after.x + after.half + 1e-6
      ? made - after.x - after.half
      : Math.min(0, made - after.x + after.half + 1e-6);
  if (off === 0) return 'inside';
  if (now.sense === 'place' || now.sense === 'setting') return 'work';
  if ((now.sense === 'outside') !== off > 0) return 'cannot';
  return now.sense === 'outside' && off >= 3.2 ? 'recut' : 'work';
}
/** A taken dimension in one revision is cut by nothing there. */
const cutSteps = (both: [Rows, Rows], d: number) =>
  both.flatMap((all) =>
    isTaken(all.dimensions[d]!)
      ? []
      : all.steps.flatMap((s, i) =>
          s.holds.includes(d) || s.sizes.some((p) => all.parts[p]?.length === d) ? [i] : [],
        ),
  );

function partMeans(both: [Rows, Rows], p: number, bench: Bench): Meaning | null {
  const [a, b] = both;
  const [was, now] = [a.parts[p]!, b.parts[p]!];
  const [before, after] = [valueOf(a, was.length, bench), valueOf(b, now.length, bench)];
  const sizes = differs(before, after) || was.width !== now.width;
  if (!sizes && was.length === now.length && was.quantity === now.quantity) return null;
  const steps = stepsWith(both, (_, s) => s.sizes.includes(p));
  if (!steps.some((s) => bench.ticks.includes(s))) return 'not-reached';
  const read = isTaken(a.dimensions[was.length]!) ? undefined : readOf(bench, was.length);
  const offs: number[] = [];
  if (differs(before, after)) {
    const made = read ?? before.x;
    offs.push(
      made > after.x + after.half + 1e-6
        ? made - after.x - after.half
        : made < after.x - after.half - 1e-6
          ? made - after.x + after.half
          : 0,
    );
  }
  if (was.width !== now.width) offs.push(was.width - now.width);
  if (offs.some((o) => o < 0)) return 'cannot';
  if (now.quantity > was.quantity) return 'make';
  if (offs.length === 0) return 'done';
  if (offs.some((o) => o >= 3.2)) return 'recut';
  return offs.some((o) => o > 0) ? 'work' : 'inside';
}

/** Everything the notice must say and nothing else, by key. */
function expected(both: [Rows, Rows], bench: Bench): Map<string, Meaning> {
  const [a, b] = both;
  const out = new Map<string, Meaning>();
  const say = (key: string, means: Meaning | null) => means && out.set(key, means);
  a.dimensions.forEach((_, d) =>
    say(`dimension/${dimensionId(d)}`, dimensionMeans(both, d, bench)),
  );
  a.parts.forEach((_, p) => say(`part/${partId(p)}`, partMeans(both, p, bench)));
  a.steps.forEach((was, i) => {
    const now = b.steps[i]!;
    const means = bench.ticks.includes(i) ? 'done' : 'not-reached';
    const same =
      was.text === now.text &&
      setOf(was.holds) === setOf(now.holds) &&
      setOf(was.sizes) === setOf(now.sizes);
    if (!same) say(`step/${stepId(i)}`, means);
    if (was.caution !== now.caution) say(`caution/${cautionId(i)}`, means);
  });
  return out;
}

it('is complete and minimal for any pair of revisions and any bench copy', () => {
  fc.assert(
    fc.property(pair, bench, (both, copy) => {
      const notice = noticeFor(
        planFrom(both[0]),
        planFrom(both[1]),
        entriesOf(copy.ticks, copy.readings),
      );
      const keys = notice.items.map((i) => i.change.key);
      expect(new Set(keys).size).toBe(keys.length);
      const said = new Map(notice.items.map((i) => [i.change.key, i.means]));
      expect(Object.fromEntries(said)).toEqual(Object.fromEntries(expected(both, copy)));
      for (const item of notice.items) {
        if (item.means === 'cannot' && item.change.subject === 'part')
          expect(item.needs.map((n) => n.partId)).toEqual([item.change.elementId]);
        if (item.change.how === 'follows') expect(item.change.because).not.toEqual([]);
      }
      expect(Object.values(notice.counts).reduce((n, c) => n + c, 0)).toBe(keys.length);
    }),
    runs,
  );
});

/** The earlier revision with some of the changed elements taken from the later one. */
function patched(a: PlanDocument, b: PlanDocument, keys: ReadonlySet<string>): PlanDocument {
  const list = <T extends { id: string }>(subject: string, was: T[], now: T[]) => [
    ...was.flatMap((x) =>
      keys.has(`${subject}/${x.id}`) ? now.filter((y) => y.id === x.id) : [x],
    ),
    ...now.filter((y) => keys.has(`${subject}/${y.id}`) && !was.some((x) => x.id === y.id)),
  ];
  const steps = list('step', a.steps, b.steps).map((s) => {
    const [was, now] = [a, b].map((d) => d.steps.find((x) => x.id === s.id)?.cautions ?? []);
    return { ...s, cautions: list('caution', was!, now!) };
  });
  return {
    ...a,
    dimensions: list('dimension', a.dimensions, b.dimensions),
    parts: list('part', a.parts, b.parts),
    steps,
  };
}
const own = (changes: Change[]) => changes.filter((c) => c.how !== 'follows').map((c) => c.key);

it('lists changes that make the later revision out of the earlier one, none of them idle', () => {
  fc.assert(
    fc.property(pair, fc.nat(), (both, pick) => {
      const [a, b] = [planFrom(both[0]), planFrom(both[1])];
      const keys = own(compareRevisions(a, b).changes);
      expect(compareRevisions(patched(a, b, new Set(keys)), b).changes).toEqual([]);
      const left = keys[pick % Math.max(1, keys.length)];
      if (left === undefined) return;
      const without = patched(a, b, new Set(keys.filter((k) => k !== left)));
      expect(own(compareRevisions(without, b).changes)).toEqual([left]);
    }),
    runs,
  );
});

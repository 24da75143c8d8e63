import { foldEntries, type BenchState, type OrderedEntry } from '../bench/fold';
import { compareRevisions, type Change, type Comparison } from '../compare';
import { type PlanDocument } from '../document';
import { type PlanModel } from '../model';
import { cutDimension, cutPart, judgeFigures } from './cut';
import {
  meanings,
  type CutFigure,
  type Meaning,
  type Notice,
  type NoticeItem,
  type StockNeed,
} from './types';
import { usesOf, type Uses } from './uses';

export * from './types';
export { describeItem, meaningWord, needText } from './words';

/** What one builder has done, seen from both revisions. */
interface Bench {
  state: BenchState;
  before: PlanModel;
  after: PlanModel;
  uses: { before: Uses; after: Uses };
}

const stepsOf = (bench: Bench, what: 'used' | 'cut', key: string): Set<string> =>
  new Set([
    ...(bench.uses.before[what].get(key) ?? []),
    ...(bench.uses.after[what].get(key) ?? []),
  ]);

/** Something was done in the step: ticked, or one of its waits begun. */
function touchedSteps({ state, before }: Bench): Set<string> {
  const touched = new Set(state.ticks);
  for (const step of before.document.steps)
    if (step.waits.some((w) => state.waits.has(w.id))) touched.add(step.id);
  return touched;
}

const plainly = (change: Change, means: Meaning): NoticeItem => ({
  change,
  means,
  cure: 'none',
  figures: [],
  needs: [],
  assumed: false,
});

function needOf(after: PlanModel, partId: string): StockNeed[] {
  const part = after.document.parts.find((p) => p.id === partId);
  const state = after.parts.get(partId);
  if (!part || !state) return [];
  const extra = part.allowance.trim() === '' ? 0 : (after.evaluate(part.allowance).value?.x ?? 0);
  const size = (x: number | undefined) => (x === undefined ? null : x + extra);
  const stock = after.document.stock.find((s) => s.id === part.stockId);
  return [
    {
      partId,
      mark: part.mark,
      quantity: part.quantity,
      stockId: stock?.id ?? null,
      stock: stock?.name ?? '',
      length: size(state.length.value?.x),
      width: size(state.width.value?.x),
      thickness: state.thickness.value?.x ?? null,
    },
  ];
}

/** Parts that are already cut and take a dimension straight from its symbol. */
function cutPartsOf(bench: Bench, dimensionId: string): string[] {
  const parts = bench.after.usedBy(dimensionId).parts;
  return parts.filter((id) => anyOf(bench.state.ticks, stepsOf(bench, 'cut', `part/${id}`)));
}

const anyOf = (have: ReadonlySet<string>, wanted: ReadonlySet<string>): boolean =>
  [...wanted].some((id) => have.has(id));

/** How many more of a part the later revision asks for. */
function morePieces({ before, after }: Bench, partId: string): number {
  const count = (m: PlanModel) => m.document.parts.find((p) => p.id === partId)?.quantity ?? 0;
  return Math.max(0, count(after) - count(before));
}

function cutItem(bench: Bench, change: Change): NoticeItem | null {
  const { before, after } = bench;
  const { subject, elementId } = change;
  const figures: CutFigure[] =
    subject === 'part'
      ? cutPart(change, before)
      : [cutDimension(change, before, after)].flatMap((f) => f ?? []);
  const moved = subject === 'part' || change.figures.length > 0;
  const more = subject === 'part' ? morePieces(bench, elementId) : 0;
  if (more === 0 && (figures.length === 0 || !moved)) return null;
  const judged = judgeFigures(figures);
  if (more > 0 && judged.means !== 'cannot') {
    const needs = needOf(after, elementId).map((need) => ({ ...need, quantity: more }));
    return { ...plainly(change, 'make'), figures, needs, assumed: figures.some((f) => !f.read) };
  }
  const again =
    judged.means !== 'cannot'
      ? []
      : subject === 'part'
        ? [elementId]
        : cutPartsOf(bench, elementId);
  return {
    change,
    ...judged,
    figures,
    needs: again.flatMap((id) => needOf(after, id)),
    assumed: figures.some((f) => !f.read),
  };
}

/** A new element: is the place where it comes in past? */
function added(bench: Bench, change: Change, touched: ReadonlySet<string>): NoticeItem {
  const { subject, key } = change;
  const { steps } = bench.after.document;
  if (subject === 'step') {
    const at = steps.findIndex((s) => s.id === change.elementId);
    const past = steps.slice(at + 1).some((s) => bench.state.ticks.has(s.id));
    return plainly(change, past ? 'missed' : 'not-reached');
  }
  if (!anyOf(touched, stepsOf(bench, 'used', key))) return plainly(change, 'not-reached');
  if (subject !== 'part') return plainly(change, 'missed');
  return { ...plainly(change, 'make'), needs: needOf(bench.after, change.elementId) };
}

const isCut = (bench: Bench, change: Change): boolean => {
  const { state, before, after } = bench;
  if (change.subject === 'dimension') {
    const origin = (
      after.dimensions.get(change.elementId) ?? before.dimensions.get(change.elementId)
    )?.dimension.origin;
    if (origin === 'taken') return false;
    if ((state.readings.get(change.elementId)?.length ?? 0) > 0) return true;
  }
  return anyOf(state.ticks, stepsOf(bench, 'cut', change.key));
};

/** Kinds of elements that are cut; of the rest one can only say whether their step is done. */
const isMaterial = ({ subject }: Change) => subject === 'dimension' || subject === 'part';

function itemOf(bench: Bench, change: Change, touched: ReadonlySet<string>): NoticeItem {
  if (change.how === 'added') return added(bench, change, touched);
  const { state, after } = bench;
  const reached =
    anyOf(touched, stepsOf(bench, 'used', change.key)) ||
    state.readings.has(change.elementId) ||
    state.trials.has(change.elementId) ||
    state.looks.has(change.elementId);
  const cut = isMaterial(change) && isCut(bench, change);
  if (change.how === 'removed') {
    if (cut || (reached && !isMaterial(change))) return plainly(change, 'not-needed');
    return plainly(change, reached ? 'nothing-cut' : 'not-reached');
  }
  if (cut) {
    const item = cutItem(bench, change);
    if (item) return item;
    const broken = change.figures.some((f) => !f.of.startsWith('features/') && f.after?.x === null);
    return plainly(change, broken ? 'measure' : 'done');
  }
  if (!reached) return plainly(change, 'not-reached');
  const found = after.dimensions.get(change.elementId)?.dimension.origin === 'taken';
  return plainly(change, isMaterial(change) && !found ? 'nothing-cut' : 'done');
}

/** A figure that follows and that nobody meets in any step says nothing by itself; what follows from it does. */
function isMet(bench: Bench, change: Change): boolean {
  if (change.how !== 'follows') return true;
  if (change.subject !== 'dimension') return true;
  return stepsOf(bench, 'used', change.key).size > 0 || bench.state.readings.has(change.elementId);
}

/** Names, prices, links and pictures are for reading, not for the bench. */
const forBench = (change: Change): boolean => {
  if (['plan', 'link', 'credit', 'photo'].includes(change.subject)) return false;
  if (change.how !== 'changed') return true;
  return (
    change.figures.length > 0 || change.verdict !== null || change.fields.some((f) => !f.quiet)
  );
};

/** What the comparison means for a bench copy in this state; made on models with its readings. */
export function noticeOf({ changes, before, after }: Comparison, state: BenchState): Notice {
  const bench: Bench = {
    state,
    before,
    after,
    uses: { before: usesOf(before), after: usesOf(after) },
  };
  const touched = touchedSteps(bench);
  const items = changes
    .filter((change) => forBench(change) && isMet(bench, change))
    .map((change) => itemOf(bench, change, touched))
    .sort((a, b) => meanings.indexOf(a.means) - meanings.indexOf(b.means));
  const counts: Notice['counts'] = {};
  for (const { means } of items) counts[means] = (counts[means] ?? 0) + 1;
  return { items, counts, worst: items[0]?.means ?? null };
}

/** The change notice of one bench copy: its entries against the revision it is on and a later one. */
export function noticeFor(
  before: PlanDocument,
  after: PlanDocument,
  entries: readonly OrderedEntry[],
): Notice {
  const state = foldEntries(entries);
  return noticeOf(compareRevisions(before, after, state), state);
}

import fc from 'fast-check';
import { actionSchema, planDocumentSchema, type PlanDocument } from '../../../shared/plan/document';
import { guardKey, walkGuards, type GuardStanding } from '../../../shared/plan/guards';
import { idOf } from '../model/plan';

/** What one step does: its guard changes and cuts in order. */
type Did = { item: 'blade-guard' | 'riving-knife'; to: 'off' | 'lowered' | 'back-on' } | 'cut';
type Block =
  | { kind: 'steps'; steps: Did[][] }
  | { kind: 'alternatives'; groups: Did[][][] }
  | { kind: 'repeat'; steps: Did[][] };

const did: fc.Arbitrary<Did> = fc.oneof(
  fc.constant('cut' as const),
  fc.record({
    item: fc.constantFrom('blade-guard' as const, 'riving-knife' as const),
    to: fc.constantFrom('off' as const, 'lowered' as const, 'back-on' as const),
  }),
);
const steps = (minLength: number) =>
  fc.array(fc.array(did, { maxLength: 4 }), { minLength, maxLength: 3 });
const block: fc.Arbitrary<Block> = fc.oneof(
  fc.record({ kind: fc.constant('steps' as const), steps: steps(1) }),
  fc.record({
    kind: fc.constant('alternatives' as const),
    groups: fc.array(steps(0), { minLength: 2, maxLength: 3 }),
  }),
  fc.record({ kind: fc.constant('repeat' as const), steps: steps(1) }),
);

/** The plan of some blocks; each step numbered through, each cut known by its id. */
function planOf(blocks: Block[]): PlanDocument {
  let n = 0;
  const all: Record<string, unknown>[] = [];
  const flow: Record<string, unknown>[] = [];
  const push = (list: Did[][]) =>
    list.map((actions) => {
      const id = idOf(4, all.length);
      const made = actions.map((a) =>
        actionSchema.parse(
          a === 'cut'
            ? { id: idOf(5, (n += 1)), do: 'cut', machine: 'table-saw', kind: 'through-rip' }
            : { id: idOf(5, (n += 1)), do: 'guard', machine: 'table-saw', ...a },
        ),
      );
      all.push({ id, title: `Step ${all.length + 1}`, actions: made });
      return id;
    });
  for (const [b, one] of blocks.entries()) {
    if (one.kind === 'alternatives') {
      const groups = one.groups.map((g, i) => ({
        id: idOf(6, b * 10 + i),
        name: `Way ${i}`,
        stepIds: push(g),
      }));
      flow.push({ id: idOf(7, b), kind: 'alternatives', name: 'Ways', groups });
      continue;
    }
    const ids = push(one.steps);
    if (one.kind === 'repeat')
      flow.push({
        id: idOf(7, b),
        kind: 'repeat',
        fromStepId: ids[0],
        toStepId: ids.at(-1),
        untilCheckId: idOf(2, 0),
        atMost: 3,
      });
  }
  return planDocumentSchema.parse({
    scantling: 1,
    id: idOf(0, 0),
    title: 'Guards',
    units: 'mm',
    steps: all,
    flow,
  });
}

/** Every way through the blocks as numbers of steps in order: each group once, each repeat once, twice and three times. */
function waysOf(blocks: Block[]): number[][] {
  let at = 0;
  let ways: number[][] = [[]];
  for (const one of blocks) {
    const take = (list: Did[][]) => list.map(() => at++);
    const next =
      one.kind === 'alternatives'
        ? one.groups.map(take)
        : ((run) =>
            one.kind === 'repeat' ? [run, [...run, ...run], [...run, ...run, ...run]] : [run])(
            take(one.steps),
          );
    ways = ways.flatMap((way) => next.map((more) => [...way, ...more]));
  }
  return ways;
}

const worse = { off: 0, lowered: 1, on: 2 };
const worst = (a: GuardStanding | undefined, b: GuardStanding): GuardStanding =>
  a !== undefined && worse[a] < worse[b] ? a : b;
const items = ['blade-guard', 'riving-knife'] as const;

/** The slow way: walk each way through by itself and keep the worst that is met. */
function slowly(document: PlanDocument, ways: number[][]) {
  const cuts = new Map<string, GuardStanding>();
  const left = new Map<string, GuardStanding>();
  for (const way of ways) {
    const now = new Map<string, GuardStanding>(items.map((item) => [item, 'on']));
    for (const n of way)
      for (const action of document.steps[n]!.actions) {
        if (action.do === 'guard') now.set(action.item, action.to === 'back-on' ? 'on' : action.to);
        if (action.do === 'cut')
          for (const item of items)
            cuts.set(
              `${action.id} ${item}`,
              worst(cuts.get(`${action.id} ${item}`), now.get(item)!),
            );
      }
    for (const item of items) left.set(item, worst(left.get(item), now.get(item)!));
  }
  return { cuts, left };
}

it('meets at every cut the worst of all ways through, and leaves what any of them leaves', () => {
  fc.assert(
    fc.property(fc.array(block, { minLength: 1, maxLength: 4 }), (blocks) => {
      const document = planOf(blocks);
      const expected = slowly(document, waysOf(blocks));
      const walk = walkGuards(document);
      const cuts = new Map<string, GuardStanding>();
      for (const { cut, guards } of walk.cuts)
        for (const item of items) {
          const key = `${cut.id} ${item}`;
          cuts.set(key, worst(cuts.get(key), guards.get(guardKey('table-saw', item)) ?? 'on'));
        }
      expect([...cuts].sort()).toEqual([...expected.cuts].sort());
      const left = Object.fromEntries(walk.left.map((l) => [l.item, l.standing]));
      for (const item of items) expect(left[item] ?? 'on').toBe(expected.left.get(item));
    }),
    { numRuns: 1000 },
  );
});

it('keeps machines apart', () => {
  const document = planOf([
    { kind: 'steps', steps: [[{ item: 'blade-guard', to: 'off' }, 'cut']] },
  ]);
  const [cut] = walkGuards(document).cuts;
  expect(cut?.guards.get(guardKey('table-saw', 'blade-guard'))).toBe('off');
  expect(cut?.guards.get(guardKey('bandsaw', 'blade-guard'))).toBeUndefined();
});

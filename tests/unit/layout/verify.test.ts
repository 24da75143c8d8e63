import {
  type Answer,
  type BrokenRule,
  type Job,
  solve,
  verifyLayout,
} from '../../../shared/layout';
import { item } from './jobs';

const job: Job = {
  kerf: 3,
  sheets: [
    {
      w: 300,
      h: 200,
      qty: 2,
      cost: 40,
      grain: 'along',
      trims: { left: 10, right: 6, bottom: 5, top: 2 },
    },
  ],
  items: [
    item(100, 60, 3, { grain: 'along' }),
    item(50, 120, 2, { grain: 'along' }),
    item(40, 30, 4, { rotatable: true }),
    item(400, 20, 1),
  ],
};
const right = solve(job, { iterations: 50 });

/** The rules a changed copy of the right answer breaks. */
function broken(change: (answer: Answer) => void, ofJob = job): BrokenRule[] {
  const copy = structuredClone(right);
  change(copy);
  return verifyLayout(ofJob, copy).map((fault) => fault.rule);
}
const sheet = (answer: Answer) => answer.sheets[0]!;
const machine = (limits: NonNullable<Job['options']>['machine']): Job => ({
  ...job,
  options: { machine: limits },
});

describe('a right answer', () => {
  it('breaks no rule', () => {
    expect(verifyLayout(job, right)).toEqual([]);
    expect(right.unplaced).toEqual([{ item: 3, qty: 1, why: 'too-big' }]);
    expect(sheet(right).cuts.length).toBeGreaterThan(8);
    expect(sheet(right).offcuts.length).toBeGreaterThan(0);
  });
});

describe('an answer that is wrong', () => {
  const wrong: [BrokenRule, string, (answer: Answer) => void, Job?][] = [
    ['stock', 'a stock that is not there', (a) => (sheet(a).bin = 4)],
    ['stock', 'more sheets than there are', (a) => a.sheets.push(sheet(a), sheet(a))],
    ['quantity', 'a part too few', (a) => sheet(a).placements.pop()],
    ['quantity', 'a part that does not exist', (a) => (sheet(a).placements[0]!.item = 9)],
    ['size', 'a part cut small', (a) => (sheet(a).placements[0]!.w -= 1)],
    [
      'turned',
      'a part against the grain',
      (a) => {
        const part = sheet(a).placements.find((p) => p.item === 0)!;
        [part.w, part.h, part.rotated] = [part.h, part.w, true];
      },
    ],
    ['inside', 'a part in the trimmed edge', (a) => (sheet(a).placements[0]!.x = 4)],
    [
      'apart',
      'two parts less than a kerf apart',
      (a) => {
        const [p, q] = sheet(a).placements;
        [q!.x, q!.y] = [p!.x + p!.w + 2, p!.y];
      },
    ],
    ['whole-numbers', 'a part between units', (a) => (sheet(a).placements[0]!.y += 0.5)],
    ['numbers', 'cuts out of order', (a) => (sheet(a).cuts[2]!.n = 8)],
    [
      'parent-first',
      'a piece cut twice',
      (a) => (sheet(a).cuts[5]!.piece = sheet(a).cuts[4]!.piece),
    ],
    ['parent-first', 'a piece cut before it is there', (a) => sheet(a).cuts.splice(4, 1)],
    ['edge-to-edge', 'a cut beside its piece', (a) => (sheet(a).cuts[4]!.setting = 5000)],
    ['edge-to-edge', 'a place that is not the setting', (a) => (sheet(a).cuts[4]!.at += 1)],
    ['kerf', 'a thinner blade', (a) => (sheet(a).cuts[4]!.kerf = 2)],
    [
      'fence',
      'a fence that is said to stay',
      (a) => (sheet(a).cuts[1]!.same = !sheet(a).cuts[1]!.same),
    ],
    ['pieces', 'a number used twice', (a) => (sheet(a).cuts[4]!.near = 0)],
    [
      'freed',
      'a cut that frees another part',
      (a) => {
        const cut = sheet(a).cuts.find((c) => c.frees.kind === 'part')!;
        cut.frees = { kind: 'part', item: 3 };
      },
    ],
    ['freed', 'a part that is never cut free', (a) => sheet(a).cuts.pop()],
    ['remainder', 'a piece nobody mentions', (a) => sheet(a).offcuts.pop()],
    [
      'offcuts',
      'an offcut that is none',
      (a) => sheet(a).offcuts.push({ x: 20, y: 20, w: 9, h: 9 }),
    ],
    ['cost', 'a wrong sum', (a) => (a.cost += 1)],
    ['bound', 'a bound above the cost', (a) => (a.lowerBound = 1000)],
    [
      'bound',
      'proven without a bound',
      (a) => {
        a.lowerBound = 0;
        a.proven = true;
      },
    ],
    [
      'unplaced',
      'a part called too big',
      (a) => {
        const gone = sheet(a).placements.pop()!;
        a.unplaced.push({ item: gone.item, qty: 1, why: 'too-big' });
      },
    ],
    ['stages', 'more stages than wished', () => undefined, { ...job, options: { stages: 2 } }],
    ['rip-capacity', 'a rip too wide', () => undefined, machine({ rip: 10 })],
    ['crosscut-capacity', 'a crosscut too long', () => undefined, machine({ crosscut: 20 })],
    ['hold', 'a piece too short', () => undefined, machine({ hold: 290 })],
  ];
  it.each(wrong.map(([rule, what, change, ofJob]) => ({ rule, what, change, ofJob })))(
    'breaks $rule: $what',
    ({ rule, change, ofJob }) => {
      expect(broken((a) => void change(a), ofJob)).toContain(rule);
    },
  );

  it('breaks first-cut: one of both first directions at least', () => {
    const rules = (['rip', 'crosscut'] as const).map((firstCut) =>
      broken(() => undefined, { ...job, options: { firstCut } }),
    );
    expect(rules.flat()).toContain('first-cut');
  });

  it('breaks sum: a sheet that is larger than what was cut of it', () => {
    const larger = { ...job, sheets: [{ ...job.sheets[0]!, w: 310 }] };
    expect(broken(() => undefined, larger).length).toBeGreaterThan(0);
  });
});

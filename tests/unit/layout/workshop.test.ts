import {
  partUnits,
  stockUnits,
  solve,
  verifyLayout,
  type Job,
  type Sheet,
} from '../../../shared/layout';
import { Rational } from '../../../shared/measure';
import { item, laid, workshop } from './jobs';

const inch = Rational.of(254, 10);
const inches = (n: number, d = 1) => inch.times(Rational.of(n, d));
const sheet = (w: number, h: number, rest: Partial<Sheet> = {}): Sheet => ({
  w,
  h,
  qty: null,
  ...rest,
});

describe('the workshop set (own work, optimum by construction)', () => {
  it.each(workshop)(
    '$name: no fault, never below the optimum, at most one over',
    ({ job, best }) => {
      const answer = laid(job, 1500);
      expect(answer.cost).toBeGreaterThanOrEqual(best);
      expect(answer.cost).toBeLessThanOrEqual(best + 1);
      expect(answer.lowerBound).toBeLessThanOrEqual(best);
      expect(answer.unplaced).toEqual([]);
    },
  );
});

describe('whole units at the edge', () => {
  const kerf = partUnits(inches(1, 8));
  const W = stockUnits(inches(96));
  const H = stockUnits(inches(48));

  it('1/64 in is 635 units and survives', () => {
    const w = partUnits(inches(1, 64));
    const [part] = laid({ kerf, sheets: [sheet(W, H)], items: [item(w, H)] }).sheets[0]!.placements;
    expect(part?.w).toBe(635);
  });
  it('a part as large as the usable sheet fits; a unit more does not and is named', () => {
    const trims = { left: 16000, right: 8000, bottom: 0, top: 3200 };
    const sheets = [sheet(W, H, { trims })];
    const [w, h] = [W - 24000, H - 3200];
    expect(laid({ kerf, sheets, items: [item(w, h)] }).unplaced).toEqual([]);
    const over = laid({ kerf, sheets, items: [item(w + 1, h), item(100, 100)] });
    expect(over.unplaced).toEqual([{ item: 0, qty: 1, why: 'too-big' }]);
    expect(over.sheets[0]?.placements.map((p) => p.item)).toEqual([1]);
  });
  it('two parts that make W − kerf share a sheet; a unit more and they do not', () => {
    const a = 777_777;
    const fits = laid({ kerf, sheets: [sheet(W, H)], items: [item(a, H), item(W - kerf - a, H)] });
    expect(fits.cost).toBe(1);
    const over = laid({
      kerf,
      sheets: [sheet(W, H)],
      items: [item(a, H), item(W - kerf - a + 1, H)],
    });
    expect(over.cost).toBe(2);
    expect(over.proven).toBe(true);
  });
  it('a remainder as wide as the kerf is an offcut, a narrower one is dust', () => {
    const offcuts = (spare: number) =>
      laid({ kerf: 30, sheets: [sheet(1000, 500)], items: [item(1000 - spare, 500)] }).sheets[0]!
        .offcuts;
    expect(offcuts(60)).toEqual([{ x: 970, y: 0, w: 30, h: 500 }]);
    expect(offcuts(59)).toEqual([]);
    expect(offcuts(12)).toEqual([]);
  });
});

describe('what the shop has', () => {
  it('uses offcuts that are there before it buys', () => {
    const job: Job = {
      kerf: 3,
      sheets: [
        sheet(2440, 1220, { cost: 6000 }),
        sheet(800, 400, { qty: 1, cost: 900, owned: true }),
      ],
      items: [item(790, 390)],
    };
    const answer = laid(job);
    expect(answer.sheets.map((s) => s.bin)).toEqual([1]);
    expect([answer.cost, answer.proven]).toEqual([0, true]);
  });
  it('takes the cheaper of two sizes', () => {
    const sheets = [sheet(1000, 1000, { cost: 100 }), sheet(1000, 500, { cost: 40 })];
    expect(laid({ kerf: 0, sheets, items: [item(1000, 500, 2)] }).cost).toBe(80);
    expect(laid({ kerf: 0, sheets, items: [item(1000, 501, 2)] }).cost).toBe(200);
  });
  it('lays out what the stock allows and names the rest', () => {
    const answer = laid({
      kerf: 0,
      sheets: [sheet(100, 100, { qty: 1 })],
      items: [item(60, 60, 2)],
    });
    expect(answer.unplaced).toEqual([{ item: 0, qty: 1, why: 'stock-used-up' }]);
    expect(answer.proven).toBe(false);
  });
  it('copes with nothing to do and nothing to do it on', () => {
    expect(laid({ kerf: 3, sheets: [sheet(10, 10)], items: [] }).sheets).toEqual([]);
    expect(laid({ kerf: 3, sheets: [], items: [item(1, 1)] }).unplaced).toHaveLength(1);
  });
});

describe('grain and machine', () => {
  it('turns a part only where grain and part allow it', () => {
    const lie = (grain: Sheet['grain'], part: Parameters<typeof item>[3]) =>
      laid({
        kerf: 0,
        sheets: [sheet(100, 50, { grain: grain ?? 'free' })],
        items: [item(40, 80, 1, part)],
      });
    expect(lie('free', { rotatable: true }).unplaced).toEqual([]);
    expect(lie('free', {}).unplaced).toHaveLength(1);
    expect(lie('along', { grain: 'across' }).sheets[0]?.placements[0]?.rotated).toBe(true);
    expect(lie('along', { grain: 'along', rotatable: true }).unplaced).toHaveLength(1);
  });
  it('names the part the machine cannot cut', () => {
    const answer = laid({
      kerf: 3,
      sheets: [sheet(2440, 1220)],
      items: [item(2440, 900), item(500, 200)],
      options: { machine: { rip: 250 } },
    });
    expect(answer.unplaced).toEqual([{ item: 0, qty: 1, why: 'machine' }]);
  });
});

it('tells of better answers as they come and stops when asked', () => {
  const { job } = workshop.find((each) => each.name === 'WS2_09')!;
  const costs: number[] = [];
  let asked = 0;
  const answer = solve(job, {
    iterations: 100_000,
    onProgress: (better) => {
      expect(verifyLayout(job, better)).toEqual([]);
      costs.push(better.cost);
    },
    shouldStop: () => ++asked > 40,
  });
  expect(asked).toBeLessThan(50);
  expect(costs).toEqual([...costs].sort((a, b) => b - a));
  expect(answer.cost).toBe(costs.at(-1));
});

import fc from 'fast-check';
import {
  boardFeet,
  boardFeetOf,
  cheapestPacks,
  csv,
  nominalOf,
  tallyBoardFeet,
  tinsFor,
} from '../../../shared/layout/buying';
import { plywoodCategories } from '../../../shared/trade/lumber.data';

describe('board feet', () => {
  // 1 bf = 144 cubic inches of nominal size. Rows 1 and 2: a published woodworking text; the rest computed from the definition.
  it.each([
    [1, 3, 8, 2],
    [1, 4, 6, 2],
    [1, 6, 8, 4],
    [1, 12, 10, 10],
    [1.25, 7, 10, 7.2917],
    [2, 7, 10, 11.6667],
    [2, 4, 8, 5.3333],
    [0.75, 6, 8, 4],
  ])('%d × %d in × %d ft is %d', (t, w, l, feet) => {
    expect(boardFeet(t, w, l)).toBeCloseTo(feet, 4);
  });
  it('is tallied by the whole foot of surface where hardwood is', () => {
    // NHLA rules, from memory: SM 6 → 7.5, and SM 6 → 12.
    expect(tallyBoardFeet(1.25, 7, 10)).toBe(7.5);
    expect(tallyBoardFeet(2, 7, 10)).toBe(12);
  });
  it('counts a dressed board as its nominal size', () => {
    // PS 20, dry: 1 1/2 × 3 1/2 in is a 2 × 4; 8 ft of it are 5.3333, not 3.5.
    expect(nominalOf(38.1, 88.9)).toEqual({ thickness: 2, width: 4 });
    expect(boardFeetOf(38.1, 88.9, 2438.4)).toBeCloseTo(5.3333, 4);
    expect(nominalOf(38.1, 100)).toBeNull();
  });
});

describe('sizes as sold', () => {
  it('keeps the label of structural plywood within its band (PS 1)', () => {
    for (const { least, greatest, label } of plywoodCategories) {
      expect(label).toBeGreaterThanOrEqual(least);
      expect(label).toBeLessThanOrEqual(greatest);
    }
  });
});

describe('packs', () => {
  it('takes a large and a small pack where that is cheaper than two large', () => {
    const packs = [
      { of: 100, price: 6 },
      { of: 25, price: 2.2 },
    ];
    expect(cheapestPacks(packs, 110)).toEqual({ counts: [1, 1], pieces: 125, price: 8.2 });
    expect(cheapestPacks(packs, 60)).toEqual({ counts: [1, 0], pieces: 100, price: 6 });
    expect(cheapestPacks(packs, 0)).toEqual({ counts: [0, 0], pieces: 0, price: 0 });
  });
  it('without prices takes the fewest pieces too many', () => {
    const packs = [
      { of: 50, price: null },
      { of: 20, price: 3 },
    ];
    expect(cheapestPacks(packs, 55)).toEqual({ counts: [0, 3], pieces: 60, price: null });
    expect(cheapestPacks([], 5)).toBeNull();
    expect(cheapestPacks([{ of: 0, price: 1 }], 5)).toBeNull();
  });
  it('is as cheap as every combination there is', () => {
    const pack = fc.record({
      of: fc.integer({ min: 1, max: 9 }),
      price: fc.integer({ min: 1, max: 9 }),
    });
    fc.assert(
      fc.property(fc.array(pack, { minLength: 1, maxLength: 3 }), fc.nat(20), (packs, need) => {
        let least = Infinity;
        const walk = (i: number, pieces: number, cost: number): void => {
          if (pieces >= need) least = Math.min(least, cost);
          const next = packs[i];
          if (!next || pieces >= need) return;
          walk(i + 1, pieces, cost);
          walk(i, pieces + next.of, cost + next.price);
        };
        walk(0, 0, 0);
        expect(cheapestPacks(packs, need)?.price).toBe(least);
      }),
    );
  });
});

describe('coverage and CSV', () => {
  it('buys whole tins', () => {
    expect(tinsFor(3.2, { coats: 3, covers: 10 })).toBe(1);
    expect(tinsFor(3.4, { coats: 3, covers: 10 })).toBe(2);
    expect(tinsFor(3.4, { coats: 3, covers: 0 })).toBeNull();
  });
  it('lets no spreadsheet take a text for a formula', () => {
    expect(csv([['=1+1', '@a', '-x', 'a,"b"', -3, '-3.5', null]])).toBe(
      `'=1+1,'@a,'-x,"a,""b""",-3,-3.5,\r\n`,
    );
  });
});

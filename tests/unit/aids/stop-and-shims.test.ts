import fc from 'fast-check';
import { aidOf } from '../../../shared/aids';
import {
  repeatedCutsInput,
  workRepeatedCuts,
  type RepeatedCutsResult,
} from '../../../shared/aids/repeated-cuts/repeated-cuts';
import {
  shimStackInput,
  workShimStack,
  type ShimPiece,
} from '../../../shared/aids/shim-stack/shim-stack';

const seed = Number(process.env.SEED ?? Date.now() % 1_000_000);
const runs = { seed, numRuns: process.env.SCANTLING_LONG ? 2000 : 150 };

function cuts(input: object): RepeatedCutsResult {
  const outcome = workRepeatedCuts(repeatedCutsInput.parse(input));
  if (!outcome.ok) throw new Error(outcome.reason);
  return outcome.result;
}

describe('repeated cuts at a stop', () => {
  // n = ⌊(L + k)/(p + k)⌋, worked by hand (computed): stock, piece, kerf, pieces, left, offcut after the last kerf.
  test.each([
    [2440, 400, 3.2, 6, 24, 20.8],
    [96 * 25.4, 12 * 25.4, 25.4 / 8, 7, 11.25 * 25.4, 11.125 * 25.4],
    [2440, 600, 3, 4, 31, 28],
    [1000, 100, 0, 10, 0, 0],
  ])('%p mm of stock, pieces of %p, kerf %p', (stock, piece, kerf, pieces, left, offcut) => {
    const r = cuts({ stock, piece, kerf });
    expect(r.pieces).toBe(pieces);
    expect(r.left).toBeCloseTo(left, 6);
    expect(r.offcut).toBeCloseTo(offcut, 6);
  });

  test('pieces, kerfs and what is left are the stock, and one piece more does not fit', () => {
    const length = (least: number, most: number) =>
      fc.integer({ min: least, max: most }).map((n) => n / 1000);
    fc.assert(
      fc.property(
        length(1000, 900_000),
        length(0, 8000),
        length(0, 6_000_000),
        (piece, kerf, more) => {
          const stock = piece + more;
          const r = cuts({ stock, piece, kerf });
          expect(r.pieces * piece + (r.pieces - 1) * kerf + r.left).toBeCloseTo(stock, 5);
          expect(r.left).toBeGreaterThanOrEqual(0);
          expect(r.left).toBeLessThan(piece + kerf);
        },
      ),
      runs,
    );
  });

  test('the piece from which the stock is too short to hold is the first that is', () => {
    const r = cuts({ stock: 1000, piece: 100, kerf: 3, hold: 300 });
    // In the hands at the cut of piece 7: 1000 − 6 · 103 = 382; of piece 8: 279.
    expect(r.tooShortAt).toBe(8);
    expect(cuts({ stock: 1000, piece: 100, kerf: 3, hold: 0 }).tooShortAt).toBeNull();
    expect(cuts({ stock: 250, piece: 100, kerf: 3, hold: 300 }).tooShortAt).toBe(1);
  });

  test('a stop off by one reading adds up over all pieces', () => {
    const r = cuts({ stock: 2440, piece: 400, kerf: 3.2, stopOff: 0.2 });
    expect(r.runningError).toBeCloseTo(1.2, 9);
  });

  test.each([
    [{ stock: 300, piece: 400 }, 'stock'],
    [{ stock: 300, piece: 5, stopOff: -6 }, 'stopOff'],
    [{ stock: 300, piece: -1 }, 'piece'],
  ])('refuses %p', (input, field) => {
    expect(aidOf('repeated-cuts')?.run(input)).toMatchObject({ ok: false, field });
  });
});

/** Every stack there is, tried one by one: the fewest pieces within the band, then the nearest. */
function byTrying(pieces: readonly ShimPiece[], wanted: number, tolerance: number, most: number) {
  let best: { pieces: number; off: number } | null = null;
  const walk = (i: number, count: number, total: number) => {
    const off = Math.abs(total - wanted);
    if (count > 0 && off <= tolerance)
      if (!best || count < best.pieces || (count === best.pieces && off < best.off))
        best = { pieces: count, off };
    const piece = pieces[i];
    if (!piece || count >= most) return;
    for (let n = 0; n <= Math.min(piece.count, most - count); n += 1)
      walk(i + 1, count + n, total + n * Math.round(piece.thickness * 1000));
  };
  walk(0, 0, 0);
  return best as { pieces: number; off: number } | null;
}

describe('shim stacks', () => {
  test('are as few and as near as trying every stack finds', () => {
    const piece = fc.record({
      name: fc.constant(''),
      thickness: fc.integer({ min: 20, max: 900 }).map((n) => n / 1000),
      count: fc.integer({ min: 1, max: 3 }),
    });
    fc.assert(
      fc.property(
        fc.array(piece, { minLength: 1, maxLength: 7 }),
        fc.integer({ min: 30, max: 2500 }),
        fc.integer({ min: 0, max: 60 }),
        (pieces, wanted, band) => {
          const outcome = workShimStack(
            shimStackInput.parse({
              wanted: wanted / 1000,
              tolerance: band / 1000,
              pieces,
              most: 5,
            }),
          );
          const tried = byTrying(pieces, wanted, band, 5);
          if (!outcome.ok || !outcome.result.within) return expect(tried).toBeNull();
          const { result } = outcome;
          expect(result.pieces).toBe(tried?.pieces);
          expect(Math.round(Math.abs(result.off) * 1000)).toBe(tried?.off);
          const total = result.stack.reduce(
            (sum, s) => sum + s.count * Math.round(s.thickness * 1000),
            0,
          );
          expect(total).toBe(Math.round(result.total * 1000));
        },
      ),
      runs,
    );
  });

  test('of feeler leaves by 0.05 mm (a usual set of 20, from memory) come within half a step', () => {
    const pieces = Array.from({ length: 20 }, (_, i) => ({ thickness: (i + 1) * 0.05 }));
    const answer = aidOf('shim-stack')?.run({ wanted: 1.68, tolerance: 0.025, pieces });
    expect(answer).toMatchObject({ ok: true, result: { pieces: 2, within: true } });
  });

  test('read thicknesses as a maker writes them, and name what is out of range', () => {
    const run = (pieces: object[]) => aidOf('shim-stack')?.run({ wanted: '1/16 in', pieces });
    expect(run([{ name: '1/32 brass', thickness: '1/32 in', count: 2 }])).toMatchObject({
      ok: true,
      result: { pieces: 2, stack: [{ name: '1/32 brass' }] },
    });
    expect(run([{ thickness: 0.0001 }])).toMatchObject({
      ok: false,
      field: 'pieces.0',
    });
    expect(run([])).toMatchObject({ ok: false, field: 'pieces' });
  });
});

import fc from 'fast-check';
import { create, all } from 'mathjs';
import { boardFeetInput, workBoardFeet } from '../../../shared/aids/board-feet/board-feet';
import { dressedSizeInput, workDressedSize } from '../../../shared/aids/dressed-size/dressed-size';
import {
  categoryInches,
  sheetThicknessInput,
  workSheetThickness,
} from '../../../shared/aids/sheet-thickness/sheet-thickness';
import { woodWeightInput, workWoodWeight } from '../../../shared/aids/wood-weight/wood-weight';
import { metricPlywoodLimits, plywoodTolerance } from '../../../shared/trade/lumber';
import {
  hardwoodQuarters,
  metricPlywood,
  plywoodCategories,
  softwoodWidth,
} from '../../../shared/trade/lumber.data';
import { finite, worked } from './worked';

if (!all) throw new Error('mathjs has no functions.');
const math = create(all);
const inch = 25.4;
const foot = 12 * inch;
const feet = (boards: object[]) => worked(workBoardFeet(boardFeetInput.parse({ boards })));
const board = (t: number, w: number, l: number) => ({
  thickness: t * inch,
  width: w * inch,
  length: l * foot,
});

describe('board feet', () => {
  it.each([
    ['1 × 3 in × 8 ft (published woodworking text, read)', 1, 3, 8, 2, null],
    ['1 × 4 in × 6 ft (the same, read)', 1, 4, 6, 2, null],
    ['1 × 6 × 96 in (read twice removed)', 1, 6, 8, 4, null],
    ['1 × 12 in × 10 ft (read twice removed)', 1, 12, 10, 10, null],
    ['1 1/4 × 7 in × 10 ft; NHLA tally SM 6 (computed)', 1.25, 7, 10, 7.2917, 7.5],
    ['2 × 7 in × 10 ft; tally SM 6 (computed)', 2, 7, 10, 11.6667, 12],
    ['2×4 by its nominal size, 8 ft, not 3.5 (computed)', 2, 4, 8, 5.3333, null],
    ['3/4 × 6 in × 8 ft counts as 1 in (rule from memory, computed)', 0.75, 6, 8, 4, null],
  ])('%s', (_, t, w, l, exact, tally) => {
    const r = feet([board(t, w, l)]);
    expect(r.exact).toBeCloseTo(exact, 4);
    if (tally !== null) expect(r.tally).toBeCloseTo(tally, 9);
  });

  it('agrees with mathjs’s units by volume, and adds up', () => {
    const size = fc.double({ min: 1, max: 15, noNaN: true });
    fc.assert(
      fc.property(size, size, size, fc.integer({ min: 1, max: 50 }), (t, w, l, count) => {
        const one = feet([board(t, w, l)]).exact;
        const volume = math.multiply(
          math.multiply(math.unit(t, 'in'), math.unit(w, 'in')) as unknown as number,
          math.unit(l, 'ft') as unknown as number,
        ) as unknown as { toNumber: (unit: string) => number };
        expect(one / (volume.toNumber('in^3') / 144)).toBeCloseTo(1, 9);
        const many = feet([{ ...board(t, w, l), count }]);
        expect(many.exact).toBeCloseTo(one * count, 6);
        expect(many.cubicMetres).toBeCloseTo(volume.toNumber('m^3') * count, 9);
        // The tally rounds half a foot at most, times the thickness.
        const tallied = feet([board(t, w, l)]);
        expect(Math.abs(tallied.tally - tallied.exact)).toBeLessThanOrEqual(t / 2 + 1e-6);
        expect(finite(many)).toBe(true);
      }),
    );
  });

  it('says when a tally falls on the half', () => {
    expect(feet([board(1, 6, 9)]).rows[0]).toMatchObject({ onTheHalf: true, surface: 5 });
    expect(feet([board(1, 6, 8)]).rows[0]).toMatchObject({ onTheHalf: false, surface: 4 });
  });

  it('refuses width and length the wrong way about', () => {
    const boards = [{ thickness: 25, width: 2000, length: 15 }];
    expect(workBoardFeet(boardFeetInput.parse({ boards }))).toMatchObject({ ok: false });
  });
});

const dressed = (input: object) => worked(workDressedSize(dressedSizeInput.parse(input)));

describe('nominal to dressed', () => {
  // PS 20, a transcription (read twice removed).
  it.each([
    [2, 4, 'dry', 1.5, 3.5],
    [2, 4, 'green', 1.5625, 3.5625],
    [1, 8, 'dry', 0.75, 7.25],
    [1, 8, 'green', 0.78125, 7.5],
    [2, 12, 'dry', 1.5, 11.25],
    [4, 4, 'dry', 3.5, 3.5],
    [1.25, 6, 'dry', 1, 5.5],
    [0.75, 6, 'green', 0.6875, 5.625],
  ])('%f × %f %s', (thickness, width, state, t, w) => {
    const r = dressed({ kind: 'softwood', thickness, width, state });
    expect([r.thickness / inch, (r.width ?? 0) / inch]).toEqual([
      expect.closeTo(t, 9),
      expect.closeTo(w, 9),
    ]);
  });

  it('takes 1/2 in off widths to 7 and 3/4 from 8 (PS 20’s rule)', () => {
    for (const { nominal, dry } of softwoodWidth)
      expect(nominal - dry).toBeCloseTo(nominal < 8 ? 0.5 : 0.75, 9);
  });

  // NHLA, three transcriptions agree (read twice removed): S2S is 3/16 off to 6/4, 1/4 from 7/4.
  it.each(hardwoodQuarters)('$quarter surfaced two sides', ({ quarter, rough, s2s }) => {
    expect(rough - s2s).toBeCloseTo(rough <= 1.5 ? 3 / 16 : 1 / 4, 9);
    expect(dressed({ kind: 'hardwood', quarter, surfaced: 's2s' }).thickness).toBeCloseTo(
      s2s * inch,
      9,
    );
  });

  it('4/4 one side 7/8, two sides 13/16', () => {
    expect(
      dressed({ kind: 'hardwood', quarter: '4/4', surfaced: 's1s' }).thickness / inch,
    ).toBeCloseTo(7 / 8, 9);
    expect(
      dressed({ kind: 'hardwood', quarter: '4/4', surfaced: 's2s' }).thickness / inch,
    ).toBeCloseTo(13 / 16, 9);
  });

  it.each([
    [
      'a softwood thickness that is not made',
      { kind: 'softwood', thickness: 5, width: 4, state: 'dry' },
    ],
    ['a dressed figure as nominal', { kind: 'softwood', thickness: 1.5, width: 3.5, state: 'dry' }],
    ['an odd quarter', { kind: 'hardwood', quarter: '9/4', surfaced: 's2s' }],
    ['a figure whose sources differ', { kind: 'hardwood', quarter: '3/8', surfaced: 's1s' }],
  ])('refuses %s', (_, input) => {
    expect(workDressedSize(dressedSizeInput.parse(input))).toMatchObject({ ok: false });
  });
});

const sheet = (input: object) => worked(workSheetThickness(sheetThicknessInput.parse(input)));

describe('sheet thickness', () => {
  // PS 1 (read): limits in mm as printed beside the inches.
  it.each([
    ['1/4', 5.56, 7.14],
    ['11/32', 7.94, 9.53],
    ['3/8', 8.73, 10.32],
    ['15/32', 11.11, 12.7],
    ['1/2', 11.91, 13.49],
    ['19/32', 14.29, 15.88],
    ['5/8', 15.08, 16.67],
    ['23/32', 17.46, 19.05],
    ['3/4', 18.26, 19.84],
    ['7/8', 21.11, 23.34],
    ['1', 24.13, 26.67],
    ['1 1/8', 27.15, 30.0],
  ])('PS 1 category %s: %f to %f mm', (category, least, greatest) => {
    const r = sheet({ standard: 'ps1', category, sanded: false });
    // Inches are printed to a thousandth: half of it is 0.013 mm, and the mm come from the unrounded inches.
    expect(Math.abs(r.least - least)).toBeLessThan(0.02);
    expect(Math.abs(r.greatest - greatest)).toBeLessThan(0.02);
  });

  it.each(plywoodCategories)(
    'table and rule agree for $category',
    ({ category, least, greatest }) => {
      const size = categoryInches(category);
      const off = plywoodTolerance(size, false);
      expect(Math.abs(size - off - least)).toBeLessThan(0.0011);
      expect(Math.abs(size + off - greatest)).toBeLessThan(0.0011);
    },
  );

  it('sanded 3/4 is ±1/64 in (PS 1, read)', () => {
    const r = sheet({ standard: 'ps1', category: '3/4', sanded: true });
    expect([r.least / inch, r.greatest / inch]).toEqual([
      expect.closeTo(0.734375, 9),
      expect.closeTo(0.765625, 9),
    ]);
  });

  // EN 315 sanded, computed from the formula (read in GB/T 9846.3).
  it.each([
    [4, 0.32, 0.52],
    [6.5, 0.395, 0.595],
    [9, 0.47, 0.67],
    [12, 0.56, 0.76],
    [15, 0.65, 0.85],
    [18, 0.74, 0.94],
    [21, 0.83, 1.03],
    [24, 0.92, 1.12],
  ])('EN 315, %f mm sanded: +%f −%f', (mm, over, under) => {
    const limits = metricPlywoodLimits(mm, true);
    expect(limits.over).toBeCloseTo(over, 9);
    expect(limits.under).toBeCloseTo(under, 9);
    expect(metricPlywood.map((p) => p.mm)).toContain(mm);
  });

  it('judges the sheet in hand with its instrument', () => {
    const of = (measured: number) =>
      sheet({ standard: 'en315', category: 18, sanded: true, measured, uncertainty: 0.05 }).verdict;
    expect([of(17.6), of(17.08), of(16.9), of(18.74), of(19)]).toEqual([
      'inside',
      'near',
      'outside',
      'near',
      'outside',
    ]);
  });

  it.each([
    ['a category that is not stamped', { standard: 'ps1', category: '18 mm' }],
    ['a metric sheet of 200 mm', { standard: 'en315', category: 200 }],
    ['words as millimetres', { standard: 'en315', category: 'thick' }],
  ])('refuses %s', (_, input) => {
    const parsed = sheetThicknessInput.parse({ sanded: true, ...input });
    expect(workSheetThickness(parsed)).toMatchObject({ ok: false });
  });
});

describe('weight of wood', () => {
  const weigh = (input: object) => worked(workWoodWeight(woodWeightInput.parse(input)));
  const plank = { wood: 'white oak', thickness: 50, width: 200, length: 2000 };

  it('1000 G (1 + M/100): white oak 0.68 at 12 % is 761.6 kg/m³ (gravity from memory, computed)', () => {
    expect(weigh(plank).density).toBeCloseTo(761.6, 6);
    expect(weigh(plank).each).toBeCloseTo(15.232, 6);
  });

  it('agrees with mathjs’s mass and volume and grows with moisture', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.1, max: 1.3, noNaN: true }),
        fc.double({ min: 0, max: 29, noNaN: true }),
        (gravity, moisture) => {
          const input = { ...plank, wood: 'other', gravity, moisture };
          const water = math.unit(1, 'g/cm^3').toNumber('kg/m^3');
          expect(weigh(input).density).toBeCloseTo(water * gravity * (1 + moisture / 100), 6);
          expect(weigh({ ...input, moisture: moisture + 1 }).each).toBeGreaterThan(
            weigh(input).each,
          );
        },
      ),
    );
  });

  it('calls a second person over 25 kg (common practice, no source)', () => {
    expect(weigh({ ...plank, length: 4000 }).twoPeople).toBe(true);
    expect(weigh(plank).twoPeople).toBe(false);
  });

  it.each([
    ['a wood it does not know', { wood: 'ebony' }],
    ['another wood without its gravity', { wood: 'other' }],
    ['a density for a gravity', { wood: 'other', gravity: 680 }],
    ['green wood', { wood: 'cherry', moisture: 60 }],
  ])('refuses %s', (_, change) => {
    expect(workWoodWeight(woodWeightInput.parse({ ...plank, ...change }))).toMatchObject({
      ok: false,
    });
  });
});

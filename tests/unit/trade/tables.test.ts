import { coefficientsOf, movement } from '../../../shared/trade/movement';
import { movementCoefficients } from '../../../shared/trade/movement.data';
import { woodScrews } from '../../../shared/trade/screws.data';
import { countersinkDepth, flatHead, leadHoles, shankDiameter } from '../../../shared/trade/screws';

const inch = 25.4;
const value = (fraction: string) => {
  const [top, bottom] = fraction.split('/').map(Number);
  return top! / bottom!;
};
const sixtyFourth = (x: number) => Math.round(x * 64) / 64;

describe('the table of wood screws against its formulas', () => {
  it.each(woodScrews)('No. $number', ({ number, shank, head, pilotSoft, pilotHard, clearance }) => {
    const d = shankDiameter(String(number), 'us')!;
    // ASME B18.6.1, D = 0.060 + 0.013 N in.
    expect(d / inch).toBeCloseTo(shank, 6);
    // A = 2.04 D − 0.003 in; the fit gives each head that was read to 0.002 in.
    expect(Math.abs(flatHead(d) / inch - head)).toBeLessThan(0.002);
    if (!pilotSoft || !pilotHard || !clearance) return;
    // Wood Handbook ch. 8: 70 and 90 % of the root, from memory; to the nearest 1/64.
    const { soft, hard } = leadHoles(d);
    expect(sixtyFourth(soft / inch)).toBe(value(pilotSoft));
    expect(sixtyFourth(hard / inch)).toBe(value(pilotHard));
    expect(Math.ceil((d / inch) * 64 - 1e-9) / 64).toBe(value(clearance));
  });

  // British rule of thumb, read in a furniture-making text: 64ths = N + 3 for No. 8 and No. 10.
  it.each([8, 10])('agrees with the old rule of thumb for No. %i', (n) => {
    expect(value(woodScrews.find((s) => s.number === n)!.clearance!) * 64).toBe(n + 3);
  });
});

it.each([
  // Computed from the geometry of a cone.
  [0.332 * inch, 0.177 * inch, 82 as const, 0.0892 * inch],
  [0.332 * inch, 0.177 * inch, 90 as const, 0.0775 * inch],
  [8, 4, 82 as const, 2.301],
  [8, 4, 90 as const, 2],
])('sinks a head of %f in a hole of %f at %i°', (head, hole, degrees, depth) => {
  expect(countersinkDepth(head, hole, degrees)).toBeCloseTo(depth, 2);
});

describe('movement across the grain', () => {
  it.each([
    ['white fir 232 mm, 8 to 11 % (Handbook example, from memory)', 232, 0.00245, 8, 11, 1.7052],
    ['mesquite 5 in, 6 to 9 % (NWFA A200)', 5, 0.00129, 6, 9, 0.01935],
    ['red oak 12 in, 6 to 12 % (computed)', 12, 0.00369, 6, 12, 0.26568],
    ['black cherry 300 mm, 8 to 12 % (computed)', 300, 0.00248, 8, 12, 2.976],
    ['black walnut 450 mm, 10 to 7 % (computed)', 450, 0.00274, 10, 7, -3.699],
    ['white oak quarter-sawn 20 in, 6 to 10 % (computed)', 20, 0.0018, 6, 10, 0.144],
  ])('%s', (_, width, c, from, to, expected) => {
    expect(movement(width, c, from, to)).toBeCloseTo(expected, 6);
  });

  it('gives every wood more movement along the rings than across them', () => {
    for (const { radial, tangential } of movementCoefficients)
      expect(tangential).toBeGreaterThan(radial);
  });

  it('knows a wood by its name, by its last word at its worst, and says something of any other', () => {
    expect(coefficientsOf('American red oak').tangential).toBe(0.00369);
    expect(coefficientsOf('oak boards').tangential).toBe(0.00369);
    expect(coefficientsOf('maple').tangential).toBe(0.00353);
    expect(coefficientsOf('softwood').tangential).toBe(0.003);
  });
});

import { machineClasses } from '../../../shared/plan/document';
import { machineName } from '../../../shared/trade/machines';
import { shankDiameter } from '../../../shared/trade/screws';

describe('machine names', () => {
  it('switches jointer and planer, planer and thicknesser', () => {
    expect([machineName('jointer', 'us'), machineName('jointer', 'uk')]).toEqual([
      'jointer',
      'planer',
    ]);
    expect([machineName('planer', 'us'), machineName('planer', 'uk')]).toEqual([
      'planer',
      'thicknesser',
    ]);
  });
  it('names no two machines alike on one side', () => {
    for (const side of ['us', 'uk'] as const) {
      const all = machineClasses.map((m) => machineName(m, side));
      expect(new Set(all).size).toBe(all.length);
    }
  });
});

describe('wood screws', () => {
  // ASME B18.6.1, D = 0.060 + 0.013 N in; the table's millimetres to two places (formula read in several references).
  it.each([
    ['0', 1.52],
    ['4', 2.84],
    ['6', 3.51],
    ['8', 4.17],
    ['10', 4.83],
    ['12', 5.49],
    ['14', 6.15],
    ['24', 9.45],
  ])('No. %s is %f mm in the US series', (gauge, mm) => {
    expect(Math.abs(shankDiameter(gauge, 'us')! - mm)).toBeLessThanOrEqual(0.0051);
  });
  // A furniture-making text: British No. 8 equals the American, No. 4 is 0.108 in, No. 12 is 0.220 in.
  it.each([
    ['8', 0.164],
    ['4', 0.108],
    ['12', 0.22],
  ])('No. %s is %f in in the British series', (gauge, inch) => {
    expect(shankDiameter(gauge, 'british')! / 25.4).toBeCloseTo(inch, 6);
  });
  it('takes a metric screw by its diameter, and no word for a number', () => {
    expect(shankDiameter('4.5 mm', 'metric')).toBe(4.5);
    expect(shankDiameter('No. 8', 'us')).toBeCloseTo(4.1656, 4);
    expect(shankDiameter('thick', 'us')).toBeNull();
  });
});

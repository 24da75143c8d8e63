import fc from 'fast-check';
import { aidOf } from '../../../shared/aids';
import { fits, runnerInput, workRunner } from '../../../shared/aids/runner/runner';
import { worked } from './worked';

const seed = Number(process.env.SEED ?? Date.now() % 1_000_000);
const slot = { slotWidths: [19.05, 19.1, 19.02], slotDepths: [9.6, 9.5] };
const run = (input: object = {}) => worked(workRunner(runnerInput.parse({ ...slot, ...input })));

test('white oak quarter-sawn, 20 in, 6 to 10 %: 0.144 in (computed from the Wood Handbook’s table, read)', () => {
  const r = run({
    slotWidths: [10 * 25.4],
    wood: 'white oak',
    cut: 'quarter',
    now: 6,
    driest: 6,
    wettest: 10,
  });
  const grows = r.playNow - r.playLeast;
  expect((grows / r.width) * 20).toBeCloseTo(0.144, 3);
});

test('1 m of aluminium grows 0.46 mm in 20 K (computed, 23e-6/K)', () => {
  const r = run({ material: 'aluminium', celsius: 15, coldest: 15, warmest: 35 });
  expect(((r.playNow - r.playLeast) / r.width) * 1000).toBeCloseTo(0.46, 6);
});

test('fits the narrowest place and the shallowest, and packs it level', () => {
  const r = run({ thickness: 8.5 });
  expect(r.width).toBeLessThan(19.02);
  expect(r.thickest).toBeCloseTo(9.5 - 0.8, 9);
  expect(r.packing).toBeCloseTo(1, 9);
  expect([8.5, 9.2, 3].map((thickness) => run({ thickness }).thicknessVerdict)).toEqual([
    'fits',
    'bottoms',
    'thin',
  ]);
});

test('says when the slot varies more than the fit plays', () => {
  expect(run({ slotWidths: [19, 19.3] }).slotTooUneven).toBe(true);
  expect(run({ slotWidths: [19, 19.05] }).slotTooUneven).toBe(false);
});

test('a runner cut to the width runs in every season, whatever the material', () => {
  fc.assert(
    fc.property(
      fc.constantFrom('wood', 'plastic', 'aluminium'),
      fc.constantFrom('snug', 'running', 'loose'),
      fc.double({ min: 6, max: 80, noNaN: true }),
      (material, fit, width) => {
        const r = run({ slotWidths: [width], material, fit, instrument: 0.005 });
        const [least] = fits[fit];
        expect(r.playLeast).toBeGreaterThanOrEqual(least - 1e-9);
        expect(r.playMost).toBeGreaterThanOrEqual(r.playNow - 1e-9);
        expect(r.season).toBe('runs');
      },
    ),
    { seed, numRuns: process.env.SCANTLING_LONG ? 3000 : 200 },
  );
});

test.each([
  [{ now: 4 }, 'now'],
  [{ now: 13, wettest: 12 }, 'now'],
  [{ wood: 'Cheese' }, 'wood'],
  [{ slotWidths: [0.2] }, 'slotWidths'],
  [{ material: 'plastic', celsius: 40, warmest: 30 }, 'celsius'],
])('refuses %p', (input, field) => {
  expect(aidOf('runner')?.run({ ...slot, ...input })).toMatchObject({ ok: false, field });
});

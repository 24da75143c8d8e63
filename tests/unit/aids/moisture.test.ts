import fc from 'fast-check';
import { moistureInput, workMoisture } from '../../../shared/aids/moisture/moisture';
import {
  equilibriumMoisture,
  equilibriumMoistureFahrenheit,
  humidityFor,
} from '../../../shared/trade/moisture';
import { finite, worked } from './worked';

const humidities = [20, 25, 30, 35, 40, 45, 50, 55, 60, 65, 70, 75, 80, 90];
// USDA Wood Handbook FPL-GTR-190, Table 4–2, eight rows read in a page reproduction: °F and percent.
const rows: [number, number[]][] = [
  [30, [4.6, 5.5, 6.3, 7.1, 7.9, 8.7, 9.5, 10.4, 11.3, 12.4, 13.5, 14.9, 16.5, 21.0]],
  [50, [4.6, 5.5, 6.3, 7.1, 7.9, 8.7, 9.5, 10.3, 11.2, 12.3, 13.4, 14.8, 16.4, 20.9]],
  [60, [4.6, 5.4, 6.2, 7.0, 7.8, 8.6, 9.4, 10.2, 11.1, 12.1, 13.3, 14.6, 16.2, 20.7]],
  [70, [4.5, 5.4, 6.2, 6.9, 7.7, 8.5, 9.2, 10.1, 11.0, 12.0, 13.1, 14.4, 16.0, 20.5]],
  [80, [4.4, 5.3, 6.1, 6.8, 7.6, 8.3, 9.1, 9.9, 10.8, 11.7, 12.9, 14.2, 15.7, 20.2]],
  [90, [4.3, 5.1, 5.9, 6.7, 7.4, 8.1, 8.9, 9.7, 10.5, 11.5, 12.6, 13.9, 15.4, 19.8]],
  [100, [4.2, 5.0, 5.8, 6.5, 7.2, 7.9, 8.7, 9.5, 10.3, 11.2, 12.3, 13.6, 15.1, 19.5]],
  [140, [3.6, 4.3, 5.0, 5.7, 6.3, 7.0, 7.7, 8.4, 9.1, 10.0, 11.0, 12.1, 13.6, 17.7]],
];
const cells = rows.flatMap(([f, row]) =>
  row.map((percent, i) => [f, humidities[i] ?? 0, percent] as const),
);
const celsius = (f: number) => ((f - 32) * 5) / 9;

describe('equilibrium moisture content', () => {
  it.each(cells)('%i °F, %i %% humidity: Table 4–2 says %f %%', (f, h, percent) => {
    // The table is the formula rounded; ±0.07 as worked out over 171 cells.
    expect(Math.abs(equilibriumMoisture(celsius(f), h) - percent)).toBeLessThanOrEqual(0.07);
    expect(Math.abs(equilibriumMoistureFahrenheit(f, h) - percent)).toBeLessThanOrEqual(0.07);
    const { moisture } = worked(
      workMoisture(moistureInput.parse({ celsius: celsius(f), humidity: h })),
    );
    expect(Math.abs(moisture - percent)).toBeLessThanOrEqual(0.07);
  });

  // Computed from the formula, unrounded (°F coefficients).
  it.each([
    [70, 50, 9.246],
    [70, 30, 6.172],
    [70, 80, 15.997],
    [30, 50, 9.519],
    [140, 55, 8.378],
  ])('%i °F, %i %% unrounded: %f', (f, h, m) => {
    expect(equilibriumMoistureFahrenheit(f, h)).toBeCloseTo(m, 3);
  });

  // Computed from the formula, unrounded (°C coefficients).
  it.each([
    [20, 50, 9.271],
    [25, 65, 11.814],
  ])('%i °C, %i %% unrounded: %f', (c, h, m) => {
    expect(equilibriumMoisture(c, h)).toBeCloseTo(m, 3);
  });
});

const air = fc.record({
  celsius: fc.double({ min: -1.1, max: 98.8, noNaN: true }),
  humidity: fc.double({ min: 5, max: 95, noNaN: true }),
});

describe('everywhere in the handbook’s range', () => {
  it('rises with humidity and is undone by humidityFor', () => {
    fc.assert(
      fc.property(air, ({ celsius: c, humidity }) => {
        const m = equilibriumMoisture(c, humidity);
        if (humidity < 94) expect(equilibriumMoisture(c, humidity + 1)).toBeGreaterThan(m);
        expect(humidityFor(c, m)).toBeCloseTo(humidity, 6);
      }),
    );
  });

  it('is never surer than a percent point of moisture (FPL-GTR-229)', () => {
    fc.assert(
      fc.property(air, (input) => {
        const result = worked(workMoisture(moistureInput.parse(input)));
        expect(result.uncertainty).toBeGreaterThanOrEqual(1);
        expect(result.low).toBeLessThan(result.moisture);
        expect(finite(result)).toBe(true);
      }),
    );
  });
});

it.each([
  ['colder than the table', -10, 50],
  ['hotter', 120, 50],
  ['bone dry air', 20, 2],
  ['a fog', 20, 100],
  ['a temperature in °F by mistake', 170, 50],
])('refuses %s with a reason', (_, c, humidity) => {
  const outcome = workMoisture({ celsius: c, humidity, humidityUncertainty: 3 });
  expect(outcome).toMatchObject({ ok: false });
});

it('finds no humidity for a moisture content that air cannot give', () => {
  expect(humidityFor(20, 40)).toBeNull();
  expect(humidityFor(20, 0)).toBeNull();
  expect(humidityFor(20, NaN)).toBeNull();
});

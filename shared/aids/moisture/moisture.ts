import { z } from 'zod';
import { equilibriumMoisture, moistureDomain, moistureUncertainty } from '../../trade/moisture';
import { defineAid } from '../aid';
import { refused, type Outcome } from '../outcome';

export const moistureInput = z.object({
  /** Air temperature, °C. */
  celsius: z.number(),
  /** Relative humidity, %. */
  humidity: z.number(),
  /** What the hygrometer is good for, % either way; 3 is common practice, no source. */
  humidityUncertainty: z.number().min(0).max(20).default(3),
});

export interface MoistureResult {
  /** Moisture content wood comes to and how sure, percent. */
  moisture: number;
  uncertainty: number;
  /** With the whole of the uncertainty taken off and put on. */
  low: number;
  high: number;
}

/** The moisture content that wood left in this air comes to in the end (Wood Handbook Eq. 4–5). */
export function workMoisture(input: z.output<typeof moistureInput>): Outcome<MoistureResult> {
  const { celsius, humidity, humidityUncertainty } = input;
  const [coldest, hottest] = moistureDomain.celsius;
  const [driest, wettest] = moistureDomain.humidity;
  if (!(celsius >= coldest && celsius <= hottest))
    return refused(
      'celsius',
      'The handbook’s table runs from −1.1 to 98.9 °C (30 to 210 °F).',
      'Take the temperature where the wood is.',
    );
  if (!(humidity >= driest && humidity <= wettest))
    return refused(
      'humidity',
      `The handbook’s table runs from ${driest} to ${wettest} % humidity.`,
      'Nearer to soaked or bone dry air nothing sure can be said.',
    );
  const at = (h: number) => equilibriumMoisture(celsius, Math.min(wettest, Math.max(driest, h)));
  const moisture = at(humidity);
  const bySensor = (at(humidity + humidityUncertainty) - at(humidity - humidityUncertainty)) / 2;
  const uncertainty = Math.hypot(moistureUncertainty, bySensor);
  return {
    ok: true,
    result: {
      moisture,
      uncertainty,
      low: Math.max(0, moisture - uncertainty),
      high: moisture + uncertainty,
    },
  };
}

/** The aid "Moisture content". */
export const moistureAid = defineAid({
  id: 'moisture',
  title: 'Moisture content',
  what: 'The moisture wood comes to in a room, from temperature and humidity.',
  sources:
    'USDA Wood Handbook FPL-GTR-190, Eq. 4–5 and Table 4–2; good for ±1 % at best (FPL-GTR-229).',
  example: { celsius: 20, humidity: 50 },
  input: moistureInput,
  work: workMoisture,
});

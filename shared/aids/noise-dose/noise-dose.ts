import { z } from 'zod';
import {
  actionDose,
  doseRange,
  loudest,
  noiseDose,
  permittedMinutes,
  timeWeightedAverage,
} from '../../trade/noise';
import { defineAid } from '../aid';
import { refused, type Outcome } from '../outcome';

export const noiseDoseInput = z.object({
  day: z
    .array(
      z.object({
        name: z.string().max(80).default(''),
        /** dBA at the ear. */
        level: z.number(),
        minutes: z.number(),
      }),
    )
    .min(1)
    .max(40),
  /** What the levels are good for, dB either way; 2 for a sound meter of class 2, from memory. */
  uncertainty: z.number().min(0).max(10).default(2),
});

interface ByRule {
  /** Percent; 100 is the whole day's. */
  dose: number;
  /** With every level lower and higher by the uncertainty. */
  low: number;
  high: number;
  /** dBA over eight hours; null when nothing counts. */
  average: number | null;
}

export interface NoiseDoseResult {
  niosh: ByRule;
  osha: ByRule;
  rows: { name: string; level: number; minutes: number; niosh: number; osha: number }[];
  /** NIOSH is the advice: over, possibly over, or under its day. */
  verdict: 'over' | 'near' | 'under';
  /** At or over OSHA's action level. */
  action: boolean;
  /** Something is louder than any unprotected time. */
  tooLoud: boolean;
}

/** The day's noise dose by NIOSH, with OSHA's beside it. Without ear protection. */
export function workNoiseDose(input: z.output<typeof noiseDoseInput>): Outcome<NoiseDoseResult> {
  const { day, uncertainty } = input;
  const [, highest] = doseRange;
  if (day.some(({ level }) => !(level >= 30 && level <= highest)))
    return refused(
      'day',
      `Levels from 30 to ${highest} dBA; louder is not for a dose but for keeping away.`,
      'Give the level at the ear in dBA.',
    );
  if (day.some(({ minutes }) => !(minutes >= 0)))
    return refused('day', 'A time is below zero.', 'Give the minutes at the machine.');
  if (day.reduce((sum, { minutes }) => sum + minutes, 0) > 1440)
    return refused('day', 'That is more than a day.', 'Add up one day only.');
  const shifted = (by: number) => day.map((e) => ({ ...e, level: e.level + by }));
  const by = (rule: 'niosh' | 'osha'): ByRule => {
    const dose = noiseDose(rule, day);
    return {
      dose,
      low: noiseDose(rule, shifted(-uncertainty)),
      high: noiseDose(rule, shifted(uncertainty)),
      average: timeWeightedAverage(rule, dose),
    };
  };
  const [niosh, osha] = [by('niosh'), by('osha')];
  return {
    ok: true,
    result: {
      niosh,
      osha,
      rows: day.map((e) => ({
        ...e,
        niosh: permittedMinutes('niosh', e.level),
        osha: permittedMinutes('osha', e.level),
      })),
      verdict: niosh.dose > 100 ? 'over' : niosh.high > 100 ? 'near' : 'under',
      action: osha.dose >= actionDose,
      tooLoud: day.some(({ level, minutes }) => minutes > 0 && level > loudest),
    },
  };
}

/** The aid "Noise of the day". */
export const noiseDoseAid = defineAid({
  id: 'noise-dose',
  title: 'Noise of the day',
  what: 'The day’s noise without ear protection, against a safe day.',
  sources:
    'NIOSH 98-126 (85 dBA, 3 dB) is the advice; OSHA 29 CFR 1910.95 (90 dBA, 5 dB) beside it. Meter ±2 dB and counting from 80 dBA from memory.',
  caution:
    'Hearing does not come back. Ears covered at 85 dBA and over; catch the dust of the same machines: NIOSH asks for 1 mg/m³ of wood dust or less.',
  example: {
    day: [
      { name: 'planer', level: 100, minutes: 15 },
      { name: 'table saw', level: 95, minutes: 40 },
    ],
  },
  input: noiseDoseInput,
  work: workNoiseDose,
});

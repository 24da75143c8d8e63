/**
 * Noise exposure. OSHA 29 CFR 1910.95 App. A (read): T = 8/2^((L−90)/5) h, TWA = 16.61 log₁₀(D/100) + 90. NIOSH 98-126:
 * T = 480/2^((L−85)/3) min (read twice removed), TWA = 10 log₁₀(D/100) + 85 (read). Doses use the exact T, not the table's.
 */
export const noiseRules = {
  niosh: { minutes: 480, level: 85, exchange: 3, slope: 10 },
  osha: { minutes: 480, level: 90, exchange: 5, slope: 16.61 },
} as const;
export type NoiseRule = keyof typeof noiseRules;

export interface Exposure {
  /** A-weighted level at the ear, dB. */
  level: number;
  minutes: number;
}

/** Quieter than this does not count toward the dose; louder than that it is not integrated (1910.95(d)(2), from memory). */
export const doseRange = [80, 130] as const;
/** OSHA's action level is a dose of 50 % (read). */
export const actionDose = 50;
/** No unprotected time at all above this, slow response (Table G-16, read: a quarter hour or less at 115 dBA). */
export const loudest = 115;

/** Minutes at a level that make a full dose. */
export function permittedMinutes(rule: NoiseRule, level: number): number {
  const { minutes, level: criterion, exchange } = noiseRules[rule];
  return minutes / 2 ** ((level - criterion) / exchange);
}

/** The day's dose in percent: 100 Σ C/T over what is loud enough to count. */
export const noiseDose = (rule: NoiseRule, day: readonly Exposure[]): number =>
  day
    .filter(({ level }) => level >= doseRange[0])
    .reduce((sum, { level, minutes }) => sum + (100 * minutes) / permittedMinutes(rule, level), 0);

/** The level that, held for eight hours, gives the same dose; null for no dose at all. */
export function timeWeightedAverage(rule: NoiseRule, dose: number): number | null {
  if (!(dose > 0)) return null;
  const { level, slope } = noiseRules[rule];
  return slope * Math.log10(dose / 100) + level;
}

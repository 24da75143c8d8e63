import { z } from 'zod';
import { movement } from '../../trade/movement';
import { defineAid } from '../aid';
import { refused, type Outcome } from '../outcome';
import { coefficientFor, moistureRange, woodFields } from '../wood';

const reading = z.number().positive().max(500);

/** Expansion of each material, 1e-6 per kelvin. */
export const expansion = {
  /** Range 21–24 (read in a secondary source). */
  aluminium: 23,
  /** UHMW polyethylene 130–200 by grade, from memory; the supplier's figure counts. */
  plastic: 165,
} as const;

/** Play of a fit, mm, least and most: common practice, no source. */
export const fits = { snug: [0.03, 0.1], running: [0.08, 0.2], loose: [0.15, 0.4] } as const;

export const runnerInput = z.object({
  /** Of the slot at several places along it, mm. */
  slotWidths: z.array(reading).min(1).max(40),
  slotDepths: z.array(reading).min(1).max(40),
  /** The instrument reads true to ± this, mm. */
  instrument: z.number().min(0).max(1).default(0.025),
  fit: z.enum(['snug', 'running', 'loose']).default('running'),
  material: z.enum(['wood', 'plastic', 'aluminium']).default('wood'),
  ...woodFields,
  wood: woodFields.wood.default('red oak'),
  cut: woodFields.cut.default('quarter'),
  /** Moisture of the wood now, driest and wettest of the year, %. */
  now: z.number().default(8),
  driest: z.number().default(6),
  wettest: z.number().default(12),
  /** Shop now, coldest and warmest of the year, °C. */
  celsius: z.number().min(-40).max(60).default(20),
  coldest: z.number().min(-40).max(60).default(5),
  warmest: z.number().min(-40).max(60).default(35),
  /** Thickness of the runner's stock as measured, mm. */
  thickness: reading.optional(),
  /** Left free under it, mm. */
  under: z.number().min(0).max(20).default(0.8),
});
export type RunnerInput = z.output<typeof runnerInput>;

export interface RunnerResult {
  /** Cut it so wide, and the limits between which it fits now, mm. */
  width: number;
  narrowest: number;
  widest: number;
  /** What the slot itself varies by, mm; more than the fit's play, and no width fits all of it. */
  slotVaries: number;
  slotTooUneven: boolean;
  /** Thickest it may be so that it does not touch the bottom, mm. */
  thickest: number;
  /** What it is packed up by while it is fixed, so that its top stands level with the table; null without a thickness. */
  packing: number | null;
  thicknessVerdict: 'fits' | 'bottoms' | 'thin' | null;
  /** Play at the narrowest place, mm: now, in the dry or cold season, in the wet or warm one. */
  playNow: number;
  playLeast: number;
  playMost: number;
  /** ± of a play, mm. */
  uncertainty: number;
  season: 'runs' | 'may-bind' | 'binds';
}

type Swing = Outcome<readonly [least: number, most: number]>;

/** Growth of a width over the year as shares of it, from now: least and most. */
function swingOf(input: RunnerInput): Swing {
  if (input.material !== 'wood') {
    const alpha = expansion[input.material] * 1e-6;
    const { celsius, coldest, warmest } = input;
    if (!(coldest <= celsius && celsius <= warmest))
      return refused('celsius', 'The shop now lies outside the year’s range.', 'Widen the range.');
    return { ok: true, result: [alpha * (coldest - celsius), alpha * (warmest - celsius)] };
  }
  const { now, driest, wettest } = input;
  const found = coefficientFor(input);
  if (!found.ok) return found;
  const outside =
    moistureRange(now, 'now') ??
    moistureRange(driest, 'driest') ??
    moistureRange(wettest, 'wettest');
  if (outside) return outside;
  if (!(driest <= now && now <= wettest))
    return refused('now', 'The wood now lies outside the year’s range.', 'Widen the range.');
  const c = found.result;
  return { ok: true, result: [movement(1, c, now, driest), movement(1, c, now, wettest)] };
}

/**
 * Width, thickness and packing of a runner in a measured slot, and whether it still runs in the driest and wettest (or
 * coldest and warmest) season. The play is taken at the narrowest place, the bottom at the shallowest.
 */
export function workRunner(input: RunnerInput): Outcome<RunnerResult> {
  const { slotWidths, slotDepths, instrument, thickness, under } = input;
  const swing = swingOf(input);
  if (!swing.ok) return swing;
  const [least, most] = fits[input.fit];
  const narrow = Math.min(...slotWidths);
  const shallow = Math.min(...slotDepths);
  const slotVaries = Math.max(...slotWidths) - narrow;
  if (narrow <= 2 * most)
    return refused('slotWidths', 'A slot so narrow takes no runner.', 'Check the unit.');
  const [shrinks, grows] = swing.result;
  // Wide enough to keep the least play when it has grown, as near to the middle of the fit as that allows.
  const widest = narrow - least;
  const width = Math.min(narrow - (least + most) / 2, (narrow - least) / (1 + grows));
  const play = (share: number) => narrow - width * (1 + share);
  const playLeast = play(grows);
  const uncertainty = instrument * Math.SQRT2;
  const thickest = shallow - under;
  return {
    ok: true,
    result: {
      width,
      narrowest: narrow - most,
      widest,
      slotVaries,
      slotTooUneven: slotVaries > most - least,
      thickest,
      packing: thickness === undefined ? null : Math.max(0, shallow - thickness),
      thicknessVerdict:
        thickness === undefined
          ? null
          : thickness > thickest
            ? 'bottoms'
            : thickness < thickest / 2
              ? 'thin'
              : 'fits',
      playNow: play(0),
      playLeast,
      playMost: play(shrinks),
      uncertainty,
      season:
        playLeast - uncertainty > 0 ? 'runs' : playLeast + uncertainty > 0 ? 'may-bind' : 'binds',
    },
  };
}

/** The aid for a runner, key or tongue. */
export const runnerAid = defineAid({
  id: 'runner',
  title: 'A runner in a slot',
  what: 'Width, thickness and packing of a runner, key or tongue in a measured slot, and whether it runs all year.',
  sources:
    'Wood Handbook ch. 13 for wood; expansion of aluminium in a secondary source, of plastic from memory: the supplier’s figure counts. The play of a fit is common practice, no source.',
  caution:
    'Unplug the machine to measure and fit. Size the runner as a long strip, never as a short piece.',
  example: { slotWidths: [19.05, 19.1, 19.02], slotDepths: [9.6, 9.5], thickness: 8.5 },
  input: runnerInput,
  work: workRunner,
});

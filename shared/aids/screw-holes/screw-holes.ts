import { z } from 'zod';
import { drillAtLeast, drillsOf, nearestDrill, type Drill } from '../../trade/drills';
import {
  countersinkDepth,
  flatHead,
  leadHoles,
  rootShare,
  shankDiameter,
} from '../../trade/screws';
import { woodScrews } from '../../trade/screws.data';
import { defineAid } from '../aid';
import { refused, type Outcome } from '../outcome';

export const screwSeries = ['us', 'british', 'metric'] as const;

export const screwFields = {
  series: z.enum(screwSeries),
  /** Number of the gauge; for metric screws the diameter in mm. */
  gauge: z.number(),
};

export const screwHolesInput = z.object({
  ...screwFields,
  wood: z.enum(['soft', 'hard']),
  /** Two rules that disagree; one is chosen by name. */
  rule: z.enum(['wood-handbook', 'trade-chart']).default('wood-handbook'),
  /** Measured on the screw in hand, mm: root of the thread and head. */
  root: z.number().positive().max(20).optional(),
  head: z.number().positive().max(40).optional(),
  /** Drills on hand, mm; none: the whole series. */
  drills: z.array(z.number().positive().max(50)).max(400).default([]),
  drillSeries: z.enum(['fraction', 'metric', 'number']).default('fraction'),
});

export interface HoleDrill {
  /** Wanted, mm. */
  wanted: number;
  drill: Drill | null;
  /** The drill less what is wanted, mm. */
  off: number;
}

export interface ScrewHolesResult {
  shank: number;
  root: number;
  head: number;
  pilot: HoleDrill;
  clearance: HoleDrill;
  countersink: { angle: 82 | 90; depth: number };
}

/** How far a drill may be from the pilot wanted and still be called near: half of 1/32 in. Common practice, no source. */
export const drillNear = 25.4 / 64;

/** The shank of a screw in mm, or why the gauge is none. */
export function shankOf(input: {
  series: (typeof screwSeries)[number];
  gauge: number;
}): Outcome<number> {
  const { series, gauge } = input;
  if (series === 'metric') {
    if (gauge >= 1.5 && gauge <= 12) return { ok: true, result: gauge };
    return refused(
      'gauge',
      'Metric wood screws run from 1.5 to 12 mm.',
      'Give the diameter in mm.',
    );
  }
  const made = woodScrews.some(({ number }) => number === gauge);
  if (!made || (series === 'british' && gauge < 1))
    return refused(
      'gauge',
      'Wood screws are made in numbers 0 to 10, 12, 14, 16, 18, 20 and 24.',
      series === 'british' ? 'The British rule starts at No. 1.' : 'Read the number on the box.',
    );
  const shank = shankDiameter(String(gauge), series);
  return shank === null
    ? refused('gauge', 'This gauge is no number.', 'Read the number on the box.')
    : { ok: true, result: shank };
}

const shares = { 'trade-chart': { soft: 0.85, hard: 1 } } as const;

const taken = (wanted: number, drill: Drill | null): HoleDrill => ({
  wanted,
  drill,
  off: drill ? drill.mm - wanted : 0,
});

/** Pilot, clearance and countersink for a wood screw, and the drill on hand for each. */
export function workScrewHoles(input: z.output<typeof screwHolesInput>): Outcome<ScrewHolesResult> {
  const found = shankOf(input);
  if (!found.ok) return found;
  const shank = found.result;
  const root = input.root ?? shank * rootShare;
  if (root >= shank)
    return refused('root', 'The root of a thread is thinner than the shank.', 'Measure again.');
  // Metric flat heads: about twice the diameter, common practice, no source.
  const head = input.head ?? (input.series === 'metric' ? 2 * shank : flatHead(shank));
  if (head <= shank)
    return refused('head', 'The head is no wider than the shank.', 'Measure across the head.');
  const pilot =
    input.rule === 'wood-handbook'
      ? leadHoles(root / rootShare)[input.wood]
      : root * shares['trade-chart'][input.wood];
  const drills: Drill[] =
    input.drills.length > 0
      ? input.drills.map((mm) => ({ name: '', mm }))
      : drillsOf(input.drillSeries);
  const near = nearestDrill(pilot, drills);
  const angle = input.series === 'metric' ? 90 : 82;
  const clearance = drillAtLeast(shank, drills);
  const hole = clearance?.mm ?? shank;
  return {
    ok: true,
    result: {
      shank,
      root,
      head,
      pilot: taken(pilot, near && Math.abs(near.mm - pilot) <= drillNear ? near : null),
      // More than 1/32 in of play is no clearance hole for this screw (common practice, no source).
      clearance: taken(
        shank,
        clearance && clearance.mm - shank <= 2 * drillNear ? clearance : null,
      ),
      countersink: {
        angle,
        depth: Math.max(0, countersinkDepth(head, Math.min(hole, head), angle)),
      },
    },
  };
}

/** The aid "Holes for a screw". */
export const screwHolesAid = defineAid({
  id: 'screw-holes',
  title: 'Holes for a screw',
  what: 'Pilot, clearance and countersink, with the drill for each.',
  sources:
    'Shank ASME B18.6.1 (British: an old text); root two thirds, USDA Wood Handbook ch. 8; pilot 70 and 90 % of the root from memory. Design codes and trade charts differ.',
  caution: 'Clamp small work; hold no piece in the hand under a drill.',
  example: { series: 'us', gauge: 8, wood: 'hard' },
  input: screwHolesInput,
  work: workScrewHoles,
});

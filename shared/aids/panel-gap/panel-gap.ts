import { z } from 'zod';
import { movement } from '../../trade/movement';
import { defineAid } from '../aid';
import { refused, type Outcome } from '../outcome';
import { coefficientFor, linearShare, moistureRange, woodFields } from '../wood';

export const panelGapInput = z.object({
  ...woodFields,
  /** Between the bottoms of the two grooves, across the grain, mm. */
  opening: z.number().positive().max(5_000),
  /** Depth of each groove, mm. */
  groove: z.number().positive().max(100),
  /** Moisture content of the panel now, and the least and most of the year, %. */
  now: z.number(),
  driest: z.number(),
  wettest: z.number(),
});

export interface PanelGapResult {
  /** Cut the panel so wide now, mm. */
  width: number;
  /** Gap at each groove bottom now, in the wettest and in the driest season, mm. */
  gapNow: number;
  gapWettest: number;
  gapDriest: number;
  /** What still stands in each groove in the driest season, mm. */
  cover: number;
  /** mm either way, of the whole width. */
  uncertainty: number;
}

/**
 * The width to cut a loose panel to, so that it neither bursts its frame in the wettest season nor leaves its grooves in
 * the driest: the growth to the wettest, plus the uncertainty of the reckoning, is kept free.
 */
export function workPanelGap(input: z.output<typeof panelGapInput>): Outcome<PanelGapResult> {
  const { opening, groove, now, driest, wettest } = input;
  const found = coefficientFor(input);
  if (!found.ok) return found;
  const outside =
    moistureRange(now, 'now') ??
    moistureRange(driest, 'driest') ??
    moistureRange(wettest, 'wettest');
  if (outside) return outside;
  if (!(driest <= now && now <= wettest))
    return refused(
      'now',
      'What the panel has now lies outside the year’s range.',
      'Let it come to the room first, or widen the range.',
    );
  if (groove * 2 >= opening)
    return refused('groove', 'The grooves are deeper than the opening is wide.', 'Measure again.');
  const c = found.result;
  // The rule's own error, and half a percent point of moisture on the year's ends.
  const swing = movement(opening, c, driest, wettest);
  const uncertainty = Math.hypot(linearShare * swing, movement(opening, c, 0, 0.5));
  const width = (opening - uncertainty) / (1 + movement(1, c, now, wettest));
  const at = (m: number) => width * (1 + movement(1, c, now, m));
  const gapDriest = (opening - at(driest)) / 2;
  const cover = groove - gapDriest;
  if (cover - uncertainty / 2 <= 0)
    return refused(
      'groove',
      'In the driest season the panel would leave its grooves.',
      'Cut deeper grooves, use a quarter-sawn panel, or two narrower panels.',
    );
  return {
    ok: true,
    result: {
      width,
      gapNow: (opening - width) / 2,
      gapWettest: (opening - at(wettest)) / 2,
      gapDriest,
      cover,
      uncertainty,
    },
  };
}

/** The aid "Panel in a frame". */
export const panelGapAid = defineAid({
  id: 'panel-gap',
  title: 'Panel in a frame',
  what: 'How wide to cut a loose panel so that no season bursts or bares it.',
  sources:
    'USDA Wood Handbook FPL-GTR-190, Eq. 13–2 and Table 13–5; the share kept free is the rule’s own error.',
  example: {
    wood: 'cherry',
    cut: 'flat',
    opening: 400,
    groove: 10,
    now: 8,
    driest: 6,
    wettest: 12,
  },
  input: panelGapInput,
  work: workPanelGap,
});

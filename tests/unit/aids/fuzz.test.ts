import fc from 'fast-check';
import { type z } from 'zod';
import { bladeSpeedInput, workBladeSpeed } from '../../../shared/aids/blade-speed/blade-speed';
import { boardFeetInput, workBoardFeet } from '../../../shared/aids/board-feet/board-feet';
import { glueWaitInput, workGlueWait } from '../../../shared/aids/glue-wait/glue-wait';
import { moistureInput, workMoisture } from '../../../shared/aids/moisture/moisture';
import { noiseDoseInput, workNoiseDose } from '../../../shared/aids/noise-dose/noise-dose';
import { type Outcome } from '../../../shared/aids/outcome';
import { panelGapInput, workPanelGap } from '../../../shared/aids/panel-gap/panel-gap';
import { riseAndRunInput, workRiseAndRun } from '../../../shared/aids/rise-and-run/rise-and-run';
import { sawDepthInput, workSawDepth } from '../../../shared/aids/saw-depth/saw-depth';
import { screwHolesInput, workScrewHoles } from '../../../shared/aids/screw-holes/screw-holes';
import { screwLengthInput, workScrewLength } from '../../../shared/aids/screw-length/screw-length';
import { withdrawalInput, workWithdrawal } from '../../../shared/aids/withdrawal/withdrawal';
import {
  woodMovementInput,
  workWoodMovement,
} from '../../../shared/aids/wood-movement/wood-movement';
import { woodWeightInput, workWoodWeight } from '../../../shared/aids/wood-weight/wood-weight';
import { finite } from './worked';

const runs = process.env.SCANTLING_LONG ? 5000 : 200;

/** Figures of every size a slipped unit or a stuck key gives. */
const figure = fc.oneof(
  fc.double({ min: -1e3, max: 1e3 }),
  fc.double({ min: 0, max: 100, noNaN: true }),
  fc.constantFrom(0, -0, 1e-12, 1e12, NaN, Infinity, -Infinity, 4, 8, 12, 254),
);
const maybe = fc.option(figure, { nil: undefined });
const list = (item: fc.Arbitrary<unknown>) => fc.array(item, { maxLength: 4 });

const aid = <S extends z.ZodType>(
  name: string,
  schema: S,
  work: (input: z.output<S>) => Outcome<unknown>,
  fields: Record<string, fc.Arbitrary<unknown>>,
) => ({
  name,
  input: fc.record(fields),
  run: (raw: unknown): Outcome<unknown> | null => {
    const parsed = schema.safeParse(raw);
    return parsed.success ? work(parsed.data) : null;
  },
});

const wood = {
  wood: fc.constantFrom('cherry', 'other', 'poplar'),
  cut: fc.constantFrom('flat', 'quarter'),
};
const screw = { series: fc.constantFrom('us', 'british', 'metric'), gauge: figure };
const aids = [
  aid('moisture', moistureInput, workMoisture, {
    celsius: figure,
    humidity: figure,
    humidityUncertainty: maybe,
  }),
  aid('wood-movement', woodMovementInput, workWoodMovement, {
    ...wood,
    shrinkage: maybe,
    width: figure,
    from: figure,
    to: figure,
  }),
  aid('panel-gap', panelGapInput, workPanelGap, {
    ...wood,
    shrinkage: maybe,
    opening: figure,
    groove: figure,
    now: figure,
    driest: figure,
    wettest: figure,
  }),
  aid('screw-holes', screwHolesInput, workScrewHoles, {
    ...screw,
    wood: fc.constantFrom('soft', 'hard'),
    root: maybe,
    head: maybe,
    drills: list(figure),
  }),
  aid('screw-length', screwLengthInput, workScrewLength, {
    ...screw,
    through: list(figure),
    into: figure,
    sunk: maybe,
    lengths: list(figure),
  }),
  aid('withdrawal', withdrawalInput, workWithdrawal, {
    fastener: fc.constantFrom('screw', 'nail'),
    gravity: figure,
    diameter: figure,
    bite: figure,
    grain: fc.constantFrom('side', 'end'),
    number: maybe,
    length: maybe,
  }),
  aid('board-feet', boardFeetInput, workBoardFeet, {
    boards: list(fc.record({ thickness: figure, width: figure, length: figure, count: figure })),
    price: maybe,
  }),
  aid('wood-weight', woodWeightInput, workWoodWeight, {
    wood: wood.wood,
    gravity: maybe,
    moisture: maybe,
    thickness: figure,
    width: figure,
    length: figure,
  }),
  aid('saw-depth', sawDepthInput, workSawDepth, {
    diameter: figure,
    arborBelow: figure,
    base: maybe,
    bevel: maybe,
    stock: maybe,
  }),
  aid('blade-speed', bladeSpeedInput, workBladeSpeed, {
    diameter: figure,
    rpm: figure,
    marked: maybe,
    largest: maybe,
  }),
  aid('rise-and-run', riseAndRunInput, workRiseAndRun, {
    rise: figure,
    run: figure,
    uncertainty: maybe,
  }),
  aid('noise-dose', noiseDoseInput, workNoiseDose, {
    day: list(fc.record({ level: figure, minutes: figure })),
  }),
  aid('glue-wait', glueWaitInput, workGlueWait, {
    family: fc.constantFrom('pva-white', 'epoxy'),
    celsius: figure,
    label: fc.record({ open: maybe, clamp: maybe }),
    faceLength: maybe,
    faceWidth: maybe,
  }),
];

it.each(aids)(
  '$name: any figures give a finite result, a refusal with a cure, or are no input',
  ({ input, run }) => {
    fc.assert(
      fc.property(input, (raw) => {
        const outcome = run(raw);
        if (outcome === null) return;
        if (outcome.ok) expect(finite(outcome.result)).toBe(true);
        else
          expect(
            outcome.reason.length * outcome.cure.length * outcome.field.length,
          ).toBeGreaterThan(0);
      }),
      { numRuns: runs },
    );
  },
);

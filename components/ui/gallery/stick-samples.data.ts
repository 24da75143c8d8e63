import {
  type StickInput,
  type StickStep,
  type StickVerdict,
} from '../../../shared/plan/stick/types';

type Hang = Partial<Pick<StickStep, 'verdicts' | 'waits' | 'talk' | 'failing'>>;

function steps(
  starts: number[],
  end: number,
  at: number,
  titles: string[],
  hang: Record<number, Hang>,
): StickStep[] {
  return starts.map((start, i) => ({
    id: `s${i + 1}`,
    number: i + 1,
    title: titles[i] ?? `Step ${i + 1}`,
    start,
    end: starts[i + 1] ?? end,
    state: i + 1 < at ? 'done' : i + 1 === at ? 'current' : 'open',
    verdicts: [],
    waits: [],
    talk: [],
    ...hang[i + 1],
  }));
}

const v = (at: number, verdict: StickVerdict) => ({ at, verdict });

const nineTitles = [
  'Measure your sheet and your plane',
  'Break the sheet down to A and B',
  'Plane both long edges straight',
  'Glue bed B to base A',
  'Joint the fence C',
  'Pilot, then hang the fence on one screw',
  'Set the fence square and fix it',
  'Fit the cleat D',
  'Wax the runway and take a test shaving',
];

/** Nine steps, the fourth running its wait. */
export const nineSteps: StickInput = {
  duration: 742,
  steps: steps([0, 58, 131, 168, 262, 351, 430, 560, 655], 742, 4, nineTitles, {
    1: { verdicts: [v(20, 'holds'), v(40, 'holds')] },
    2: { verdicts: [v(80, 'risk')] },
    4: {
      verdicts: [v(205, 'need')],
      waits: [{ at: 256, running: true, left: 1868 }],
      talk: [{ at: 180, count: 3 }],
    },
    5: { verdicts: [v(290, 'fails')], failing: true },
    7: { verdicts: [v(490, 'close')], talk: [{ at: 520, count: 4 }] },
    8: { waits: [{ at: 650 }] },
  }),
};

/** Nothing begun. */
export const openSteps: StickInput = {
  duration: 300,
  steps: steps([0, 60, 200], 300, 0, ['Cut', 'Glue', 'Fit'], {
    1: { verdicts: [v(30, 'need')] },
    2: { verdicts: [v(100, 'need')] },
  }),
};

export const threeSteps: StickInput = {
  duration: 300,
  steps: steps([0, 60, 200], 300, 2, ['Cut', 'Glue', 'Fit'], {
    1: { verdicts: [v(30, 'holds')] },
    2: { verdicts: [v(100, 'need')], waits: [{ at: 196 }] },
  }),
};

function many(count: number, at: number): StickInput {
  const lengths = Array.from({ length: count }, (_, i) => (i % 5 === 2 || i % 5 === 4 ? 8 : 13));
  const starts = lengths.map((_, i) => lengths.slice(0, i).reduce((a, b) => a + b, 0));
  const end = lengths.reduce((a, b) => a + b, 0);
  const hang = Object.fromEntries(
    starts.map((start, i): [number, Hang] => [
      i + 1,
      {
        ...(i % 5 === 3 && {
          verdicts: [v(start + 3, i + 1 < at ? 'holds' : i % 2 ? 'need' : 'fails')],
        }),
        ...(i % 20 === 13 && { talk: [{ at: start, count: i }] }),
        ...(i % 19 === 9 && { waits: [{ at: start + 7 }] }),
      },
    ]),
  );
  return { duration: end, steps: steps(starts, end, at, [], hang) };
}

export const sixtySteps = many(60, 22);
export const hundredSteps = many(100, 64);

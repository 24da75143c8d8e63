import { type FiveCutInput, type FiveCutResult } from './five-cut';

const round = (mm: number) => Math.round(mm * 1000) / 1000;

const ends = { outer: 'the outer end', blade: 'the end at the blade' } as const;
const ways = {
  'towards-the-board': 'towards the board',
  'away-from-the-board': 'away from the board',
} as const;

/** What to do, in a sentence. */
export function actionOf(r: FiveCutResult, input: FiveCutInput): string {
  if (r.move)
    return `Move ${ends[r.move.end]} of the fence ${round(r.move.by)} mm ${ways[r.move.direction]}, ${round(input.pivot)} mm from the pivot. Then cut five again.`;
  if (r.verdict === 'true') return 'Leave the fence: it is true to the goal.';
  return 'Leave the fence: what is read is no more than the reading is sure to.';
}

function neededWords({ needed }: FiveCutResult): string[] {
  if (!needed) return [];
  if (needed.readings === null && needed.stripLength === null)
    return [
      'The fence cannot be set finely enough for this goal where it is moved. Set it with feeler leaves, or further from the pivot.',
    ];
  const ways = [
    needed.readings === null ? '' : `${needed.readings} readings at each place`,
    needed.stripLength === null ? '' : `a strip of ${needed.stripLength} mm`,
  ].filter(Boolean);
  return [`For this goal take ${ways.join(', or ')}.`];
}

/** What to beware of in this round. */
export function warningsOf(r: FiveCutResult, input: FiveCutInput): string[] {
  const thin = Math.min(...[input.fenceEnd, input.otherEnd].flat());
  return [
    ...(thin < r.leastTrim / 2
      ? [
          `The strip nearly runs out to a point. Trim at least ${Math.ceil(r.leastTrim + 5)} mm on the fifth cut.`,
        ]
      : []),
    ...(r.verdict === 'swamped'
      ? [
          'The measuring error swamps the result: take a bigger board, or several readings at each end.',
        ]
      : []),
    ...neededWords(r),
  ];
}

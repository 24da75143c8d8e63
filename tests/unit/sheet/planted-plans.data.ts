import { builtDemoPlans } from '../../../server/demo';
import { type PlanDocument } from '../../../shared/plan/document';

const board = builtDemoPlans()[0]!.built.document;
const dimension = (
  symbol: string,
  part: Partial<PlanDocument['dimensions'][number]>,
): PlanDocument => ({
  ...board,
  dimensions: board.dimensions.map((d) => (d.symbol === symbol ? { ...d, ...part } : d)),
});
export const step = (at: number, part: Partial<PlanDocument['steps'][number]>): PlanDocument => ({
  ...board,
  steps: board.steps.map((s, i) => (i === at ? { ...s, ...part } : s)),
});

/** A plan with a fault, and the rule that finds it. */
export const planted: [rule: string, document: PlanDocument][] = [
  ['dims/unknown', dimension('bed_w', { expression: 'base_w - runwy' })],
  ['dims/loop', dimension('runway', { expression: 'bed_w + play' })],
  ['dims/kind', dimension('bed_w', { expression: 'base_w - 3' })],
  ['dims/untaken', step(0, { takes: [] })],
  [
    'dims/unused',
    {
      ...board,
      dimensions: [
        ...board.dimensions,
        {
          ...board.dimensions[0]!,
          id: '00000000-0000-7000-8000-00000000abcd',
          symbol: 'spare_d',
          name: 'Spare',
          origin: 'given',
          expression: '1 in',
        },
      ],
    },
  ],
  ['checks/fails', dimension('bed_w', { origin: 'given', expression: '9 in' })],
  ['plan/steps', { ...board, steps: [] }],
  ['text/empty', step(2, { text: '', actions: [], takes: [], holds: [] })],
  ['text/long', step(2, { text: 'word '.repeat(91) })],
  ['parts/made', step(1, { parts: [] })],
  ['parts/used', step(7, { parts: [], actions: [], text: 'Fit it.' })],
  [
    'links/disclosure',
    { ...board, links: [{ ...board.links[0]!, onSale: true, disclosure: undefined }] },
  ],
  ['media/alt', { ...board, cover: 'a'.repeat(64), coverAlt: '' }],
  [
    'media/captions',
    {
      ...board,
      clip: { source: 'hosted', url: 'https://video.example/1', duration: 300, claimed: false },
    },
  ],
  [
    'media/stretch',
    {
      ...board,
      clip: { source: 'hosted', url: 'https://video.example/1', duration: 100, claimed: false },
    },
  ],
  ['time/cure', step(4, { loadsJoint: true })],
];

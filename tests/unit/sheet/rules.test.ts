import { builtDemoPlans } from '../../../server/demo';
import { type PlanDocument } from '../../../shared/plan/document';
import { checkSheet } from '../../../shared/plan/sheet';

const clean = builtDemoPlans().map(({ key, built }) => [key, built.document] as const);
const board = clean[0]![1];
const rowsOf = (document: PlanDocument, rule: string) =>
  checkSheet(document).rows.filter((r) => r.rule === rule);
const dimension = (
  symbol: string,
  part: Partial<PlanDocument['dimensions'][number]>,
): PlanDocument => ({
  ...board,
  dimensions: board.dimensions.map((d) => (d.symbol === symbol ? { ...d, ...part } : d)),
});
const step = (at: number, part: Partial<PlanDocument['steps'][number]>): PlanDocument => ({
  ...board,
  steps: board.steps.map((s, i) => (i === at ? { ...s, ...part } : s)),
});

describe('the check sheet', () => {
  it.each(clean)('is quiet on the clean plan %s', (_, document) => {
    expect(checkSheet(document).rows).toEqual([]);
  });

  const planted: [rule: string, document: PlanDocument][] = [
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
    ['checks/fails', dimension('play', { expression: '-1/8 in' })],
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
  it.each(planted)('finds a planted fault by %s and leads to its place', (rule, document) => {
    const rows = rowsOf(document, rule);
    expect(rows.length).toBeGreaterThan(0);
    expect(rows[0]!.message).not.toBe('');
    expect(rows[0]!.cure).not.toBe('');
  });

  it('leaves out a should that was switched off with a reason, never a must', () => {
    const long = step(2, { text: 'word '.repeat(91) });
    const off = { ...long, switchedOff: [{ rule: 'text/long', reason: 'It is a list.' }] };
    expect(rowsOf(off, 'text/long')).toEqual([]);
    const must = {
      ...step(1, { parts: [] }),
      switchedOff: [{ rule: 'parts/made', reason: 'No.' }],
    };
    expect(rowsOf(must, 'parts/made').length).toBeGreaterThan(0);
  });
});

import { askLayout, checkSheet } from '../../../shared/plan/sheet';
import { board } from './planted.data';

const ply = board.stock[0]!.id;
const nine = { ...board, parts: board.parts.map((p, i) => (i ? p : { ...p, quantity: 9 })) };
const enough = (sheet: Awaited<ReturnType<typeof askLayout>>) =>
  sheet.rows.filter((r) => r.rule === 'layout/enough');

it('asks more of a plan that is to be published', () => {
  expect(checkSheet(nine).rows).toMatchObject([{ rule: 'layout/enough', verdict: 'at-risk' }]);
  expect(checkSheet(nine, undefined, 'publish').rows).toMatchObject([
    { rule: 'layout/enough', level: 'must', verdict: 'fails' },
  ]);
});

it('lets a layout engine have the last word on the stock it answers for', async () => {
  const sheet = checkSheet(board);
  expect(enough(sheet)).toEqual([]);
  const two = await askLayout(sheet, board, async () =>
    Promise.resolve([{ stockId: ply, pieces: 2 }]),
  );
  expect(enough(two)).toMatchObject([{ verdict: 'at-risk', place: { elementId: ply } }]);
  expect(two.quiet).toBe(sheet.quiet - 1);
  const one = await askLayout(two, board, async () =>
    Promise.resolve([{ stockId: ply, pieces: 1 }]),
  );
  expect(one).toEqual(sheet);
  const none = await askLayout(
    sheet,
    board,
    async () => Promise.resolve([{ stockId: ply, pieces: null }]),
    'publish',
  );
  expect(enough(none)).toMatchObject([{ verdict: 'fails' }]);
});

it('keeps the bound while the engine cannot be asked', async () => {
  const sheet = checkSheet(nine);
  expect(await askLayout(sheet, nine, async () => Promise.reject(new Error('busy')))).toBe(sheet);
});

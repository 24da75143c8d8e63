import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import command from '../../../server/cli/compare';
import { builtDemoPlans } from '../../../server/demo';
import { writeEntriesFile } from '../../../shared/plan/bench/entries-file';
import { type Entry } from '../../../shared/plan/bench/entry';
import { type Change } from '../../../shared/plan/compare';
import { exportPlan } from '../../../shared/plan/interchange';
import { type Notice } from '../../../shared/plan/notice';
import { idOf } from '../model/plan';

const folder = mkdtempSync(join(tmpdir(), 'compare-'));
const board = builtDemoPlans()[0]!.built.document;
const longer = {
  ...board,
  dimensions: board.dimensions.map((d) =>
    d.symbol === 'board_l' ? { ...d, expression: '21 in' } : d,
  ),
};
const partA = board.parts.find((p) => p.mark === 'A')!;
const sizing = board.steps.find((s) =>
  s.parts.some((p) => p.partId === partA.id && p.to === 'sized'),
)!;
let out: string[] = [];
let errors: string[] = [];
const file = (name: string, text: string) => {
  const path = join(folder, name);
  writeFileSync(path, text);
  return path;
};
const [a, b] = [file('a.json', exportPlan(board)), file('b.json', exportPlan(longer))];

beforeEach(() => {
  out = [];
  errors = [];
  jest.spyOn(console, 'log').mockImplementation((line: unknown) => void out.push(String(line)));
  jest
    .spyOn(console, 'error')
    .mockImplementation((line: unknown) => void errors.push(String(line)));
});
afterEach(() => jest.restoreAllMocks());
afterAll(() => rmSync(folder, { recursive: true }));

it('is 0 and silent when nothing differs, 1 with each change in a line', async () => {
  expect(await command.run([a, a])).toBe(0);
  expect(out).toEqual([]);
  expect(await command.run([a, b])).toBe(1);
  expect(out[0]).toMatch(
    /^changed +dimension +Length of the board: expression: 20 in → 21 in; value 508 → 533\.4 mm$/,
  );
  expect(out[1]).toMatch(/^follows +part +A Base: length 508 → 533\.4 mm$/);
});

it('says what it means for a bench copy: cut too short, and the stock to make it again', async () => {
  const entry: Entry = {
    id: idOf(9, 1),
    kind: 'tick',
    elementId: sizing.id,
    revisionId: idOf(8, 1),
    device: 'a',
    deviceSequence: 1,
    deviceTime: '2026-06-01T10:00:00Z',
  };
  const entries = writeEntriesFile([{ copyId: idOf(8, 2), entry }], '2026-06-01T11:00:00Z');
  const copy = file('entries.json', entries);
  expect(await command.run([a, b, '--copy', copy, '--json'])).toBe(1);
  const said = JSON.parse(out.join('\n')) as { changes: Change[]; notice: Notice };
  const item = said.notice.items.find((i) => i.change.elementId === partA.id);
  expect(item).toMatchObject({ means: 'cannot', assumed: true });
  // 21 in is 533.4 mm; the part carries its own allowance beside it.
  expect(item?.needs[0]?.length).toBeGreaterThanOrEqual(533.4);
  out = [];
  await command.run([a, b, '--copy', copy]);
  expect(out.join('\n')).toMatch(
    /cannot be saved +A Base: .* cannot be put back\. Make it again: A/,
  );
});

it('is 2 with the reason when a file is no plan or no entries', async () => {
  expect(await command.run([a])).toBe(2);
  expect(await command.run([a, file('x.json', '{')])).toBe(2);
  expect(await command.run([a, file('y.json', '{}')])).toBe(2);
  expect(await command.run([a, b, '--copy', a])).toBe(2);
  expect(errors.join('\n')).toMatch(
    /Say which[\s\S]*is not JSON[\s\S]*is no plan[\s\S]*not a file of bench entries/,
  );
});

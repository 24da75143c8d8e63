import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import command from '../../../server/cli/check';
import { builtDemoPlans } from '../../../server/demo';
import { exportPlan } from '../../../shared/plan/interchange';

const folder = mkdtempSync(join(tmpdir(), 'check-'));
const board = builtDemoPlans()[0]!.built.document;
let out: string[] = [];
let errors: string[] = [];
const file = (name: string, text: string) => {
  const path = join(folder, name);
  writeFileSync(path, text);
  return path;
};

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

it('is 0 on a clean plan', async () => {
  expect(await command.run([file('clean.json', exportPlan(board))])).toBe(0);
  expect(out.join('\n')).toMatch(/Shooting board: 0 fail, 0 to look at/);
});

it('is 1 when a must fails, and says where', async () => {
  const wrong = { ...board, parts: board.parts.map((p, i) => (i ? p : { ...p, length: '9 ft' })) };
  const path = file('wrong.json', exportPlan(wrong));
  expect(await command.run([path])).toBe(1);
  expect(out.join('\n')).toMatch(/FAILS +parts\/fits-stock .*parts\//);
  out = [];
  expect(await command.run([path, '--json'])).toBe(1);
  const printed = JSON.parse(out.join('\n')) as { ok: boolean; rows: { rule: string }[] };
  expect(printed.ok).toBe(false);
  expect(printed.rows.map((r) => r.rule)).toContain('parts/fits-stock');
});

it('is 0 when only a should is found', async () => {
  const long = {
    ...board,
    steps: board.steps.map((s, i) => (i ? s : { ...s, text: 'word '.repeat(91) })),
  };
  expect(await command.run([file('long.json', exportPlan(long))])).toBe(0);
  expect(out.join('\n')).toMatch(/at risk +text\/long/);
});

it('is 2 on what is no plan, listing every fault', async () => {
  const broken = {
    ...board,
    units: 'ells',
    parts: board.parts.map((p) => ({ ...p, quantity: 0 })),
  };
  expect(await command.run([file('broken.json', JSON.stringify(broken))])).toBe(2);
  expect(errors.length).toBe(1 + board.parts.length);
  expect(errors.join('\n')).toMatch(/^units: /m);
  expect(await command.run([file('torn.json', '{"scantling": 1')])).toBe(2);
  expect(await command.run([join(folder, 'none.json'), '--json'])).toBe(2);
  expect(await command.run([])).toBe(2);
});

import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import command from '../../../server/cli/jottings';

const folder = mkdtempSync(join(tmpdir(), 'jottings-'));
const sample = join(__dirname, '../../data/captions/o2-outfeed-cart.srt');
let out: string[] = [];
let errors: string[] = [];

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

test('--json prints the scored figures, titles, tools and materials', async () => {
  expect(await command.run([sample, '--json'])).toBe(0);
  const result = JSON.parse(out.join('\n')) as Record<string, unknown[]>;
  expect(result.steps?.[0]).toMatchObject({
    start: expect.any(Number) as number,
    title: expect.any(String) as string,
  });
  expect(result.measures).toContainEqual(expect.objectContaining({ value: 34.5, unit: 'in' }));
  expect(result.tools?.length).toBeGreaterThan(5);
  expect(result.materials?.length).toBeGreaterThan(5);
  expect(result.corrections?.[0]).toMatchObject({
    heard: expect.any(String) as string,
    meant: expect.any(String) as string,
  });
});

test('without --json it prints lines to read', async () => {
  expect(await command.run([sample])).toBe(0);
  expect(out.join('\n')).toMatch(/34\.5 in/);
});

test.each([
  ['no file', [], /usage/],
  ['a file that is not there', [join(folder, 'none.vtt')], /no such file/],
  ['a folder', [folder], /cannot be read/],
  ['an option nobody knows', [sample, '--loud'], /no option --loud/],
])('%s ends with 2 and says why', async (_, argv, why) => {
  expect(await command.run(argv)).toBe(2);
  expect(errors.join('\n')).toMatch(why);
  expect(out).toEqual([]);
});

test.each([
  ['', /empty/],
  ['not captions at all', /No caption was found/],
])('a file of %j ends with 2', async (text, why) => {
  const path = join(folder, 'bad.vtt');
  writeFileSync(path, text);
  expect(await command.run([path])).toBe(2);
  expect(errors.join('\n')).toMatch(why);
});

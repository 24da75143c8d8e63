import * as command from '../../../server/cli/aid';
import { aids } from '../../../shared/aids';

let out: string[];
beforeEach(() => {
  out = [];
  jest.spyOn(console, 'log').mockImplementation((line: string) => void out.push(line));
  jest.spyOn(console, 'error').mockImplementation((line: string) => void out.push(line));
});
afterEach(() => jest.restoreAllMocks());

test('lists every aid with its inputs, and an input that works', async () => {
  expect(await command.run(['--list'])).toBe(0);
  for (const aid of aids) expect(out.join('\n')).toContain(aid.id);
  expect(await command.run(['--list', '--json'])).toBe(0);
  const listed = JSON.parse(out.at(-1) ?? '') as { name: string; inputs: object }[];
  expect(listed.map((aid) => aid.name)).toEqual(aids.map((aid) => aid.id));
});

test.each(aids.map((aid) => [aid.id, aid] as const))('%s works its example out', (_, aid) => {
  expect(aid.run(aid.example)).toMatchObject({ ok: true });
});

test('works an aid out', async () => {
  const input = { piece: '12 in', stock: '96 in', kerf: '1/8 in' };
  expect(await command.run(['repeated-cuts', '--json', JSON.stringify(input)])).toBe(0);
  expect(JSON.parse(out.join())).toMatchObject({ ok: true, result: { pieces: 7 } });
});

test.each([
  ['an aid there is not', ['sharpen', '--json', '{}'], 2, /There is no aid sharpen/],
  ['no JSON', ['repeated-cuts', '--json', '{piece'], 2, /no JSON/],
  ['no inputs', ['repeated-cuts'], 1, /input/],
  ['an input that is wrong', ['repeated-cuts', '--json', '{"piece":"wide","stock":1}'], 1, /piece/],
])('says what is wrong with %s', async (_, argv, status, said) => {
  expect(await command.run(argv)).toBe(status);
  expect(out.join('\n')).toMatch(said);
});

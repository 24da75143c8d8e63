import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import { run } from '../../../server/cli/aid';
import { aids } from '../../../shared/aids';
import { finite } from './worked';

const folders = readdirSync(join(__dirname, '../../../shared/aids'), { withFileTypes: true })
  .filter((entry) => entry.isDirectory())
  .map(({ name }) => name)
  .sort();

describe('the list of aids', () => {
  it('has every folder once', () => {
    expect(aids.map(({ id }) => id).sort()).toEqual(folders);
  });

  it.each(aids)('$id: its example works, its words and sources stand', (aid) => {
    const outcome = aid.run(aid.example);
    expect(outcome).toMatchObject({ ok: true });
    expect(finite(outcome)).toBe(true);
    expect(aid.title.length * aid.what.length * aid.sources.length).toBeGreaterThan(0);
    expect(aid.schema()).toHaveProperty('$schema');
  });

  it.each(aids)('$id: refuses what is no input, with a reason and a cure', (aid) => {
    for (const raw of [null, undefined, 7, 'x', [], {}, { day: null }]) {
      const outcome = aid.run(raw);
      expect(outcome).toMatchObject({ ok: false, reason: expect.any(String) as string });
    }
  });
});

describe('scantling aid', () => {
  let out: string[] = [];
  let errors: string[] = [];
  beforeEach(() => {
    [out, errors] = [[], []];
    jest.spyOn(console, 'log').mockImplementation((line: unknown) => void out.push(String(line)));
    jest
      .spyOn(console, 'error')
      .mockImplementation((line: unknown) => void errors.push(String(line)));
  });
  afterEach(() => jest.restoreAllMocks());

  it('lists every aid with its inputs', async () => {
    expect(await run(['--list'])).toBe(0);
    for (const { id } of aids) expect(out.join('\n')).toContain(id);
    expect(out.join('\n')).toContain('inputs: celsius humidity [humidityUncertainty]');
  });

  it('runs one, says refused with 1, and no aid or no JSON with 2', async () => {
    expect(await run(['moisture', '--json', '{"celsius":20,"humidity":50}'])).toBe(0);
    expect(JSON.parse(out.join('\n'))).toMatchObject({ ok: true });
    out = [];
    expect(await run(['moisture', '--json', '{"celsius":20,"humidity":99}'])).toBe(1);
    expect(JSON.parse(out.join('\n'))).toMatchObject({ ok: false, field: 'humidity' });
    expect(await run(['moisture', '--json', '{'])).toBe(2);
    expect(await run(['astrolabe'])).toBe(2);
    expect(errors).toHaveLength(2);
  });
});

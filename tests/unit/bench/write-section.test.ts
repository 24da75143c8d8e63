import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { table, writeSection } from '../../bench/write-section';

const dir = mkdtempSync(join(tmpdir(), 'scantling-page-'));
const file = join(dir, 'performance.md');
const read = () => readFileSync(file, 'utf8');
afterAll(() => {
  rmSync(dir, { recursive: true, force: true });
});

it('makes the page, puts a section at its end, and later changes that section alone', () => {
  writeSection('one', 'first', file);
  writeSection('two', 'second', file);
  writeFileSync(file, `${read()}\nWritten by hand.\n`);
  writeSection('one', 'third $& time', file);
  const text = read();
  expect(text).toMatch(/^# Performance/);
  expect(text).not.toContain('first');
  expect(text).toContain('<!-- bench:one -->\n\nthird $& time\n\n<!-- /bench:one -->');
  expect(text.indexOf('bench:one')).toBeLessThan(text.indexOf('second'));
  expect(text).toContain('Written by hand.');
});

it('refuses a page with half a pair of marks', () => {
  writeFileSync(file, '<!-- bench:one -->');
  expect(() => {
    writeSection('one', 'x', file);
  }).toThrow('not a pair');
});

it('makes a table', () => {
  expect(table(['a', 'b'], [['x', 1]])).toBe('| a | b |\n| --- | --- |\n| x | 1 |');
});

import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { jot, readCaptions } from '../../../shared/captions';
import { pooled, rates, score, type Gold } from '../../bench/captions-score';

const folder = join(__dirname, '../../data/captions');
const files = readdirSync(folder).filter((file) => /^o\d.*\.(?:vtt|srt)$/.test(file));

const scores = files.map((file) => {
  const gold = JSON.parse(
    readFileSync(join(folder, file.replace(/\.\w+$/, '.gold.json')), 'utf8'),
  ) as Gold;
  return score(gold, jot(readCaptions(readFileSync(join(folder, file), 'utf8'))));
});

// Floors under what the four samples reach, so that a change that loses ground is seen.
test.each([
  ['measures', 0.95, 0.95],
  ['steps', 0.93, 0.9],
  ['cautions', 0.9, 0.85],
  ['corrections', 0.93, 0.93],
] as const)('%s keep their F1 of %d and precision of %d', (part, f1, precision) => {
  const got = rates(pooled(scores)[part]);
  expect(got.f1).toBeGreaterThanOrEqual(f1);
  expect(got.precision).toBeGreaterThanOrEqual(precision);
});

test('the four samples are there', () => expect(files).toHaveLength(4));

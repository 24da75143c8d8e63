import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { jot, matchJottings, readCaptions } from '../../../shared/captions';

const text = readFileSync(
  join(__dirname, '../../data/captions/o3-wall-tool-cabinet.vtt'),
  'utf8',
).replace(/<[^>]*>/g, '');
const before = jot(readCaptions(text));

test('the same file pairs every jotting with itself', () => {
  const pairs = matchJottings(before, jot(readCaptions(text)));
  expect(pairs.size).toBe(
    before.steps.length +
      before.measures.length +
      before.tools.length +
      before.materials.length +
      before.cautions.length +
      before.corrections.length,
  );
  expect([...pairs].every(([a, b]) => a === b)).toBe(true);
});

test('words put right beside a measure do not lose it', () => {
  const after = jot(
    readCaptions(
      text
        .replace(/which is eighteen wide/, 'and it is eighteen wide')
        .replace('nine mil wide', 'nine millimetres wide'),
    ),
  );
  const pairs = matchJottings(before, after);
  const lost = before.measures.filter((measure) => !pairs.has(measure.id));
  expect(lost).toEqual([]);
  const nine = before.measures.find((measure) => measure.text === 'nine mil');
  expect(after.measures.find((measure) => measure.id === pairs.get(nine?.id ?? ''))?.text).toBe(
    'nine millimetres',
  );
});

test('a figure that was corrected is not taken for the old one', () => {
  const after = jot(
    readCaptions(
      text.replace(
        'seven hundred and sixty with a hacksaw',
        'seven hundred and fifty with a hacksaw',
      ),
    ),
  );
  const old = before.measures.find((measure) => measure.value === 760);
  expect(old).toBeDefined();
  expect(matchJottings(before, after).has(old?.id ?? '')).toBe(false);
});

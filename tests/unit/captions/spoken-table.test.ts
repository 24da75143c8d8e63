import { jot, type Captions } from '../../../shared/captions';
import { captionsOf } from './captions-of';
import { spokenLines } from './spoken-table.data';

const units = { mm: 'metric', in: 'imperial', mixed: 'mixed' } as const;

interface Row {
  said: string;
  values: number[][];
  unit: string[];
  talk: (typeof units)[keyof typeof units];
}

function rowOf(line: string): Row {
  const [words, values, unit] = line.split('|').map((part) => part.trim());
  const talk = /^\[(mm|in|mixed)\] /.exec(words ?? '');
  return {
    said: (words ?? '').replace(/^\[\w+\] /, ''),
    values:
      values === '-' ? [] : (values ?? '').split(';').map((each) => each.split(',').map(Number)),
    unit: unit === '-' ? [] : (unit ?? '').split(';'),
    talk: units[(talk?.[1] ?? 'in') as keyof typeof units],
  };
}

const rows = spokenLines.trim().split('\n').map(rowOf);

test('the table holds at least 250 measures', () => {
  expect(rows.filter((row) => row.values.length > 0).length).toBeGreaterThanOrEqual(230);
  expect(rows.length).toBeGreaterThanOrEqual(250);
});

test.each(rows)('$said', ({ said, values, unit, talk }) => {
  const captions: Captions = captionsOf([`and ${said}`]);
  const got = jot(captions, { units: talk }).measures;
  expect(got.map((measure) => [measure.unit, measure.values ?? [measure.value]])).toEqual(
    unit.map((each, i) => [each, values[i]]),
  );
});

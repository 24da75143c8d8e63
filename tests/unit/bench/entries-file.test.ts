import { readEntriesFile, writeEntriesFile } from '../../../shared/plan/bench/entries-file';
import { type Entry } from '../../../shared/plan/bench/entry';

const uuid = (n: number) => `00000000-0000-7000-8000-${n.toString(16).padStart(12, '0')}`;
const base = (n: number) => ({
  id: uuid(n),
  elementId: uuid(500),
  revisionId: uuid(900),
  device: 'd',
  deviceSequence: n,
  deviceTime: '2026-01-01T10:00:00Z',
});
const entries: { copyId: string; entry: Entry }[] = [
  { copyId: uuid(1), entry: { ...base(10), kind: 'tick' } },
  { copyId: uuid(2), entry: { ...base(11), kind: 'note', text: 'Bowed “sheet”, ½ in.' } },
  {
    copyId: uuid(1),
    entry: {
      ...base(12),
      kind: 'reading',
      form: 'figure',
      value: { text: '11/16', mm: '2794/160' },
      instrument: 'calipers',
      place: '',
    },
  },
];
const at = '2026-12-01T10:00:00Z';

describe('a file of bench entries', () => {
  it('gives back what went in, in order', () => {
    expect(readEntriesFile(writeEntriesFile(entries, at))).toEqual({ ok: true, entries });
  });

  it('leaves out how the sending went', () => {
    const jobs = entries.map((each) => ({ ...each, personId: uuid(7), state: 'refused' }));
    expect(writeEntriesFile(jobs, at)).not.toMatch(/refused|personId/);
  });

  it('names what is wrong with a broken one', () => {
    const broken = writeEntriesFile(entries, at).replace('"note"', '"shout"');
    expect(readEntriesFile(broken)).toEqual({
      ok: false,
      message: expect.stringContaining('Entry 2 is broken (entries.1.entry.kind') as string,
    });
    expect(readEntriesFile('{"a":1}')).toMatchObject({ ok: false });
    expect(readEntriesFile('[')).toEqual({ ok: false, message: 'This is not a JSON file.' });
    const newer = writeEntriesFile(entries, at).replace('"version": 1', '"version": 2');
    expect(readEntriesFile(newer)).toMatchObject({ ok: false });
  });
});

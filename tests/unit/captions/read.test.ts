import { plainText, readCaptions, toVtt, vttTime } from '../../../shared/captions';

const vtt = (body: string) => readCaptions(`WEBVTT\n\n${body}`);
const starts = (text: string) =>
  readCaptions(text).cues.map((cue) => [cue.start, cue.end, cue.text]);

// W3C WebVTT, §4.1 and §6.1 (parsing); the table of times is in the project's trade facts.
describe('WebVTT', () => {
  test.each([
    ['00:01.000 --> 00:04.000', 1, 4],
    ['00:00:01.000 --> 00:00:04.000', 1, 4],
    ['100:00:00.000 --> 100:00:02.500', 360_000, 360_002.5],
    ['1:00:00.000 --> 1:00:01.000', 3600, 3601],
    [
      '00:01.000\t-->\t00:04.000 align:start position:0% line:90% size:50% vertical:rl region:fred',
      1,
      4,
    ],
    ['00:01.000-->00:04.000', 1, 4],
  ])('%s', (line, start, end) => {
    expect(vtt(`${line}\nhello there\n`).cues).toMatchObject([{ start, end, text: 'hello there' }]);
  });

  test.each([
    '60:00.000 --> 61:00.000',
    '00:60:00.000 --> 00:61:00.000',
    '00:00:61.000 --> 00:01:02.000',
    'abc --> def',
    '00:01.000 --> soon',
  ])('%s is no time', (line) => {
    const { cues, faults } = vtt(`${line}\nlost\n\n00:05.000 --> 00:06.000\nkept\n`);
    const texts = cues.map((cue) => cue.text);
    expect(faults.length).toBeGreaterThan(0);
    expect(faults[0]).toMatchObject({ line: 3, code: 'time' });
    expect(texts).toContain('kept');
    if (!line.startsWith('60')) expect(texts).not.toContain('lost');
  });

  test('NOTE, STYLE, REGION and header lines are no captions', () => {
    const text =
      'WEBVTT - made by hand\nKind: captions\n\nNOTE one line\n\nNOTE\nof several\nlines\n\nSTYLE\n::cue { color: red }\n\nREGION\nid:fred\n\nfirst\n00:01.000 --> 00:02.000\nsaid\n\nNOTE after\n';
    expect(starts(text)).toEqual([[1, 2, 'said']]);
  });

  test('NOTE that is not at the start of a block is text', () => {
    expect(vtt('00:01.000 --> 00:02.000\nfirst\nNOTE to self\n').cues[0]?.text).toBe(
      'first NOTE to self',
    );
  });

  test('cue names, also of digits, are no text', () => {
    expect(
      vtt('intro - 1\n00:01.000 --> 00:02.000\na b\n\n7\n00:02.000 --> 00:03.000\nc d\n').cues.map(
        (cue) => cue.text,
      ),
    ).toEqual(['a b', 'c d']);
  });

  test.each([
    ['<v Ann Other>hello <i>you</i></v>', 'hello you'],
    ['<c.loud.red>hello</c> <b>you</b> <u>all</u>', 'hello you all'],
    ['<ruby>base<rt>note</rt></ruby>', 'basenote'],
    ['<lang en-GB>colour</lang>', 'colour'],
    ['one &amp; two &lt;three&gt;&nbsp;four &lrm;', 'one & two <three> four'],
    ['a < b and 3 < 4', 'a < b and 3 < 4'],
    ['unclosed <i>tag <b', 'unclosed tag'],
    ['{\\an8}top', 'top'],
  ])('text of %s', (payload, text) => expect(plainText(payload)).toBe(text));

  test('word times are kept, the others spread between them', () => {
    const words =
      vtt(
        '00:01.000 --> 00:05.000\ncut<00:00:02.000><c> it</c><00:00:03.500><c> twelve</c> inches\n',
      ).cues[0]?.words ?? [];
    expect(words.map((word) => word.text)).toEqual(['cut', 'it', 'twelve', 'inches']);
    expect(words.slice(0, 3).map((word) => word.t)).toEqual([1, 2, 3.5]);
    expect(words[3]?.t).toBeGreaterThan(3.5);
    expect(words[3]?.t).toBeLessThan(5);
  });

  test.each(['\n', '\r\n', '\r'])('line ends %j and a byte order mark', (end) => {
    expect(
      starts(`\uFEFFWEBVTT${end}${end}00:01.000 --> 00:02.000${end}one${end}two${end}`),
    ).toEqual([[1, 2, 'one two']]);
  });

  test('a missing header is read as if it were there, and said', () => {
    const { cues, faults } = readCaptions('00:01.000 --> 00:02.000\none\n', { fileName: 'x.vtt' });
    expect(cues).toHaveLength(1);
    expect(faults.map((fault) => fault.code)).toEqual([]);
    expect(
      readCaptions('NOTE x\n\n00:01.000 --> 00:02.000\none\n', { fileName: 'x.vtt' }).faults[0]
        ?.code,
    ).toBe('header');
  });
});

describe('SubRip as it is met', () => {
  test.each([
    ['plain', '1\n00:00:01,000 --> 00:00:02,000\none\n\n2\n00:00:02,000 --> 00:00:03,000\ntwo\n'],
    [
      'without blank lines',
      '1\n00:00:01,000 --> 00:00:02,000\none\n2\n00:00:02,000 --> 00:00:03,000\ntwo\n',
    ],
    [
      'full stops for commas',
      '1\n00:00:01.000 --> 00:00:02.000\none\n\n2\n00:00:02.000 --> 00:00:03.000\ntwo\n',
    ],
    [
      'short arrows and hours',
      '1\n0:00:01,0 -> 0:00:02,0\none\n\n2\n0:00:02,000 -> 0:00:03,000\ntwo\n',
    ],
    [
      'coordinates and tags',
      '1\n00:00:01,000 --> 00:00:02,000 X1:10 X2:20 Y1:1 Y2:2\n<font color="red">one</font>\n\n2\n00:00:02,000 --> 00:00:03,000\n{\\an8}<i>two</i>\n',
    ],
    ['counters lost', '00:00:01,000 --> 00:00:02,000\none\n\n00:00:02,000 --> 00:00:03,000\ntwo\n'],
    ['no fraction', '1\n00:00:01 --> 00:00:02\none\n\n2\n00:00:02 --> 00:00:03\ntwo\n'],
    [
      'spaces in times',
      '1\n00: 00: 01, 000 --> 00: 00: 02, 000\none\n\n2\n00:00:02,000 --> 00:00:03,000  \n  two \n',
    ],
  ])('%s', (_, text) =>
    expect(starts(text)).toEqual([
      [1, 2, 'one'],
      [2, 3, 'two'],
    ]),
  );

  test('a blank line inside a caption does not end it', () => {
    expect(
      starts(
        '1\n00:00:01,000 --> 00:00:02,000\none\n\nmore\n\n2\n00:00:02,000 --> 00:00:03,000\ntwo\n',
      ),
    ).toEqual([
      [1, 2, 'one more'],
      [2, 3, 'two'],
    ]);
  });
});

describe('put right', () => {
  test('out of order is sorted and said', () => {
    const { cues, faults } = vtt(
      '00:05.000 --> 00:06.000\nlater\n\n00:01.000 --> 00:02.000\nfirst\n',
    );
    expect(cues.map((cue) => cue.text)).toEqual(['first', 'later']);
    expect(faults).toMatchObject([{ code: 'order', line: 6 }]);
  });

  test('overlaps end where the next begins', () => {
    expect(
      vtt('00:01.000 --> 00:09.000\none\n\n00:04.000 --> 00:06.000\ntwo\n').cues.map(
        (cue) => cue.end,
      ),
    ).toEqual([4, 6]);
  });

  test('an end before the start keeps the words', () => {
    const { cues, faults } = vtt('00:03.000 --> 00:02.000\none\n\n00:05.000 --> 00:06.000\ntwo\n');
    expect(cues[0]).toMatchObject({ start: 3, end: 5, text: 'one' });
    expect(faults).toHaveLength(1);
  });

  test('rolling lines are said once, at their first cue', () => {
    const rolling =
      '00:00.000 --> 00:02.000\n \nset the fence\n\n00:02.000 --> 00:02.010\nset the fence\n \n\n00:02.010 --> 00:04.000\nset the fence\nat twelve inches\n\n00:04.000 --> 00:04.010\nat twelve inches\n \n\n00:04.010 --> 00:06.000\nat twelve inches\nand rip it\n';
    expect(vtt(rolling).cues.map((cue) => [cue.start, cue.text])).toEqual([
      [0, 'set the fence'],
      [2.01, 'at twelve inches'],
      [4.01, 'and rip it'],
    ]);
  });

  test('what is said twice stays twice where nothing rolls', () => {
    expect(
      vtt(
        '00:00.000 --> 00:02.000\nagain\n\n00:02.000 --> 00:04.000\nagain\n\n00:04.000 --> 00:06.000\nand glue it\n\n00:06.000 --> 00:07.000\nup\n\n00:07.000 --> 00:09.000\nnow wait\n\n00:09.000 --> 00:10.000\nan hour\n',
      ).cues,
    ).toHaveLength(6);
  });

  test.each([
    ['', 'empty'],
    ['   \n\n', 'empty'],
    ['just a text file', 'format'],
    ['WEBVTT\n\n', 'format'],
    ['{"not": "captions"}', 'format'],
    ['\u0000\u0000\u0000', 'format'],
  ])('%j holds no captions', (text, code) => {
    const fault = readCaptions(text).faults.find((each) => each.fatal);
    expect(fault?.code).toBe(code);
    expect(fault?.sentence).toMatch(/\.vtt or \.srt/);
  });
});

test.each([
  [59.9996, '00:01:00.000'],
  [3723.004, '01:02:03.004'],
  [0, '00:00:00.000'],
  [360_000, '100:00:00.000'],
])('%d s is %s', (seconds, text) => expect(vttTime(seconds)).toBe(text));

test('written and read again, captions are the same', () => {
  const { cues } = vtt(
    '00:01.000 --> 00:02.500\na < b & c\n\n00:02.500 --> 00:04.000\ntwo > one\n',
  );
  expect(readCaptions(toVtt(cues)).cues).toEqual(cues);
});

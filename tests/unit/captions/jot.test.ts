import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import {
  heardIn,
  jot,
  readCaptions,
  toDraft,
  type Captions,
  type WordsRange,
} from '../../../shared/captions';
import { captionsOf } from './captions-of';

const folder = join(__dirname, '../../data/captions');
const text = readFileSync(join(folder, 'o1-shooting-board.vtt'), 'utf8');
const captions = readCaptions(text);
const jottings = jot(captions);

function wordsAt({ cues }: Captions, { from, to }: WordsRange): string {
  const words: string[] = [];
  for (let c = from.cue; c <= to.cue; c += 1) {
    words.push(
      ...(cues[c]?.words ?? [])
        .slice(c === from.cue ? from.word : 0, c === to.cue ? to.word + 1 : undefined)
        .map((word) => word.text),
    );
  }
  return words.join(' ');
}

test('the same file gives the same jottings', () =>
  expect(jot(readCaptions(text))).toEqual(jottings));

test('each jotting stands on the words it came from', () => {
  for (const item of [
    ...jottings.measures,
    ...jottings.cautions,
    ...jottings.tools,
    ...jottings.materials,
  ]) {
    expect(wordsAt(captions, item.wordsRange)).toContain(item.text);
    expect(item.t).toBe(captions.cues[item.wordsRange.from.cue]?.start);
  }
  for (const item of jottings.corrections)
    expect(wordsAt(captions, item.wordsRange)).toBe(item.heard);
});

test('steps follow one another from the first word to the end', () => {
  jottings.steps.forEach((step, i) =>
    expect(step.end).toBe(jottings.steps[i + 1]?.start ?? jottings.duration),
  );
  expect(jottings.steps.map((step) => step.phase)).toEqual(
    expect.arrayContaining(['intro', 'build', 'outro']),
  );
  for (const step of jottings.steps) expect(step.title.split(' ').length).toBeLessThanOrEqual(8);
});

test('a corrected word leaves the ids of all else as they were', () => {
  const corrected = jot(
    readCaptions(
      text.replace('baltic church', 'baltic birch').replace('a tiny chamber', 'a tiny chamfer'),
    ),
  );
  const before = new Set(jottings.measures.map((measure) => measure.id));
  const lost = corrected.measures.filter((measure) => !before.has(measure.id));
  expect(lost.map((measure) => measure.text)).toEqual([]);
  expect(corrected.corrections.length).toBe(jottings.corrections.length - 2);
});

test('nothing lies after the end of a clip that is shorter than its captions', () => {
  const short = jot(captions, { duration: 120 });
  expect(short.duration).toBe(120);
  expect(short.steps.at(-1)?.end).toBe(120);
  expect(short.measures.every((measure) => measure.t < 120)).toBe(true);
});

test('heardIn gives what was said in a stretch', () => {
  const heard = heardIn(jottings, 60, 80);
  expect(heard.measures.map((measure) => measure.values ?? measure.value)).toEqual([
    [12, 20],
    12,
    9,
  ]);
});

test('toDraft puts every measure into exactly one step', () => {
  const ids = toDraft(jottings).flatMap((step) => step.measures.map((measure) => measure.id));
  expect(ids.sort()).toEqual(jottings.measures.map((measure) => measure.id).sort());
});

test('captions without a word give jottings without a step', () => {
  expect(jot({ format: 'vtt', cues: [], faults: [] })).toMatchObject({
    steps: [],
    measures: [],
    duration: 0,
  });
});

test.each([
  ['about an eighth deep', 'about'],
  ['at least two hours', 'at least'],
  ['less than half a mil', 'less than'],
  ['within ten thou', 'less than'],
  ['twelve inches', null],
] as const)('%s is qualified', (said, qualifier) =>
  expect(jot(captionsOf([`leave ${said}`])).measures[0]?.qualifier).toBe(qualifier),
);

test('a unit left unsaid is marked so', () => {
  const [said, unsaid] = jot(
    captionsOf(['rip it twelve inches wide then set the fence at nine']),
  ).measures;
  expect([said?.unitInferred, unsaid?.unitInferred, unsaid?.unit]).toEqual([false, true, 'in']);
});

import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { jot, readCaptions, toDraft, type Jottings } from '../../../shared/captions';

const long = process.env.SCANTLING_LONG === '1';
const seed = Number(process.env.SCANTLING_SEED ?? Date.now() % 100_000);
const folder = join(__dirname, '../../data/captions');
const sources = readdirSync(folder)
  .filter((file) => /\.(?:vtt|srt)$/.test(file))
  .map((file) => readFileSync(join(folder, file), 'utf8'));

/** mulberry32, public domain. */
function random(from: number): () => number {
  let a = from;
  return () => {
    a = (a + 0x6d2b79f5) | 0;
    let t = Math.imul(a ^ (a >>> 15), 1 | a);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}
const next = random(seed);
const below = (n: number) => Math.floor(next() * n);
const pick = <T>(items: readonly T[]): T => items[below(items.length)] as T;
const junk = [
  '-->',
  '\n\n',
  '\r',
  '<',
  '>',
  '<00:',
  '{\\an8}',
  '&amp',
  '\u0000',
  '\uFEFF',
  'NOTE',
  'WEBVTT',
  '99:99:99.999',
  '1/0',
  'point point',
  'half a half',
  'by by by',
  'twelve hundred thousand million',
  '🪚',
  '𝟙',
  'a an a an',
  '-1',
  'NaN',
  '00:00:00.000 --> 00:00:00.000',
  '999999:59:59.999 --> 999999:59:59.999',
  'x x x',
  '½½½',
  '"""',
  "'''",
  'no wait no wait',
];

/** Part of a sample, spoilt in one to six places. */
function mutated(): string {
  const source = pick(sources);
  const from = below(source.length);
  let text =
    (next() < 0.5 ? source.slice(0, 200) : '') + source.slice(from, from + 400 + below(2400));
  for (let i = 0; i <= below(6); i += 1) {
    const at = below(text.length + 1);
    const kind = below(6);
    if (kind === 0) text = text.slice(0, at) + pick(junk) + text.slice(at);
    else if (kind === 1) text = text.slice(0, at) + text.slice(at + below(60));
    else if (kind === 2)
      text = text.slice(0, at) + text.slice(at, at + below(200)).repeat(2) + text.slice(at);
    else if (kind === 3)
      text = text.slice(0, at) + String.fromCharCode(below(0x2100)) + text.slice(at + 1);
    else if (kind === 4) text = text.split('\n').reverse().join('\n');
    else text = text.replace(/\d/g, (d) => (next() < 0.05 ? String(below(10)) : d));
  }
  return text;
}

/** What is wrong with jottings, as a sentence; null when nothing is. */
function wrong(jottings: Jottings): string | null {
  const { duration, steps, measures } = jottings;
  if (
    !steps.every((step) => step.start >= 0 && step.end <= duration + 1e-9 && step.start <= step.end)
  )
    return 'a step outside the clip';
  if (steps.some((step, i) => i > 0 && step.start < (steps[i - 1]?.start ?? 0)))
    return 'steps out of order';
  if (
    !measures.every((m) =>
      (m.values ?? [m.value]).every((value) => value !== null && Number.isFinite(value)),
    )
  )
    return 'a measure that is no number';
  if (!steps.every((step) => step.title.trim() !== '' && step.title.length <= 80))
    return 'a step without a fit title';
  const ids = [...steps, ...measures, ...jottings.cautions, ...jottings.corrections].map(
    (item) => item.id,
  );
  return new Set(ids).size === ids.length ? null : 'an id given twice';
}

test(`spoilt caption files never throw, hang or leave the clip (seed ${seed})`, () => {
  const rounds = long ? 100_000 : 1_500;
  for (let i = 0; i < rounds; i += 1) {
    const text = mutated();
    const begun = performance.now();
    const options = next() < 0.3 ? { duration: below(600) } : {};
    const jottings = jot(readCaptions(text), options);
    toDraft(jottings);
    const fault =
      wrong(jottings) ?? (performance.now() - begun > 2000 ? 'more than two seconds' : null);
    if (fault) throw new Error(`${fault}, round ${i}, seed ${seed}: ${JSON.stringify(text)}`);
  }
}, 3_600_000);

test('three hours of captions are done within a second', () => {
  const sample = readCaptions(sources.find((text) => text.startsWith('WEBVTT')) ?? '');
  const length = sample.cues.at(-1)?.end ?? 1;
  const times = Math.ceil((3 * 3600) / length);
  const cues = Array.from({ length: times }, (_, k) =>
    sample.cues.map((cue) => ({
      ...cue,
      start: cue.start + k * length,
      end: cue.end + k * length,
      words: cue.words.map((word) => ({ ...word, t: word.t + k * length })),
    })),
  ).flat();
  jot(sample);
  const begun = performance.now();
  const { duration } = jot({ ...sample, cues });
  expect(duration).toBeGreaterThanOrEqual(3 * 3600);
  // Twice the promise, for a busy machine.
  expect(performance.now() - begun).toBeLessThan(2000);
});

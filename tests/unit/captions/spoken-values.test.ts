import { jot } from '../../../shared/captions';
import { captionsOf } from './captions-of';
import { inchWays, millimetreWays } from './speak';

const long = process.env.SCANTLING_LONG === '1';
const seed = Number(process.env.SCANTLING_SEED ?? Date.now() % 100_000);

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

/** All of the values in a long run, a sample drawn from the seed otherwise. */
function sample(count: number, of: number): number[] {
  if (long) return Array.from({ length: of }, (_, i) => i);
  const next = random(seed);
  return Array.from({ length: count }, () => Math.floor(next() * of));
}

function heard(words: string, units: 'imperial' | 'metric') {
  return jot(captionsOf([`and then mark it ${words}`]), { units }).measures.map((m) => [
    m.value,
    m.unit,
  ]);
}

test(`every 64th of an inch up to 64 in comes back (seed ${seed})`, () => {
  const wrong: unknown[] = [];
  for (const i of sample(400, 64 * 64)) {
    const value = (i + 1) / 64;
    for (const words of inchWays(i + 1)) {
      const got = heard(words, 'imperial');
      if (got.length !== 1 || got[0]?.[0] !== value || got[0]?.[1] !== 'in')
        wrong.push([words, got]);
    }
  }
  expect(wrong).toEqual([]);
});

test(`every millimetre up to 3000 comes back (seed ${seed})`, () => {
  const wrong: unknown[] = [];
  for (const n of sample(300, 3001)) {
    for (const words of millimetreWays(n)) {
      const got = heard(words, 'metric');
      if (got.length !== 1 || got[0]?.[0] !== n || got[0]?.[1] !== 'mm') wrong.push([words, got]);
    }
  }
  expect(wrong).toEqual([]);
});

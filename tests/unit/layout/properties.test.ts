import fc from 'fast-check';
import { solve, verifyLayout } from '../../../shared/layout';
import { anyJob } from './jobs';

const runs = process.env.SCANTLING_LONG ? 5000 : 250;
const seed = Number(process.env.SEED ?? 20261201);

describe(`any job (seed ${seed})`, () => {
  it('is laid out without a fault, whatever the options', () => {
    fc.assert(
      fc.property(anyJob, fc.integer({ min: 0, max: 30 }), (job, iterations) => {
        expect(verifyLayout(job, solve(job, { iterations }))).toEqual([]);
      }),
      { numRuns: runs, seed },
    );
  });

  it('comes out the same for the same seed and iterations', () => {
    fc.assert(
      fc.property(anyJob, (job) => {
        expect(solve(job, { iterations: 20, seed: 7 })).toEqual(
          solve(job, { iterations: 20, seed: 7 }),
        );
      }),
      { numRuns: runs / 5, seed },
    );
  });
});

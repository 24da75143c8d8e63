import { type Relaxation } from './columns';
import { quickPacking, take, type Rest } from './heuristics';
import { betterThan, missingOf, type Packing, type Pattern, type Problem } from './problem';

/** At which turn of a dive another than the likeliest way of cutting is taken, and which. */
export interface Turn {
  at: number;
  choice: number;
}

const stepsInADive = 200;

interface Course {
  rest: Rest;
  chosen: Packing['patterns'];
  cost: number;
}

const copy = (rest: Rest): Rest => ({ demand: [...rest.demand], bins: [...rest.bins] });

function fix(problem: Problem, course: Course, pattern: Pattern, times: number): void {
  take(course.rest, pattern, times);
  course.chosen.push({ pattern, times });
  course.cost += times * (problem.bins[pattern.bin]?.cost ?? 0);
}

/** The chosen patterns and whatever the simple rules make of the rest; pieces cut too many are left off. */
function finish(problem: Problem, course: Course, thorough: boolean): Packing {
  const tail = quickPacking(problem, course.rest, thorough);
  return {
    patterns: [...course.chosen, ...tail.patterns],
    cost: course.cost + tail.cost,
    missing: tail.missing,
  };
}

const goesIn = (rest: Rest, pattern: Pattern): boolean =>
  pattern.counts.every(([kind, n]) => n <= (rest.demand[kind] ?? 0));

/** The whole parts of the relaxation, or where there are none its largest fraction. Null when there is no such. */
function fixSome(
  problem: Problem,
  course: Course,
  ways: ReturnType<Relaxation['solution']>,
  choice: number,
): 'whole' | 'one' | null {
  let any = false;
  for (const { pattern, value } of ways) {
    const times = Math.min(Math.floor(value + 1e-6), course.rest.bins[pattern.bin] ?? 0);
    if (times <= 0) continue;
    fix(problem, course, pattern, times);
    any = true;
  }
  if (any) return 'whole';
  const likely = ways
    .filter(({ pattern }) => (course.rest.bins[pattern.bin] ?? 0) > 0)
    .map((way) => ({ ...way, fits: goesIn(course.rest, way.pattern) ? 1 : 0 }))
    .sort((a, b) => b.fits - a.fits || b.value - a.value);
  const way = likely[choice];
  if (!way) return null;
  fix(problem, course, way.pattern, 1);
  return 'one';
}

/**
 * From the relaxation downwards: fixes ways of cutting, the likeliest first, solves again for what is left, and goes back
 * a step (at most so many times) as soon as nothing better than `best` can come of it.
 */
export function dive(
  problem: Problem,
  relaxation: Relaxation,
  whole: Rest,
  turn: Turn,
  best: Packing | null,
  may: () => boolean,
): Packing | null {
  let found: Packing | null = best;
  let left = stepsInADive;
  const keep = (packing: Packing) => {
    if (betterThan(packing, found)) found = packing;
  };
  const hopeless = (course: Course): boolean => {
    const least = Math.ceil(relaxation.objective() / problem.grain - 1e-5) * problem.grain;
    return found !== null && missingOf(found) === 0 && course.cost + least >= found.cost;
  };
  const walk = (course: Course, depth: number): void => {
    left -= 1;
    if (!course.rest.demand.some((n) => n > 0)) return keep(finish(problem, course, false));
    if (!relaxation.solve(course.rest, 120) || hopeless(course)) return;
    const ways = relaxation.solution();
    const first = depth === turn.at ? turn.choice : 0;
    for (let choice = first; choice < first + 2; choice += 1) {
      const next = { rest: copy(course.rest), chosen: [...course.chosen], cost: course.cost };
      const fixed = fixSome(problem, next, ways, choice);
      if (!fixed) return keep(finish(problem, course, true));
      if (choice === first) keep(finish(problem, next, false));
      walk(next, depth + 1);
      if (left <= 0 || !may() || fixed === 'whole' || !relaxation.closed) return;
    }
  };
  walk({ rest: copy(whole), chosen: [], cost: 0 }, 0);
  return found;
}

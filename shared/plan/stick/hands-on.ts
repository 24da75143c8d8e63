/**
 * Starts and ends along the hands-on time, for a plan without a clip. Minutes not stated count as
 * the mean of the stated ones (or one minute where none is), so that every step has its stretch.
 */
export function handsOnTimes(minutes: readonly (number | null | undefined)[]): {
  duration: number;
  stretches: { start: number; end: number }[];
} {
  const stated = minutes.filter(
    (m): m is number => typeof m === 'number' && Number.isFinite(m) && m > 0,
  );
  const mean = stated.length ? stated.reduce((a, b) => a + b, 0) / stated.length : 1;
  let at = 0;
  const stretches = minutes.map((m) => {
    const start = at;
    at += (typeof m === 'number' && Number.isFinite(m) && m > 0 ? m : mean) * 60;
    return { start, end: at };
  });
  return { duration: at, stretches };
}

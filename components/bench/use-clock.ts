import { useEffect, useState } from 'react';

/** Milliseconds now, renewed every `every` milliseconds; it stands while `every` is null. */
export function useClock(every: number | null): number {
  const [now, setNow] = useState(() => Date.now());
  useEffect(() => {
    if (every === null) return;
    const tick = () => setNow(Date.now());
    const first = setTimeout(tick, 0);
    const timer = setInterval(tick, every);
    return () => {
      clearTimeout(first);
      clearInterval(timer);
    };
  }, [every]);
  return now;
}

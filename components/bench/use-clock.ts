import { useEffect, useState } from 'react';

/** Milliseconds now, renewed every `every` milliseconds. */
export function useClock(every: number): number {
  const [now, setNow] = useState(() => Date.now());
  useEffect(() => {
    const timer = setInterval(() => setNow(Date.now()), every);
    return () => clearInterval(timer);
  }, [every]);
  return now;
}

import { useEffect, useState } from 'react';

/** Milliseconds of now, looked at again every so often: clocks of glue-ups go on while nobody touches the page. */
export function useNow(everyMs: number): number {
  const [now, setNow] = useState(() => Date.now());
  useEffect(() => {
    const timer = setInterval(() => setNow(Date.now()), everyMs);
    return () => clearInterval(timer);
  }, [everyMs]);
  return now;
}

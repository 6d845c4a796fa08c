import { useEffect, useState } from 'react';

/** The present, ms, anew each minute: what is left of a deadline stays true on an open page. */
export function useNow(): number {
  const [now, setNow] = useState(() => Date.now());
  useEffect(() => {
    const timer = setInterval(() => setNow(Date.now()), 60_000);
    return () => clearInterval(timer);
  }, []);
  return now;
}

import { useEffect, useState } from 'react';

const tick = 30_000;

/** The time, kept fresh enough for words like "3 minutes ago". */
export function useNow(): Date {
  const [now, setNow] = useState(() => new Date());
  useEffect(() => {
    const timer = setInterval(() => setNow(new Date()), tick);
    return () => clearInterval(timer);
  }, []);
  return now;
}

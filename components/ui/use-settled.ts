import { useEffect, useState } from 'react';

/** The value as it was once it stopped changing for `ms`. */
export function useSettled<Value>(value: Value, ms: number): Value {
  const [settled, setSettled] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => setSettled(value), ms);
    return () => clearTimeout(timer);
  }, [value, ms]);
  return settled;
}

/** True once `flag` has held for 300 ms: a wait shorter than that is not worth a word. */
export const useLong = (flag: boolean) => useSettled(flag, 300) && flag;

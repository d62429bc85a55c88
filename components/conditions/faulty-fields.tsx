import { createContext, useContext, useEffect, useMemo, useState, type ReactNode } from 'react';

/** Tells of a field that cannot be read, until what is returned is called. */
const Tell = createContext<() => () => void>(() => () => undefined);
const Count = createContext(0);

/** Knows whether any field inside cannot be read: what is shown is then of what stood there before. */
export function FaultyFields({ children }: { readonly children: ReactNode }) {
  const [count, setCount] = useState(0);
  const tell = useMemo(
    () => () => {
      setCount((before) => before + 1);
      return () => setCount((before) => before - 1);
    },
    [],
  );
  return (
    <Tell.Provider value={tell}>
      <Count.Provider value={count}>{children}</Count.Provider>
    </Tell.Provider>
  );
}

/** Whether a field on the screen holds something that cannot be read. */
export const useHasFaultyField = () => useContext(Count) > 0;

/** Tells the screen that this field cannot be read. */
export function useFaulty(isFaulty: boolean): void {
  const tell = useContext(Tell);
  useEffect(() => (isFaulty ? tell() : undefined), [isFaulty, tell]);
}

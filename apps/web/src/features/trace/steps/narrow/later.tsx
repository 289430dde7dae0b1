import { useEffect, useState, type ReactNode } from 'react';

/** What is there sooner than this needs no word of waiting, which would only flash by. */
const NOTICED_MS = 150;

/** Shows, and has read out, only what stands long enough to be noticed. */
export function Later({ children }: { children: ReactNode }) {
  const [late, setLate] = useState(false);
  useEffect(() => {
    const timer = setTimeout(() => setLate(true), NOTICED_MS);
    return () => clearTimeout(timer);
  }, []);
  return late ? children : null;
}

import { useEffect, useState } from 'react';

/** True once `active` has held for the time; a short wait shows nothing new. */
export function useLate(active: boolean, milliseconds = 400): boolean {
  const [late, setLate] = useState(false);
  useEffect(() => {
    if (!active) return undefined;
    const timer = setTimeout(() => setLate(true), milliseconds);
    return () => {
      clearTimeout(timer);
      setLate(false);
    };
  }, [active, milliseconds]);
  return active && late;
}

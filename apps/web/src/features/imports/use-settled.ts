import { useEffect, useState } from 'react';

/** A value once it has stood still for a while, so that not every letter typed asks the service. */
export function useSettled<T>(value: T, afterMs = 400): T {
  const [settled, setSettled] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => setSettled(value), afterMs);
    return () => clearTimeout(timer);
  }, [value, afterMs]);
  return settled;
}

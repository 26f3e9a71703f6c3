import { createContext, useContext, useSyncExternalStore } from 'react';

/** Tells the time in epoch milliseconds. Tests give their own. */
export type NowMs = () => number;

/** Where components take the time from. */
export const ClockContext = createContext<NowMs>(Date.now);

const TICK_MS = 10_000;

function everyTick(tell: () => void): () => void {
  const timer = setInterval(tell, TICK_MS);
  return () => clearInterval(timer);
}

/** The present instant in epoch ms, renewed every ten seconds (as fine as "4 min ago" needs). */
export function useNow(): number {
  const now = useContext(ClockContext);
  return useSyncExternalStore(everyTick, () => Math.floor(now() / TICK_MS) * TICK_MS);
}

import { useState } from 'react';
import type { BurningKind } from './public-status';

const KEY = 'my-stove';

/** Which stove the reader has; kept in this browser only, so that the next visit answers at once. */
export function useMyStove(
  kinds: readonly BurningKind[],
): [BurningKind | undefined, (kind: BurningKind) => void] {
  const [chosen, setChosen] = useState(() => window.localStorage.getItem(KEY));
  const known = kinds.find((kind) => kind === chosen) ?? kinds[0];
  const choose = (kind: BurningKind) => {
    window.localStorage.setItem(KEY, kind);
    setChosen(kind);
  };
  return [known, choose];
}

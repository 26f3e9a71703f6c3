import { useRef } from 'react';

/** 128 random bits as hex. Not `randomUUID`: browsers offer that over https only, and an office may run on plain http. */
const randomKey = (): string =>
  Array.from(crypto.getRandomValues(new Uint8Array(16)), (byte) => byte.toString(16).padStart(2, '0')).join(
    '',
  );

/**
 * A key that stays the same for one act on one screen, so that the service does it once however often it is asked
 * (double click, a retry after a lost answer). `renew` makes another for a different act.
 */
export function useRequestKey(): { key: () => string; renew: () => void } {
  const held = useRef<string | null>(null);
  return {
    key: () => (held.current ??= randomKey()),
    renew: () => {
      held.current = null;
    },
  };
}

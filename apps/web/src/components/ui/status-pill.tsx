import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { StateShape, type StateName } from './state-shape';

/** The words of the states. "No restriction", never "clear" or "clean": smoke may hang without an order. */
export const STATE_WORDS: Record<StateName, string> = {
  none: 'No restriction',
  advisory: 'Advisory',
  burnBan: 'Burn ban',
  suspended: 'Suspended',
  unknown: 'Not known',
};

const Pill = chakra('span', {
  base: {
    display: 'inline-flex',
    alignItems: 'center',
    gap: '1.5',
    py: '0.5',
    ps: '2',
    pe: '2.5',
    borderRadius: 'full',
    fontWeight: '600',
    fontSize: 'sm',
    whiteSpace: 'nowrap',
  },
  variants: {
    state: {
      none: { bg: 'none-soft', color: 'none' },
      advisory: { bg: 'advisory-soft', color: 'advisory' },
      burnBan: { bg: 'ban-soft', color: 'ban' },
      suspended: { bg: 'suspended-soft', color: 'suspended' },
      unknown: {
        bg: 'unknown-soft',
        color: 'unknown',
        outline: '1px dashed currentColor',
        outlineOffset: '-1px',
      },
    },
  },
});

/** A state as word, shape and colour. `children` replaces the usual word. */
export function StatusPill({ state, children }: { state: StateName; children?: ReactNode }) {
  return (
    <Pill state={state}>
      <StateShape state={state} />
      {children ?? STATE_WORDS[state]}
    </Pill>
  );
}

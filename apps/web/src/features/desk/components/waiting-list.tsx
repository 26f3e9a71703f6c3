import { Box, Stack } from '@chakra-ui/react';
import { AnimatePresence, m } from 'framer-motion';
import type { ProposalCard } from '../../../lib/api/types';
import { WaitingCard } from './waiting-card';

/** What needs a person, newest first: proposals that wait for the analyst, then those that wait for an officer. */
export function WaitingList({
  proposals,
  zoneOf,
}: {
  proposals: ProposalCard[];
  zoneOf: (districtId: number) => string;
}) {
  const mine = proposals.filter(({ state }) => state === 'open' || state === 'returned');
  const officers = proposals.filter(({ state }) => state === 'confirmed');
  if (proposals.length === 0) {
    return <Box color="mute">Nothing waits for a decision.</Box>;
  }
  return (
    <Stack as="section" aria-label="Waiting for a decision" gap="2">
      <AnimatePresence initial={false}>
        {[...mine, ...officers].map((card) => (
          <m.div
            key={card.id}
            layout="position"
            initial={{ opacity: 0, y: -8 }}
            animate={{ opacity: 1, y: 0 }}
            exit={{ opacity: 0, transition: { duration: 0.15 } }}
          >
            <WaitingCard card={card} zone={zoneOf(card.districtId)} />
          </m.div>
        ))}
      </AnimatePresence>
    </Stack>
  );
}

import { Box, Flex } from '@chakra-ui/react';
import { paths } from '../../../app/paths';
import { ButtonLink } from '../../../components/ui/button';
import { Card } from '../../../components/ui/card';
import { PartTitle } from '../../../components/ui/heading';
import { AgoText } from '../../../components/ui/time-text';
import type { ProposalCard } from '../../../lib/api/types';
import { proposalQuestion } from '../../../lib/words';

/** One proposal as the desk shows it: the question, the evidence in a line, and the way to decide. */
export function WaitingCard({ card, zone }: { card: ProposalCard; zone: string }) {
  const confirmed = card.state === 'confirmed';
  return (
    <Card edge={confirmed ? undefined : 'lid'} padded>
      <Flex gap="4" align="center" direction={{ base: 'column', md: 'row' }}>
        <Box flex="1" minW="0" width="100%">
          <PartTitle>{proposalQuestion(card)}</PartTitle>
          <Box color="mute" mt="0.5">
            {card.summary}{' '}
            {confirmed ? (
              <>Confirmed by {card.confirmedBy}; waits for the officer.</>
            ) : (
              <>
                {card.state === 'returned' && 'Returned by the officer. '}Opened{' '}
                <AgoText at={card.openedAt} zone={zone} />.
              </>
            )}
          </Box>
        </Box>
        <ButtonLink
          to={paths.proposal(card.id)}
          kind={confirmed ? 'plain' : 'go'}
          width={{ base: '100%', md: 'auto' }}
          aria-label={`${confirmed ? 'Read' : 'Read and decide'}: ${proposalQuestion(card)}`}
        >
          {confirmed ? 'Read' : 'Read and decide'}
        </ButtonLink>
      </Flex>
    </Card>
  );
}

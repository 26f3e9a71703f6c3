import { Box, Stack } from '@chakra-ui/react';
import { paths } from '../../../app/paths';
import { Empty } from '../../../components/states/empty';
import { Loaded } from '../../../components/states/loaded';
import { ButtonLink } from '../../../components/ui/button';
import { Card } from '../../../components/ui/card';
import { PartTitle } from '../../../components/ui/heading';
import { StateShape } from '../../../components/ui/state-shape';
import { AgoText } from '../../../components/ui/time-text';
import type { ProposalCard } from '../../../lib/api/types';
import { useDistricts } from '../../../lib/api/use-districts';
import { proposalQuestion } from '../../../lib/words';
import { useProposals } from '../api';

/** What waits for this officer: the confirmed proposals of their own districts. */
export function WaitingForOfficer({ districtIds }: { districtIds: readonly number[] }) {
  const proposals = useProposals('confirmed');
  const { data: districts } = useDistricts();
  const zoneOf = (id: number) => districts?.find((district) => district.id === id)?.timeZone ?? 'UTC';
  return (
    <Loaded from={proposals} what="what waits for you">
      {({ items }) => {
        const mine = items.filter(({ districtId }) => districtIds.includes(districtId));
        if (mine.length === 0) {
          return (
            <Empty title="Nothing waits for you">
              A proposal appears here once an analyst has confirmed it.
            </Empty>
          );
        }
        return (
          <Stack gap="2.5">
            {mine.map((card) => (
              <WaitingCard key={card.id} card={card} zone={zoneOf(card.districtId)} />
            ))}
          </Stack>
        );
      }}
    </Loaded>
  );
}

function WaitingCard({ card, zone }: { card: ProposalCard; zone: string }) {
  return (
    <Card padded edge={card.kind === 'burnBan' ? 'ban' : 'lid'}>
      <PartTitle display="flex" gap="2" alignItems="center">
        <StateShape state={card.act === 'end' ? 'none' : card.kind} size={20} />
        {proposalQuestion(card)}
      </PartTitle>
      <Box color="mute" mt="1">
        {card.note && `“${card.note}” `}
        {card.confirmedBy}
        {card.confirmedAt && (
          <>
            , <AgoText at={card.confirmedAt} zone={zone} />
          </>
        )}
      </Box>
      <Box mt="1">{card.summary}</Box>
      <ButtonLink
        to={paths.proposal(card.id)}
        kind="go"
        wide
        mt="3"
        aria-label={`Read and decide: ${proposalQuestion(card)}`}
      >
        Read and decide
      </ButtonLink>
    </Card>
  );
}

import { Box, Grid, Stack } from '@chakra-ui/react';
import { ProfileView } from '../../../components/air-column/profile-view';
import { ClauseList } from '../../../components/evidence/clause-list';
import { Card } from '../../../components/ui/card';
import { PartTitle } from '../../../components/ui/heading';
import type { Me, ProposalDetail } from '../../../lib/api/types';
import { dayAndTime } from '../../../lib/format/time';
import { DecisionPanel } from './decision-panel';
import { ProposalHistory } from './proposal-history';
import { ProposalLead } from './proposal-lead';

interface ProposalViewProps {
  proposal: ProposalDetail;
  me: Me;
  zone: string;
  onAnswer: () => void;
}

/** A proposal for both who decide: on a phone from top to bottom, at a desk the decision beside the evidence. */
export function ProposalView({ proposal, me, zone, onAnswer }: ProposalViewProps) {
  const { evidence, profile, history, rule, tEnd } = proposal;
  return (
    <Grid
      gap="4"
      alignItems="start"
      templateColumns={{ base: 'minmax(0, 1fr)', lg: 'minmax(0, 1fr) minmax(360px, 440px)' }}
      templateAreas={{ base: '"why" "decide" "more"', lg: '"why decide" "more decide"' }}
      templateRows={{ lg: 'auto 1fr' }}
    >
      <Stack gridArea="why" gap="4" minW="0">
        <ProposalLead proposal={proposal} zone={zone} />
        <Card padded>
          <PartTitle mb="2">Why: the rule’s own clauses</PartTitle>
          <ClauseList tree={evidence.tree} />
          <Box color="mute" fontSize="sm" mt="2">
            Rule version {rule.version}, as found at {dayAndTime(tEnd, zone)}. Evidence{' '}
            {evidence.sha256.slice(0, 12)}
          </Box>
        </Card>
      </Stack>
      <Card gridArea="decide" padded edge="lid" minW="0">
        <DecisionPanel proposal={proposal} me={me} zone={zone} onAnswer={onAnswer} />
      </Card>
      <Stack gridArea="more" gap="4" minW="0">
        {profile && (
          <Card padded>
            <PartTitle mb="2">Profile, {dayAndTime(profile.tEnd, zone)}</PartTitle>
            <ProfileView profile={profile} width={460} height={300} />
          </Card>
        )}
        <Card padded>
          <PartTitle mb="2">What was done so far</PartTitle>
          <ProposalHistory entries={history} zone={zone} />
        </Card>
      </Stack>
    </Grid>
  );
}

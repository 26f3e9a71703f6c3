import { Box, Grid } from '@chakra-ui/react';
import { AirColumn } from '../../../components/air-column';
import { headlineNumbers } from '../../../components/evidence/headline-numbers';
import type { ProposalDetail } from '../../../lib/api/types';
import { clockTime } from '../../../lib/format/time';

/** What is proposed, who confirmed it and why, and the two or three numbers beside the air column. */
export function ProposalLead({ proposal, zone }: { proposal: ProposalDetail; zone: string }) {
  const { profile, evidence, confirmedBy, confirmedAt, note, summary } = proposal;
  const inversion = profile?.inversion;
  return (
    <Box>
      <Box color="mute">
        {confirmedBy && confirmedAt ? (
          <>
            Confirmed by {confirmedBy}, {clockTime(confirmedAt, zone)}: “{note}”
          </>
        ) : (
          summary
        )}
      </Box>
      <Grid templateColumns="96px 1fr" gap="4" alignItems="center" mt="3.5">
        <AirColumn
          size="medium"
          levels={profile?.levels ?? []}
          known={profile !== null && profile.surface !== 'not known'}
          lid={inversion ? { topM: inversion.topM, open: inversion.open } : null}
        />
        <Box as="dl" m="0">
          {headlineNumbers(evidence.tree, profile).map(({ value, what }, index) => (
            <Box key={what} display="flex" flexDirection="column-reverse" mt={index === 0 ? '0' : '1.5'}>
              <Box as="dt" color="mute" fontSize="sm">
                {what}
              </Box>
              <Box as="dd" m="0" fontWeight="600" lineHeight="1.15" fontSize={index === 0 ? '2xl' : 'lg'}>
                {value}
              </Box>
            </Box>
          ))}
        </Box>
      </Grid>
    </Box>
  );
}

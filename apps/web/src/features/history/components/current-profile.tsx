import { Box, Flex, Stack } from '@chakra-ui/react';
import { ProfileView } from '../../../components/air-column/profile-view';
import { Empty } from '../../../components/states/empty';
import { Failed } from '../../../components/states/failed';
import { Loading } from '../../../components/states/loading';
import { Card } from '../../../components/ui/card';
import { PartTitle } from '../../../components/ui/heading';
import { TimeText } from '../../../components/ui/time-text';
import type { District, Profile } from '../../../lib/api/types';
import { useApi } from '../../../lib/api/use-api';
import { LayerTable } from './layer-table';

/** The newest profile of the tower that speaks first for the district, with adiabats, and its layers as numbers. */
export function CurrentProfile({ district }: { district: District }) {
  const towerId = district.towers[0]?.towerId;
  const { data, error, mutate } = useApi<Profile>(
    towerId === undefined ? null : `/api/towers/${towerId}/profile`,
    {
      live: true,
    },
  );
  return (
    <Card padded>
      <Stack gap="2">
        <Flex justify="space-between" wrap="wrap" gap="2" align="baseline">
          <PartTitle>Profile now</PartTitle>
          {data && (
            <Box color="mute" fontSize="sm">
              <TimeText at={data.tEnd} zone={district.timeZone} />
            </Box>
          )}
        </Flex>
        {!data && !error && towerId !== undefined && (
          <Loading label="the profile" rows={1} rowHeight="300px" />
        )}
        {towerId === undefined && <Empty title="No tower speaks for this district" />}
        {error?.status === 404 && (
          <Empty title="No profile yet">It appears with the first closed block of readings.</Empty>
        )}
        {error && error.status !== 404 && !data && (
          <Failed what="the profile" problem={error} onRetry={() => void mutate()} />
        )}
        {data && (
          <Flex gap="6" wrap="wrap" align="flex-start">
            <ProfileView profile={data} width={480} height={320} />
            <LayerTable profile={data} />
          </Flex>
        )}
      </Stack>
    </Card>
  );
}

import { Box, chakra, Flex } from '@chakra-ui/react';
import { ProfileView } from '../../../components/air-column/profile-view';
import { Loaded } from '../../../components/states/loaded';
import { Loading } from '../../../components/states/loading';
import { Empty } from '../../../components/states/empty';
import { Card } from '../../../components/ui/card';
import { PartTitle } from '../../../components/ui/heading';
import { RangeText } from '../../../components/ui/range-text';
import { useApi } from '../../../lib/api/use-api';
import type { DistrictAir, Profile } from '../../../lib/api/types';
import { clockTime } from '../../../lib/format/time';
import { FindingSentence } from './finding-sentence';

const Row = chakra(Flex, {
  base: {
    justifyContent: 'space-between',
    gap: '4',
    py: '1.5',
    borderTopWidth: '1px',
    borderColor: 'line',
    fontSize: 'sm',
  },
});

/** The chosen district: its profile at full size and what follows from it. */
export function DistrictDetail({ air }: { air: DistrictAir }) {
  const profile = useApi<Profile>(air.speaker ? `/api/towers/${air.speaker.towerId}/profile` : null, {
    live: true,
  });
  return (
    <Card padded aria-label={`${air.name} in detail`}>
      <Flex justify="space-between" align="baseline" gap="3">
        <PartTitle>{air.name}</PartTitle>
        <Box color="mute" fontSize="sm">
          {air.speaker?.name}
          {air.speaker && air.tEnd && `, ${clockTime(air.tEnd, air.timeZone)}`}
        </Box>
      </Flex>
      <Box my="1.5">
        <FindingSentence air={air} />
      </Box>
      {air.speaker ? (
        <Loaded
          from={profile}
          what="the profile"
          loading={<Loading label="the profile" rows={1} rowHeight="260px" />}
        >
          {(data) => <ProfileView profile={data} width={340} height={264} />}
        </Loaded>
      ) : (
        <Empty title="Not known">{air.reason ?? 'No tower speaks for this district now.'}</Empty>
      )}
      <Box mt="3">
        <Row>
          <span>Heat deficit</span>
          <RangeText value={air.heatDeficitMJPerM2} decimals={2} unit="MJ/m²" />
        </Row>
        <Row>
          <span>Breaks at the ground above</span>
          <RangeText value={air.breakUpTemperatureC} unit="°C" />
        </Row>
        <Row>
          <span>Mixing height at the forecast high</span>
          <RangeText value={air.mixingHeightM} decimals={0} unit="m" />
        </Row>
        <Row>
          <span>Forecast low of the night</span>
          <RangeText value={air.forecastLowC} unit="°C" />
        </Row>
        <Row>
          <span>Forecast wind of the night</span>
          <RangeText value={air.forecastWindMPerS} unit="m/s" />
        </Row>
        <Row>
          <span>PM2.5 over 24 hours</span>
          <RangeText value={air.pm25Running24h} decimals={0} unit="µg/m³" />
        </Row>
        <Row>
          <span>Wind</span>
          <RangeText value={air.windSpeedMPerS} unit="m/s" />
        </Row>
      </Box>
    </Card>
  );
}

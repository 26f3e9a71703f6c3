import { Flex } from '@chakra-ui/react';
import { paths } from '../../../app/paths';
import { StrengthHistory } from '../../../components/charts/strength-history';
import { Loaded } from '../../../components/states/loaded';
import { Loading } from '../../../components/states/loading';
import { Card } from '../../../components/ui/card';
import { PartTitle } from '../../../components/ui/heading';
import { TextLink } from '../../../components/ui/text-link';
import type { DistrictAir } from '../../../lib/api/types';
import { useDistrictHistory } from '../../../lib/api/use-district-history';
import { useNow } from '../../../lib/clock';

const SPAN_MS = 48 * 3_600_000;
const STEP_MS = 15 * 60_000;

/** The last two nights of the chosen district. */
export function DeskHistory({ air }: { air: DistrictAir }) {
  const end = Math.ceil(useNow() / STEP_MS) * STEP_MS;
  const span = { from: new Date(end - SPAN_MS).toISOString(), to: new Date(end).toISOString() };
  const history = useDistrictHistory(air.districtId, span, { live: true });
  return (
    <Card padded minW="0">
      <Flex justify="space-between" align="baseline" wrap="wrap" gap="2" mb="2">
        <PartTitle>Strength of the surface inversion, {air.name}</PartTitle>
        <TextLink to={`${paths.history}?district=${air.slug}`}>Longer spans</TextLink>
      </Flex>
      <Loaded
        from={history}
        what="the history"
        loading={<Loading label="the history" rows={1} rowHeight="230px" />}
      >
        {(data) => <StrengthHistory history={data} name={air.name} height={210} />}
      </Loaded>
    </Card>
  );
}

import { Box, Grid, Stack } from '@chakra-ui/react';
import { useSearchParams } from 'react-router-dom';
import { Empty } from '../../../components/states/empty';
import type { Desk } from '../../../lib/api/types';
import { DeskHistory } from './desk-history';
import { DistrictCards } from './district-cards';
import { DistrictDetail } from './district-detail';
import { DistrictTable } from './district-table';
import { WaitingList } from './waiting-list';

/** The desk: what waits, every district's air, the chosen one beside it, its last two nights below. */
export function DeskView({ desk }: { desk: Desk }) {
  const [search, setSearch] = useSearchParams();
  const { districts, proposals } = desk;
  const chosen = districts.find(({ slug }) => slug === search.get('district')) ?? districts[0];
  const choose = (slug: string) => setSearch({ district: slug }, { replace: true, preventScrollReset: true });
  const zoneOf = (id: number) => districts.find(({ districtId }) => districtId === id)?.timeZone ?? 'UTC';
  if (!chosen) {
    return <Empty title="No district yet">An administrator adds districts and their towers first.</Empty>;
  }
  return (
    <Stack gap="4">
      <WaitingList proposals={proposals} zoneOf={zoneOf} />
      <Grid
        gap="4"
        alignItems="start"
        templateColumns={{ base: 'minmax(0, 1fr)', xl: 'minmax(0, 1fr) 384px' }}
        templateAreas={{ base: '"districts" "detail" "history"', xl: '"districts detail" "history detail"' }}
        templateRows={{ xl: 'auto 1fr' }}
      >
        <Box gridArea="districts" minW="0">
          <DistrictTable districts={districts} chosenId={chosen.districtId} onChoose={choose} />
          <DistrictCards districts={districts} chosenId={chosen.districtId} onChoose={choose} />
        </Box>
        <Box gridArea="detail" minW="0">
          <DistrictDetail key={chosen.districtId} air={chosen} />
        </Box>
        <Box gridArea="history" minW="0">
          <DeskHistory air={chosen} />
        </Box>
      </Grid>
    </Stack>
  );
}

import { Flex, Stack } from '@chakra-ui/react';
import { paths } from '../app/paths';
import { PageHead } from '../components/layout/page-head';
import { ButtonLink } from '../components/ui/button';
import { Card } from '../components/ui/card';
import { PartTitle } from '../components/ui/heading';
import { TextLink } from '../components/ui/text-link';
import { TroubleList } from '../features/freshness/components/trouble-list';
import { ImportList } from '../features/imports/components/import-list';
import { TowerList } from '../features/imports/components/tower-list';
import { useDistricts } from '../lib/api/use-districts';
import { useMe } from '../lib/api/use-me';

/** Where readings come from and how they stand: the towers, what came in, and the way to bring a file. */
export function ReadingsPage() {
  const { me } = useMe();
  const zone = useDistricts().data?.[0]?.timeZone ?? 'UTC';
  const act = me && (
    <Flex gap="4" align="center" wrap="wrap">
      <TextLink to={paths.forecasts}>Forecasts</TextLink>
      {me.role !== 'officer' && (
        <ButtonLink kind="go" to={paths.importFile()}>
          Import a file
        </ButtonLink>
      )}
    </Flex>
  );
  return (
    <>
      <PageHead title="Readings" aside={act} />
      <Stack gap="4">
        <Card padded>
          <Flex justify="space-between" align="baseline" gap="3" mb="2">
            <PartTitle>Towers</PartTitle>
            {me && me.role !== 'officer' && <TextLink to={paths.adminTowers}>Towers and sensors</TextLink>}
          </Flex>
          <TowerList zone={zone} />
        </Card>
        <Card padded>
          <PartTitle mb="2">Troubles</PartTitle>
          <TroubleList zone={zone} />
        </Card>
        <Card padded>
          <PartTitle mb="2">What came in</PartTitle>
          <ImportList zone={zone} />
        </Card>
      </Stack>
    </>
  );
}

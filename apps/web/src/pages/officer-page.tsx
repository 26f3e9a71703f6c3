import { Stack } from '@chakra-ui/react';
import { PageHead } from '../components/layout/page-head';
import { PartTitle } from '../components/ui/heading';
import { InForceList } from '../features/notices/components/in-force-list';
import { WaitingForOfficer } from '../features/proposals/components/waiting-for-officer';
import { useMe } from '../lib/api/use-me';

/** Where an officer's work begins: what waits for a decision, and what is in force in their districts. */
export function OfficerPage() {
  const { me } = useMe();
  if (!me) return null;
  const districtIds = me.districts.map(({ id }) => id);
  return (
    <>
      <PageHead title="Decisions" aside={me.districts.map(({ name }) => name).join(' · ')} />
      <Stack gap="6" maxW="760px">
        <Stack as="section" gap="2.5">
          <PartTitle>Waiting for you</PartTitle>
          <WaitingForOfficer districtIds={districtIds} />
        </Stack>
        <Stack as="section" gap="2.5">
          <PartTitle>In force in your districts</PartTitle>
          <InForceList districtIds={districtIds} />
        </Stack>
      </Stack>
    </>
  );
}

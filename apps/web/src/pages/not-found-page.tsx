import { Box } from '@chakra-ui/react';
import { paths } from '../app/paths';
import { PageHead } from '../components/layout/page-head';
import { TextLink } from '../components/ui/text-link';

/** An address that leads nowhere, and the way back. */
export function NotFoundPage() {
  return (
    <Box as="main" p="6">
      <PageHead title="No such page" />
      <p>
        The address may be mistyped or old.{' '}
        <TextLink to={paths.home}>See what holds in each district</TextLink>.
      </p>
    </Box>
  );
}

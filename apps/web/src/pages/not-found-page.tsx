import { Box } from '@chakra-ui/react';
import { Link } from 'react-router-dom';
import { paths } from '../app/paths';
import { PageHead } from '../components/layout/page-head';

/** An address that leads nowhere, and the way back. */
export function NotFoundPage() {
  return (
    <Box as="main" p="6">
      <PageHead title="No such page" />
      <p>
        The address may be mistyped or old. <Link to={paths.home}>See what holds in each district</Link>.
      </p>
    </Box>
  );
}

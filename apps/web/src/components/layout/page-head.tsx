import { Box, Flex } from '@chakra-ui/react';
import { useEffect, type ReactNode } from 'react';
import { PageTitle } from '../ui/heading';

interface PageHeadProps {
  /** The page's name, also the window's. */
  title: string;
  /** What stands beside it: the time, the freshness. */
  aside?: ReactNode;
}

/** The head of a staff page: its title, which is also the window's, and what belongs beside it. */
export function PageHead({ title, aside }: PageHeadProps) {
  useEffect(() => {
    document.title = `${title} · Lidwatch`;
  }, [title]);
  return (
    <Flex justify="space-between" align="baseline" wrap="wrap" columnGap="4" rowGap="1" mb="4">
      <PageTitle>{title}</PageTitle>
      {aside && (
        <Box color="mute" fontSize={{ base: 'sm', md: 'md' }}>
          {aside}
        </Box>
      )}
    </Flex>
  );
}

import { Box, Flex } from '@chakra-ui/react';
import { useEffect, type ReactNode } from 'react';
import { Card } from '../../../components/ui/card';
import { PageTitle } from '../../../components/ui/heading';
import { Mark } from '../../../components/ui/mark';
import { TextLink } from '../../../components/ui/text-link';
import { paths } from '../../../app/paths';

/** The frame of the way in: the mark, one card, and the way back to the residents' pages. */
export function EntryFrame({ title, children }: { title: string; children: ReactNode }) {
  useEffect(() => {
    document.title = `${title} · Lidwatch`;
  }, [title]);
  return (
    <Flex
      as="main"
      direction="column"
      align="center"
      minH="100dvh"
      px="3.5"
      py={{ base: '6', md: '16' }}
      gap="5"
    >
      <Flex align="center" gap="2.5" fontSize="xl" fontWeight="600">
        <Mark size={32} /> Lidwatch
      </Flex>
      <Card width="100%" maxW="420px" px={{ base: '4', md: '6' }} py="6">
        <PageTitle mb="4">{title}</PageTitle>
        {children}
      </Card>
      <Box fontSize="sm">
        <TextLink to={paths.home}>May I burn today? The residents’ page</TextLink>
      </Box>
    </Flex>
  );
}

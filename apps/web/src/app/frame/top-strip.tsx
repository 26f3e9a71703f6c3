import { HStack } from '@chakra-ui/react';
import type { Me } from '../../lib/api/types';
import { Mark } from '../../components/ui/mark';
import { PersonMenu } from './person-menu';

/** The head of the page on a phone. */
export function TopStrip({ me }: { me: Me }) {
  return (
    <HStack
      as="header"
      data-screen-only
      hideFrom="lg"
      px="3.5"
      py="2"
      borderBottomWidth="1px"
      borderColor="line"
      gap="2"
    >
      <Mark size={24} />
      <strong>Lidwatch</strong>
      <HStack ms="auto">
        <PersonMenu me={me} compact />
      </HStack>
    </HStack>
  );
}

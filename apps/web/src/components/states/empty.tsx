import { Box } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { SmallTitle } from '../ui/heading';

/** Nothing to show, said as what it is, with what may be done about it. */
export function Empty({ title, children }: { title: string; children?: ReactNode }) {
  return (
    <Box
      borderWidth="1px"
      borderStyle="dashed"
      borderColor="edge"
      borderRadius="l3"
      px="5"
      py="6"
      textAlign="center"
    >
      <SmallTitle as="p">{title}</SmallTitle>
      {children && (
        <Box color="mute" mt="1" maxW="60ch" mx="auto">
          {children}
        </Box>
      )}
    </Box>
  );
}

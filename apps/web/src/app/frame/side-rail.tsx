import { Box, HStack, Stack } from '@chakra-ui/react';
import type { Me } from '../../lib/api/types';
import { Mark } from '../../components/ui/mark';
import { NavIcon } from './nav-icon';
import { PlaceLink } from './nav-link';
import { placesOf } from './navigation';
import { PersonMenu } from './person-menu';

/** The navigation at desk width. */
export function SideRail({ me }: { me: Me }) {
  return (
    <Box
      as="aside"
      data-screen-only
      hideBelow="lg"
      position="sticky"
      top="0"
      h="100dvh"
      borderInlineEndWidth="1px"
      borderColor="line"
      px="3"
      py="4"
    >
      <Stack h="100%" gap="5">
        <HStack gap="2" px="2" fontSize="lg" fontWeight="600">
          <Mark />
          Lidwatch
        </HStack>
        <Stack as="nav" aria-label="Main" gap="1" flex="1">
          {placesOf[me.role].map(({ to, name, icon }) => (
            <PlaceLink key={to} to={to} place="rail">
              <NavIcon name={icon} />
              {name}
            </PlaceLink>
          ))}
        </Stack>
        <PersonMenu me={me} />
      </Stack>
    </Box>
  );
}

import { HStack } from '@chakra-ui/react';
import type { Me } from '../../lib/api/types';
import { NavIcon } from './nav-icon';
import { PlaceLink } from './nav-link';
import { placesOf } from './navigation';

/** The navigation on a phone, within reach of the thumb. */
export function BottomBar({ me }: { me: Me }) {
  return (
    <HStack
      as="nav"
      aria-label="Main"
      data-screen-only
      hideFrom="lg"
      position="fixed"
      zIndex="docked"
      insetX="0"
      bottom="0"
      gap="1"
      px="2"
      pt="1"
      pb="max(4px, env(safe-area-inset-bottom))"
      bg="card"
      borderTopWidth="1px"
      borderColor="line"
    >
      {placesOf[me.role].map(({ to, name, icon }) => (
        <PlaceLink key={to} to={to} place="bar">
          <NavIcon name={icon} />
          {name}
        </PlaceLink>
      ))}
    </HStack>
  );
}

import { chakra } from '@chakra-ui/react';
import { NavLink as RouterNavLink } from 'react-router-dom';

/** A link of the navigation; the place one is at is marked by ground, weight and `aria-current`. */
export const PlaceLink = chakra(RouterNavLink, {
  base: {
    display: 'flex',
    alignItems: 'center',
    color: 'ink',
    textDecoration: 'none',
    borderRadius: 'l2',
    '&[aria-current=page]': { bg: 'air-soft', color: 'air', fontWeight: '600' },
    _hover: { bg: 'raised' },
  },
  variants: {
    place: {
      rail: { gap: '2.5', px: '3', py: '2' },
      bar: {
        flexDirection: 'column',
        gap: '0.5',
        flex: '1',
        minW: '0',
        py: '1.5',
        fontSize: 'xs',
        justifyContent: 'center',
      },
    },
  },
});

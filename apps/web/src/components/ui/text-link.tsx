import { chakra } from '@chakra-ui/react';
import { Link } from 'react-router-dom';

/** A link within text: coloured and underlined, so that it is seen without colour too. */
export const TextLink = chakra(Link, {
  base: {
    color: 'air',
    textDecoration: 'underline',
    textUnderlineOffset: '3px',
    _hover: { color: 'air-strong' },
  },
});

import { ChakraProvider } from '@chakra-ui/react/styled-system';
import { Outlet } from 'react-router-dom';
import { system } from '../theme/system';

/** The design system around the pages that need it: sign-in and everything staff do. Residents do not fetch it. */
export function ChakraFrame() {
  return (
    <ChakraProvider value={system}>
      <Outlet />
    </ChakraProvider>
  );
}

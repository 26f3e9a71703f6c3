import { Box } from '@chakra-ui/react';
import { LazyMotion } from 'framer-motion';
import { Navigate, Outlet, useLocation } from 'react-router-dom';
import { paths } from '../paths';
import { SessionEnded } from '../../features/auth/components/session-ended';
import { useMe } from '../../lib/api/use-me';
import { Failed } from '../../components/states/failed';
import { Loading } from '../../components/states/loading';
import { BottomBar } from './bottom-bar';
import { SideRail } from './side-rail';
import { TopStrip } from './top-strip';

const motionFeatures = () => import('./motion-features').then(({ domAnimation }) => domAnimation);

/** The frame around staff pages: a side rail at desk width, a strip above and a bar below on a phone. */
export function StaffFrame() {
  const { me, error, mutate } = useMe();
  const { pathname, search } = useLocation();
  if (me === null) return <Navigate to={paths.signIn} state={{ from: pathname + search }} replace />;
  if (me === undefined) {
    return (
      <Box p="6">
        {error ? (
          <Failed what="this page" problem={error} onRetry={() => void mutate()} />
        ) : (
          <Loading label="your page" />
        )}
      </Box>
    );
  }
  return (
    <LazyMotion features={motionFeatures} strict>
      <SkipLink />
      <Box display={{ lg: 'grid' }} gridTemplateColumns={{ lg: '184px minmax(0, 1fr)' }} minH="100dvh">
        <SideRail me={me} />
        <TopStrip me={me} />
        <Box
          as="main"
          id="main"
          tabIndex={-1}
          outline="0"
          minW="0"
          px={{ base: '3.5', md: '6' }}
          pt={{ base: '3.5', md: '5' }}
          pb={{ base: '24', lg: '8' }}
          maxW="1480px"
        >
          <Outlet />
        </Box>
        <BottomBar me={me} />
      </Box>
      <SessionEnded />
    </LazyMotion>
  );
}

function SkipLink() {
  return (
    <Box
      asChild
      position="absolute"
      top="2"
      left="2"
      zIndex="skipNav"
      bg="card"
      px="3"
      py="2"
      transform="translateY(-200%)"
      _focus={{ transform: 'none' }}
    >
      <a href="#main">Skip to the page</a>
    </Box>
  );
}

import { Box, Menu, Portal } from '@chakra-ui/react';
import { useNavigate } from 'react-router-dom';
import { useSWRConfig } from 'swr';
import { paths } from '../paths';
import { api } from '../../lib/api/client';
import type { Me } from '../../lib/api/types';
import { ME } from '../../lib/api/use-me';
import { chooseColorMode, useColorMode, type ColorModeChoice } from '../../theme/color-mode';
import { Button } from '../../components/ui/button';
import { NavIcon } from './nav-icon';

const MODES: [ColorModeChoice, string][] = [
  ['light', 'Light'],
  ['dark', 'Dark'],
  ['system', 'As the system'],
];

/** Who is signed in, the colour mode, and the way out. */
export function PersonMenu({ me, compact = false }: { me: Me; compact?: boolean }) {
  const { choice } = useColorMode();
  const signOut = useSignOut();
  return (
    <Menu.Root positioning={{ placement: compact ? 'bottom-end' : 'top-start' }}>
      <Menu.Trigger asChild>
        <Button kind="quiet" size="sm" px="2" justifyContent="flex-start" color="ink" minH="10">
          <NavIcon name="person" />
          <Box textAlign="start" minW="0">
            <Box truncate>{me.name}</Box>
            {!compact && (
              <Box fontWeight="400" color="mute">
                {me.role}
              </Box>
            )}
          </Box>
        </Button>
      </Menu.Trigger>
      <Portal>
        <Menu.Positioner>
          <Menu.Content minW="200px" bg="card" borderWidth="1px" borderColor="line">
            <Menu.RadioItemGroup
              value={choice}
              onValueChange={({ value }) => chooseColorMode(value as ColorModeChoice)}
            >
              <Menu.ItemGroupLabel>Colours</Menu.ItemGroupLabel>
              {MODES.map(([mode, name]) => (
                <Menu.RadioItem key={mode} value={mode}>
                  {name}
                  <Menu.ItemIndicator />
                </Menu.RadioItem>
              ))}
            </Menu.RadioItemGroup>
            <Menu.Separator />
            <Menu.Item value="sign-out" onClick={() => void signOut()}>
              Sign out
            </Menu.Item>
          </Menu.Content>
        </Menu.Positioner>
      </Portal>
    </Menu.Root>
  );
}

/** Ends the session, forgets everything the API said to it, and goes to the sign-in page. */
function useSignOut() {
  const navigate = useNavigate();
  const { mutate } = useSWRConfig();
  return async () => {
    await api.post('/api/auth/sign-out');
    await navigate(paths.signIn);
    await mutate((key) => key !== ME, undefined, { revalidate: false });
    await mutate(ME, null, { revalidate: false });
  };
}

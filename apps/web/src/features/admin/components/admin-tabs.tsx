import { chakra, Flex } from '@chakra-ui/react';
import { NavLink } from 'react-router-dom';
import { paths } from '../../../app/paths';

const Tab = chakra(NavLink, {
  base: {
    px: '3',
    py: '2',
    fontWeight: '600',
    color: 'mute',
    borderBottomWidth: '3px',
    borderColor: 'transparent',
    textDecoration: 'none',
    '&.active': { color: 'ink', borderColor: 'air' },
  },
});

const TABS = [
  { to: paths.admin, name: 'People' },
  { to: paths.adminTowers, name: 'Towers' },
  { to: paths.adminDistricts, name: 'Districts and office' },
];

/** The parts of the administration. */
export function AdminTabs() {
  return (
    <Flex
      as="nav"
      aria-label="Administration"
      gap="1"
      mb="4"
      borderBottomWidth="1px"
      borderColor="line"
      wrap="wrap"
    >
      {TABS.map(({ to, name }) => (
        <Tab key={to} to={to} end={to === paths.admin}>
          {name}
        </Tab>
      ))}
    </Flex>
  );
}

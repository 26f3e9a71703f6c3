import { Flex } from '@chakra-ui/react';
import styled from '@emotion/styled';
import { NavLink } from 'react-router-dom';
import { paths } from '../../../app/paths';
import { useMe } from '../../../lib/api/use-me';

const Tab = styled(NavLink)({
  padding: '8px 12px',
  borderBottom: '3px solid transparent',
  color: 'var(--chakra-colors-mute)',
  fontWeight: 600,
  textDecoration: 'none',
  '&.active': { borderColor: 'var(--chakra-colors-air)', color: 'var(--chakra-colors-ink)' },
});

const TABS = [
  { to: paths.admin, name: 'People' },
  { to: paths.adminTowers, name: 'Towers' },
  { to: paths.adminDistricts, name: 'Districts and office' },
];

/** The parts of the administration; analysts keep the towers alone, so they see no tabs. */
export function AdminTabs() {
  const { me } = useMe();
  if (me?.role !== 'administrator') return null;
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

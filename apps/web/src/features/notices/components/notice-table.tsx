import { Box, chakra } from '@chakra-ui/react';
import { paths } from '../../../app/paths';
import { Card } from '../../../components/ui/card';
import { TextLink } from '../../../components/ui/text-link';
import type { NoticeRow } from '../../../lib/api/types';
import { dateAndTime } from '../../../lib/format/time';
import { isInForce, noticeStateWords } from '../notice-state';
import { KindPill } from './kind-pill';

const Th = chakra('th', {
  base: {
    fontSize: 'sm',
    fontWeight: '600',
    color: 'mute',
    textAlign: 'start',
    px: '3',
    py: '2',
    display: { base: 'none', md: 'table-cell' },
  },
});
/** On a phone each cell is a line of its row's card. */
const Td = chakra('td', {
  base: {
    display: { base: 'block', md: 'table-cell' },
    px: '3',
    py: { base: '0.5', md: '2' },
    borderTopWidth: { base: '0', md: '1px' },
    borderColor: 'line',
    verticalAlign: 'top',
  },
});
const Tr = chakra('tr', {
  base: {
    display: { base: 'grid', md: 'table-row' },
    gridTemplateColumns: '1fr 1fr',
    py: { base: '2.5', md: '0' },
    borderTopWidth: { base: '1px', md: '0' },
    borderColor: 'line',
    _first: { borderTopWidth: '0' },
  },
});

/** What a column's head says, where there are no columns. */
const OnPhone = chakra('span', { base: { display: { base: 'inline', md: 'none' }, color: 'mute' } });

/** Notices, one line each. */
export function NoticeTable({
  notices,
  zoneOf,
}: {
  notices: NoticeRow[];
  zoneOf: (districtId: number) => string;
}) {
  return (
    <Card overflow="hidden">
      <chakra.table width="100%" borderCollapse="collapse" display={{ base: 'block', md: 'table' }}>
        <chakra.thead display={{ base: 'none', md: 'table-header-group' }}>
          <tr>
            <Th>Notice</Th>
            <Th>District</Th>
            <Th>Kind</Th>
            <Th>Issued</Th>
            <Th>Until</Th>
            <Th>State</Th>
          </tr>
        </chakra.thead>
        <chakra.tbody display={{ base: 'block', md: 'table-row-group' }}>
          {notices.map((notice) => (
            <NoticeLine key={notice.id} notice={notice} zone={zoneOf(notice.districtId)} />
          ))}
        </chakra.tbody>
      </chakra.table>
    </Card>
  );
}

function NoticeLine({ notice, zone }: { notice: NoticeRow; zone: string }) {
  return (
    <Tr>
      <Td whiteSpace="nowrap">
        <TextLink to={paths.notice(notice.id)}>{notice.ref}</TextLink>
      </Td>
      <Td>{notice.districtName}</Td>
      <Td>
        <KindPill notice={notice} />
      </Td>
      <Td>
        <OnPhone>issued </OnPhone>
        {dateAndTime(notice.issuedAt, zone)}
        <Box color="mute" fontSize="sm">
          by {notice.issuedBy}
        </Box>
      </Td>
      <Td>
        <OnPhone>until </OnPhone>
        {dateAndTime(notice.endedAt ?? notice.expiresAt, zone)}
      </Td>
      <Td>
        <Box fontWeight={isInForce(notice) ? '600' : undefined}>{noticeStateWords(notice)}</Box>
        {notice.endedBy && (
          <Box color="mute" fontSize="sm">
            by {notice.endedBy}
          </Box>
        )}
      </Td>
    </Tr>
  );
}

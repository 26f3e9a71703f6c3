import type { ReactNode } from 'react';
import { Box, chakra } from '@chakra-ui/react';
import type { NoticeDetail } from '../../../lib/api/types';
import { dateAndTime } from '../../../lib/format/time';
import { noticeStateWords } from '../notice-state';
import { KindPill } from './kind-pill';

const Row = chakra('div', { base: { display: 'grid', gridTemplateColumns: '112px 1fr', gap: '3', py: '1' } });

const ORIGINS: Record<string, string> = {
  proposal: 'from a confirmed proposal',
  'by hand': 'by hand, without a proposal',
};

/** What a notice is: kind, state, times, by whom, why. */
export function NoticeFacts({ notice, zone }: { notice: NoticeDetail; zone: string }) {
  const { issuedAt, issuedBy, expiresAt, endedAt, endedBy, endReason, origin, reason } = notice;
  const facts: [string, ReactNode][] = [
    [
      'State',
      <>
        <KindPill notice={notice} /> {noticeStateWords(notice)}
      </>,
    ],
    ['Issued', `${dateAndTime(issuedAt, zone)} by ${issuedBy}, ${ORIGINS[origin] ?? origin}`],
    ['Reason', reason],
    ['Written end', dateAndTime(expiresAt, zone)],
  ];
  if (endedAt) facts.push(['Ended', `${dateAndTime(endedAt, zone)}${endedBy ? ` by ${endedBy}` : ''}`]);
  if (endReason) facts.push(['Why it ended', endReason]);
  return (
    <Box as="dl" m="0">
      {facts.map(([name, value]) => (
        <Row key={name}>
          <Box as="dt" color="mute">
            {name}
          </Box>
          <Box as="dd" m="0">
            {value}
          </Box>
        </Row>
      ))}
    </Box>
  );
}

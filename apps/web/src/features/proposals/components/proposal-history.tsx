import { Box } from '@chakra-ui/react';
import type { HistoryEntry } from '../../../lib/api/types';
import { dayAndTime } from '../../../lib/format/time';

/** What was done with the proposal so far, by whom and when. */
export function ProposalHistory({ entries, zone }: { entries: HistoryEntry[]; zone: string }) {
  return (
    <Box as="ol" listStyleType="none" m="0" p="0">
      {entries.map(({ at, by, act, text }) => (
        <Box as="li" key={`${at}${act}`} py="1.5" borderTopWidth="1px" borderColor="line">
          <Box color="mute" fontSize="sm">
            {dayAndTime(at, zone)} · {by}
          </Box>
          <strong>{act}</strong>
          {text && `: ${text}`}
        </Box>
      ))}
    </Box>
  );
}

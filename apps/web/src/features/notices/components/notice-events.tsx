import { Box } from '@chakra-ui/react';
import type { NoticeDetail } from '../../../lib/api/types';
import { dateAndTime } from '../../../lib/format/time';

/** The events of a notice in order: none is ever changed or taken out. */
export function NoticeEvents({ events, zone }: { events: NoticeDetail['events']; zone: string }) {
  return (
    <Box as="ol" listStyleType="none" m="0" p="0">
      {events.map(({ seq, kind, at, by, text }) => (
        <Box
          as="li"
          key={seq}
          py="1.5"
          borderTopWidth={seq === events[0]?.seq ? '0' : '1px'}
          borderColor="line"
        >
          <Box color="mute" fontSize="sm">
            {dateAndTime(at, zone)} · {by}
          </Box>
          <strong>{kind}</strong>
          {text && `: ${text}`}
        </Box>
      ))}
    </Box>
  );
}

import { Box, Flex, Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { paths } from '../../../app/paths';
import { Empty } from '../../../components/states/empty';
import { Loaded } from '../../../components/states/loaded';
import { Button } from '../../../components/ui/button';
import { Card } from '../../../components/ui/card';
import { TextLink } from '../../../components/ui/text-link';
import type { NoticeBrief } from '../../../lib/api/types';
import { useDistricts } from '../../../lib/api/use-districts';
import { ago, dayAndTime } from '../../../lib/format/time';
import { useNow } from '../../../lib/clock';
import { useNotices } from '../api';
import { EndDialog } from './end-dialog';
import { KindPill } from './kind-pill';

/** What is in force in these districts, until when, and the way to end it. */
export function InForceList({ districtIds }: { districtIds: readonly number[] }) {
  const notices = useNotices({ state: 'in force', pageSize: 100 });
  const { data: districts } = useDistricts();
  const [ending, setEnding] = useState<NoticeBrief>();
  const zoneOf = (id: number) => districts?.find((district) => district.id === id)?.timeZone ?? 'UTC';
  return (
    <Loaded from={notices} what="what is in force">
      {({ items }) => {
        const mine = items.filter(({ districtId }) => districtIds.includes(districtId));
        return (
          <>
            {mine.length === 0 && <Empty title="No restriction in force" />}
            <Stack gap="2.5">
              {mine.map((notice) => (
                <InForceCard
                  key={notice.id}
                  notice={notice}
                  zone={zoneOf(notice.districtId)}
                  onEnd={() => setEnding(notice)}
                />
              ))}
            </Stack>
            {ending && (
              <EndDialog
                key={ending.id}
                open
                notice={ending}
                onClose={() => setEnding(undefined)}
                onAnswer={() => void notices.mutate()}
              />
            )}
          </>
        );
      }}
    </Loaded>
  );
}

function InForceCard({ notice, zone, onEnd }: { notice: NoticeBrief; zone: string; onEnd: () => void }) {
  const now = useNow();
  return (
    <Card padded>
      <Flex gap="3" wrap="wrap" align="center">
        <Box flex="1" minW="220px">
          <Flex gap="2" align="center" wrap="wrap">
            <strong>{notice.districtName}</strong>
            <KindPill notice={notice} />
          </Flex>
          <Box mt="1">
            until {dayAndTime(notice.expiresAt, zone)}{' '}
            <Box as="span" color="mute">
              ({ago(notice.expiresAt, now)})
            </Box>
          </Box>
          <Box color="mute" fontSize="sm">
            <TextLink to={paths.notice(notice.id)}>{notice.ref}</TextLink> · issued by {notice.issuedBy}
          </Box>
        </Box>
        <Button onClick={onEnd} aria-label={`End ${notice.ref} in ${notice.districtName}`}>
          End…
        </Button>
      </Flex>
    </Card>
  );
}

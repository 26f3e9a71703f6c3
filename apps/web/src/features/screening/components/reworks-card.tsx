import { Box, chakra, Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { Empty } from '../../../components/states/empty';
import { Loaded } from '../../../components/states/loaded';
import { Button } from '../../../components/ui/button';
import { Card } from '../../../components/ui/card';
import { Muted, PartTitle } from '../../../components/ui/heading';
import { AgoText } from '../../../components/ui/time-text';
import { counted } from '../../../lib/format/number';
import { useReworks } from '../api';
import type { Rework } from '../types';
import { changeSentences } from '../words';
import { SpanText } from './span-text';

const Bar = chakra('progress', {
  base: { width: '100%', maxWidth: '320px', height: '10px', accentColor: 'air' },
});
const NEWEST = 3;

interface ReworksCardProps {
  towerId: number;
  zone: string;
  /** Called when the last one under way has ended. */
  onEnded: () => void;
}

/** What was worked out anew after a change, with progress, and what is different in the findings since. */
export function ReworksCard({ towerId, zone, onEnded }: ReworksCardProps) {
  const reworks = useReworks(towerId, onEnded);
  const [all, setAll] = useState(false);
  return (
    <Card padded minW="0">
      <PartTitle mb="2">What was worked out anew</PartTitle>
      <Loaded from={reworks} what="what was worked out anew">
        {(rows) =>
          rows.length === 0 ? (
            <Empty title="Nothing yet">
              When readings are set aside, a sensor is corrected or an import is undone, what that changes in
              the findings is said here.
            </Empty>
          ) : (
            <>
              <Stack as="ul" gap="0" listStyleType="none" p="0" m="0" aria-live="polite">
                {rows.slice(0, all ? rows.length : NEWEST).map((rework) => (
                  <ReworkLine key={rework.id} rework={rework} zone={zone} />
                ))}
              </Stack>
              {rows.length > NEWEST && (
                <Button kind="quiet" size="sm" aria-expanded={all} onClick={() => setAll(!all)}>
                  {all ? 'Only the newest' : `All ${rows.length}`}
                </Button>
              )}
            </>
          )
        }
      </Loaded>
    </Card>
  );
}

function ReworkLine({ rework, zone }: { rework: Rework; zone: string }) {
  const { cause, by, begunAt, changes } = rework;
  return (
    <Box as="li" py="2" borderTopWidth="1px" borderColor="line">
      <strong>{cause}</strong>{' '}
      <Muted small>
        {by ?? 'the service'}, <AgoText at={begunAt} zone={zone} />
      </Muted>
      <Box fontSize="sm" color="mute">
        <SpanText span={rework} zone={zone} />
      </Box>
      {changes ? <Box>{changeSentences(changes).join(' ')}</Box> : <Progress rework={rework} />}
    </Box>
  );
}

function Progress({ rework: { cause, blocks, pending, pendingDistricts } }: { rework: Rework }) {
  const done = blocks - pending;
  if (blocks === 0) return <Muted small>what depends on it is being looked for</Muted>;
  return (
    <Stack gap="1">
      <Bar value={done} max={blocks} aria-label={`Worked out anew: ${cause}`} />
      <Muted small>
        {pending > 0 || pendingDistricts === 0
          ? `${done} of ${counted(blocks, 'block')} worked out anew`
          : `the tower’s blocks are done; ${counted(pendingDistricts, 'block')} of its districts wait`}
      </Muted>
    </Stack>
  );
}

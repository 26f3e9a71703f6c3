import { HStack } from '@chakra-ui/react';
import { StateShape } from '../../../components/ui/state-shape';
import { StatusPill } from '../../../components/ui/status-pill';
import type { NoticeBrief } from '../../../lib/api/types';
import { KIND_NAME } from '../../../lib/words';
import { isInForce } from '../notice-state';

/** A notice's kind: as a state while it is in force, quiet once it is over. */
export function KindPill({ notice }: { notice: Pick<NoticeBrief, 'kind' | 'state'> }) {
  if (isInForce(notice)) return <StatusPill state={notice.kind} />;
  return (
    <HStack as="span" display="inline-flex" gap="1.5" color="mute" fontWeight="600" whiteSpace="nowrap">
      <StateShape state={notice.kind} />
      {KIND_NAME[notice.kind]}
    </HStack>
  );
}

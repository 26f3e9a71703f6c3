import { Box } from '@chakra-ui/react';
import type { TowerFreshness } from '../../../lib/api/types';
import { useNow } from '../../../lib/clock';
import { ago } from '../../../lib/format/time';

/** Whether every tower is heard, and which are not. */
export function TowerLine({ towers }: { towers: TowerFreshness[] }) {
  const now = useNow();
  const late = towers.filter((tower) => tower.late);
  if (towers.length === 0) return <>no tower yet</>;
  if (late.length === 0) return <>every tower is fresh</>;
  return (
    <Box as="span" color="lid" fontWeight="600">
      {late
        .map(({ name, newest }) => `${name}: ${newest ? `last heard ${ago(newest, now)}` : 'never heard'}`)
        .join(' · ')}
    </Box>
  );
}

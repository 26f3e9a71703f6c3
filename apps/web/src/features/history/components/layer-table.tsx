import { Box, chakra } from '@chakra-ui/react';
import type { Profile } from '../../../lib/api/types';
import { decimal } from '../../../lib/format/number';

const Th = chakra('th', {
  base: { color: 'mute', fontSize: 'sm', fontWeight: '600', textAlign: 'end', px: '2', py: '1' },
});
const Td = chakra('td', {
  base: { textAlign: 'end', px: '2', py: '1', borderTopWidth: '1px', borderColor: 'line' },
});

/** The layers of a profile from the top down: lapse rate with its uncertainty, and the textbook's class. */
export function LayerTable({ profile: { layers } }: { profile: Profile }) {
  if (layers.length === 0) return null;
  return (
    <chakra.table borderCollapse="collapse">
      <Box as="caption" srOnly>
        Layers
      </Box>
      <thead>
        <tr>
          <Th>Layer m</Th>
          <Th>Lapse rate K/km</Th>
          <Th>±</Th>
          <Th textAlign="start">Class</Th>
        </tr>
      </thead>
      <tbody>
        {[...layers].reverse().map(({ lowerM, upperM, lapseRateKPerKm, sigmaKPerKm, textbookClass }) => (
          <tr key={lowerM}>
            <Td>
              {lowerM} to {upperM}
            </Td>
            <Td>{lapseRateKPerKm === null ? 'not known' : decimal(lapseRateKPerKm)}</Td>
            <Td color="mute">{sigmaKPerKm === null ? '' : decimal(sigmaKPerKm)}</Td>
            <Td textAlign="start">{textbookClass ?? 'not known'}</Td>
          </tr>
        ))}
      </tbody>
    </chakra.table>
  );
}

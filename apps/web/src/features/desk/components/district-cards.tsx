import { Box, chakra, Flex, Stack } from '@chakra-ui/react';
import { sharedScale } from '../../../components/air-column';
import type { DistrictAir } from '../../../lib/api/types';
import { drawable } from '../../../lib/format/range';
import { ColumnCell, FreshnessLine, InForceCell, MeasureCell, StrengthCell } from './district-cells';

const CardButton = chakra('button', {
  base: {
    font: 'inherit',
    color: 'ink',
    textAlign: 'start',
    bg: 'card',
    borderWidth: '1px',
    borderColor: 'line',
    borderRadius: 'l3',
    p: '3',
    cursor: 'pointer',
    width: '100%',
    '&[aria-pressed=true]': { bg: 'raised', borderColor: 'edge' },
  },
});

/** The same districts on a phone: a card each. */
export function DistrictCards({
  districts,
  chosenId,
  onChoose,
}: {
  districts: DistrictAir[];
  chosenId: number | undefined;
  onChoose: (slug: string) => void;
}) {
  const scale = sharedScale(districts.map(({ levels }) => levels));
  return (
    <Stack hideFrom="md" gap="2">
      {districts.map((air) => (
        <CardButton
          key={air.districtId}
          type="button"
          aria-pressed={air.districtId === chosenId}
          onClick={() => onChoose(air.slug)}
        >
          <Flex gap="3">
            <ColumnCell air={air} scale={scale} />
            <Box flex="1" minW="0">
              <Flex justify="space-between" gap="2">
                <strong>{air.name}</strong>
                <Box textAlign="end">
                  <StrengthCell air={air} />
                </Box>
              </Flex>
              <InForceCell air={air} />
              <FreshnessLine air={air} />
              {drawable(air.pm25Hour) !== null && (
                <Box fontSize="sm">
                  PM2.5 now <MeasureCell value={air.pm25Hour} /> µg/m³
                </Box>
              )}
            </Box>
          </Flex>
        </CardButton>
      ))}
    </Stack>
  );
}

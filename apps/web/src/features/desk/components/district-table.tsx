import { Box, chakra } from '@chakra-ui/react';
import { sharedScale } from '../../../components/air-column';
import { Card } from '../../../components/ui/card';
import type { DistrictAir } from '../../../lib/api/types';
import {
  ColumnCell,
  FreshnessLine,
  InForceCell,
  LastedCell,
  MeasureCell,
  StrengthCell,
} from './district-cells';

const Th = chakra('th', {
  base: {
    fontSize: 'sm',
    fontWeight: '600',
    color: 'mute',
    textAlign: 'start',
    px: '3',
    py: '2',
    verticalAlign: 'bottom',
  },
  variants: { number: { true: { textAlign: 'end' } } },
});
const Td = chakra('td', {
  base: { px: '3', py: '2', borderTopWidth: '1px', borderColor: 'line', verticalAlign: 'middle' },
  variants: { number: { true: { textAlign: 'end', whiteSpace: 'nowrap' } } },
});

interface DistrictTableProps {
  districts: DistrictAir[];
  chosenId: number | undefined;
  onChoose: (slug: string) => void;
}

/** All districts, one line each, on one temperature scale; the chosen one is shown beside it. */
export function DistrictTable({ districts, chosenId, onChoose }: DistrictTableProps) {
  const scale = sharedScale(districts.map(({ levels }) => levels));
  return (
    <Card hideBelow="md" overflowX="auto">
      <chakra.table width="100%" borderCollapse="collapse">
        <Box as="caption" srOnly>
          All districts
        </Box>
        <thead>
          <tr>
            <Th>Air</Th>
            <Th>District</Th>
            <Th>In force</Th>
            <Th number>Inversion</Th>
            <Th number>For</Th>
            <Th number>
              PM2.5 now
              <br />
              µg/m³
            </Th>
            <Th number>
              Bench less
              <br />
              floor °C
            </Th>
          </tr>
        </thead>
        <tbody>
          {districts.map((air) => (
            <chakra.tr
              key={air.districtId}
              bg={air.districtId === chosenId ? 'raised' : undefined}
              cursor="pointer"
              _hover={{ bg: 'raised' }}
              onClick={() => onChoose(air.slug)}
            >
              <Td width="76px">
                <ColumnCell air={air} scale={scale} />
              </Td>
              <Td>
                <DistrictButton air={air} chosen={air.districtId === chosenId} />
                <FreshnessLine air={air} />
              </Td>
              <Td>
                <InForceCell air={air} />
              </Td>
              <Td number>
                <StrengthCell air={air} />
              </Td>
              <Td number>
                <LastedCell air={air} />
              </Td>
              <Td number>
                <MeasureCell value={air.pm25Hour} />
              </Td>
              <Td number>
                <MeasureCell value={air.floorToBenchC} decimals={1} sign />
              </Td>
            </chakra.tr>
          ))}
        </tbody>
      </chakra.table>
    </Card>
  );
}

/** The district's name as the row's button: the click itself is the row's. */
function DistrictButton({ air, chosen }: { air: DistrictAir; chosen: boolean }) {
  return (
    <chakra.button
      type="button"
      aria-pressed={chosen}
      font="inherit"
      fontWeight="600"
      color="ink"
      textAlign="start"
      cursor="pointer"
    >
      {air.name}
    </chakra.button>
  );
}

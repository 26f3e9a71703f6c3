import { Box } from '@chakra-ui/react';
import type { Profile } from '../../lib/api/types';
import { AirColumn } from './air-column';

/** A profile as a full-size column, with what its thin lines are. */
export function ProfileView({
  profile,
  width,
  height,
}: {
  profile: Profile;
  width?: number;
  height?: number;
}) {
  const { inversion, levels, surface, pressureHpa, pressureAssumed } = profile;
  const known = surface !== 'not known';
  return (
    <Box>
      <AirColumn
        size="full"
        levels={levels}
        known={known || levels.some(({ temperatureC }) => temperatureC !== null)}
        lid={inversion ? { topM: inversion.topM, open: inversion.open } : null}
        pressureHPa={pressureHpa}
        width={width}
        height={height}
      />
      <Box color="mute" fontSize="xs" mt="1">
        Dots: sensors, m above ground; band: twice the standard uncertainty. Thin lines: dry adiabats; dotted:
        moist adiabats at {Math.round(pressureHpa)} hPa
        {pressureAssumed ? ' (assumed from the elevation)' : ''}.
      </Box>
    </Box>
  );
}

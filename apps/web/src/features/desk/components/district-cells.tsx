import { Box } from '@chakra-ui/react';
import { AirColumn, lidFromLevels, type TemperatureScale } from '../../../components/air-column';
import { RangeText } from '../../../components/ui/range-text';
import { StatusPill } from '../../../components/ui/status-pill';
import { AgoText, InstantText } from '../../../components/ui/time-text';
import type { DistrictAir, RangeValue } from '../../../lib/api/types';
import { drawable } from '../../../lib/format/range';
import { signed } from '../../../lib/format/number';
import { duration } from '../../../lib/format/time';
import { stateOf, strictestInForce } from '../../../lib/in-force';

/** The air of a district at list size; empty and dashed while it is not known or not fresh. */
export function ColumnCell({ air, scale }: { air: DistrictAir; scale: TemperatureScale }) {
  const present = air.finding.surface === 'present';
  return (
    <AirColumn
      size="small"
      width={52}
      height={54}
      levels={air.levels}
      scale={scale}
      known={air.fresh && air.finding.surface !== 'not known'}
      lid={present ? lidFromLevels(air.levels, air.finding.open) : null}
    />
  );
}

/** Who spoke for the district and how long ago; or who is silent. */
export function FreshnessLine({ air }: { air: DistrictAir }) {
  const who = air.speaker?.name ?? air.silent.join(', ');
  return (
    <Box color="mute" fontSize="sm">
      {who || 'No tower'}
      {air.tEnd && (
        <>
          {' · '}
          <AgoText at={air.tEnd} zone={air.timeZone} />
        </>
      )}
    </Box>
  );
}

/** What holds, and until when. */
export function InForceCell({ air }: { air: DistrictAir }) {
  const notice = strictestInForce(air.inForce);
  const state = stateOf(air);
  return (
    <>
      <StatusPill state={state} />
      <Box color="mute" fontSize="sm" mt="0.5">
        {notice && (
          <>
            until <InstantText at={notice.expiresAt} zone={air.timeZone} />
          </>
        )}
        {state === 'unknown' && air.reason}
      </Box>
    </>
  );
}

const SURE = { true: 'sure', false: 'not sure', 'not known': '' } as const;

/** The strength of the surface inversion and whether it is beyond doubt. */
export function StrengthCell({ air: { finding } }: { air: DistrictAir }) {
  if (finding.surface === 'absent') return <>none</>;
  return (
    <>
      <Box fontWeight="600">
        <RangeText value={finding.strengthC} unit="°C" />
      </Box>
      <Box color="mute" fontSize="sm">
        {SURE[finding.sure]}
      </Box>
    </>
  );
}

/** A measure of the list: a dash where it does not apply or is not known, with the reason as tooltip. */
export function MeasureCell({
  value,
  decimals = 0,
  sign = false,
}: {
  value: RangeValue;
  decimals?: number;
  sign?: boolean;
}) {
  if (drawable(value) === null) {
    return (
      <Box as="span" color="unknown" title={value.notKnown}>
        <span aria-hidden="true">–</span>
        <Box as="span" srOnly>
          not known
        </Box>
      </Box>
    );
  }
  return (
    <RangeText value={value} decimals={decimals} write={sign ? (v) => signed(v, decimals) : undefined} />
  );
}

/** How long the finding has lasted. */
export function LastedCell({ air: { finding } }: { air: DistrictAir }) {
  if (finding.surface !== 'present' || drawable(finding.forMinutes) === null) return <>–</>;
  return <RangeText value={finding.forMinutes} write={duration} />;
}

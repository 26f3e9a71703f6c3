import { Box } from '@chakra-ui/react';
import type { DistrictAir } from '../../../lib/api/types';
import { rangeText } from '../../../lib/format/range';

const OPEN = {
  no: '',
  'at the top': ' · open at the top',
  'cut by a missing level': ' · cut by a missing level',
};
const SURE = {
  true: ' · sure',
  false: ' · not sure: within what the sensors could mistake',
  'not known': '',
};

/** The finding in a sentence, with how far it can be trusted. */
export function FindingSentence({ air }: { air: DistrictAir }) {
  const { finding, elevatedLid, reason } = air;
  if (finding.surface === 'not known' || !air.fresh) {
    return (
      <>
        <strong>Not known.</strong> {reason}
      </>
    );
  }
  const lid = elevatedLid === 'true' ? ' A lid lies above the ground.' : '';
  if (finding.surface === 'absent') {
    return (
      <>
        <strong>No surface inversion.</strong>
        {lid}
      </>
    );
  }
  return (
    <>
      <strong>Surface inversion, {rangeText(finding.strengthC, { unit: '°C', style: 'words' })}</strong>
      <Box as="span" color="mute">
        {OPEN[finding.open]}
        {SURE[finding.sure]}
      </Box>
      {lid}
    </>
  );
}

import { Box } from '@chakra-ui/react';
import type { RangeValue } from '../../lib/api/types';
import { isNotKnown, rangeText, type BoundStyle } from '../../lib/format/range';

interface RangeTextProps {
  value: RangeValue;
  decimals?: number;
  unit?: string;
  /** Signs ("≥ 5.1 °C") at the desk, words ("at least 5.1 °C") on the phone and in public. */
  style?: BoundStyle;
  /** How the bare number is written, where decimals do not say it (signs, durations). */
  write?: (value: number) => string;
}

/** A value that may be a range or not known. Signs are read out as words; the reason for not knowing is the tooltip. */
export function RangeText({ value, ...form }: RangeTextProps) {
  const text = rangeText(value, form);
  if (isNotKnown(value)) {
    return (
      <Box as="span" color="unknown" fontWeight="inherit" title={value.notKnown || undefined}>
        {text}
      </Box>
    );
  }
  const said = rangeText(value, { ...form, style: 'words' });
  if (said === text) return <span>{text}</span>;
  return (
    <span>
      <span aria-hidden="true">{text}</span>
      <Box as="span" srOnly>
        {said}
      </Box>
    </span>
  );
}

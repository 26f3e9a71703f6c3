import { useMemo } from 'react';
import { useColorMode } from '../../theme/color-mode';
import { PALETTE, type ColorName } from '../../theme/palette';

/** The palette in the mode now shown, as plain values: a canvas knows no custom properties. */
export function useChartColors(): Record<ColorName, string> {
  const { shown } = useColorMode();
  return useMemo(
    () =>
      Object.fromEntries(Object.entries(PALETTE).map(([name, color]) => [name, color[shown]])) as Record<
        ColorName,
        string
      >,
    [shown],
  );
}

import { Box } from '@chakra-ui/react';
import type { Chart as ChartJS } from 'chart.js';
import { useEffect, useMemo, useRef } from 'react';
import { Chart } from 'react-chartjs-2';
import type { DistrictHistory } from '../../lib/api/types';
import { useChartColors } from './chart-colors';
import { isNightly } from './nightly';
import './register';
import { backdropPlugin, showBackdrop } from './strength-backdrop';
import { lineDrawing, nightlyDrawing } from './strength-datasets';
import { strengthOptions } from './strength-options';
import { useBackdrop } from './use-backdrop';

const PLUGINS = [backdropPlugin];

interface StrengthChartProps {
  history: DistrictHistory;
  /** The chart in words. */
  label: string;
  height: number;
}

/**
 * Strength within the tower over time: a line, or over long spans a bar each night, with nights, notices, the rule's
 * limits and what is not known.
 */
export function StrengthChart({ history, label, height }: StrengthChartProps) {
  const colors = useChartColors();
  const bars = isNightly(history);
  const backdrop = useBackdrop(history, colors, !bars);
  const chart = useRef<ChartJS<'line' | 'bar'>>(null);
  const { data, behind } = useMemo(
    () => (bars ? nightlyDrawing : lineDrawing)(history, colors),
    [bars, history, colors],
  );
  const options = useMemo(
    () =>
      strengthOptions({
        history,
        colors,
        behind,
        highest: Math.max(0, ...backdrop.limits.map(({ y }) => y + 0.5)),
      }),
    [history, colors, behind, backdrop],
  );
  useEffect(() => {
    if (chart.current) showBackdrop(chart.current, backdrop);
  }, [backdrop, options]);
  return (
    <Box height={`${height}px`} position="relative">
      <Chart
        ref={chart}
        type={bars ? 'bar' : 'line'}
        data={data}
        options={options}
        plugins={PLUGINS}
        role="img"
        aria-label={label}
      />
    </Box>
  );
}

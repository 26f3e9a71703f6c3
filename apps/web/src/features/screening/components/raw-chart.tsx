import { Box } from '@chakra-ui/react';
import type { Chart as ChartJS } from 'chart.js';
import { useEffect, useMemo, useRef } from 'react';
import { Chart } from 'react-chartjs-2';
import { useChartColors } from '../../../components/charts/chart-colors';
import '../../../components/charts/register';
import { rawBackdropPlugin, showRawBackdrop, type Band } from '../raw-backdrop';
import { rawDrawing } from '../raw-datasets';
import { rawOptions } from '../raw-options';
import type { RawReadings, RawSeries } from '../types';
import { useDrag } from '../use-drag';

const PLUGINS = [rawBackdropPlugin];

interface RawChartProps {
  raw: RawReadings;
  /** The sensors shown, each with the number of its line. */
  shown: readonly { series: RawSeries; line: number }[];
  intervalMinutes: number;
  /** What people have set, and what is chosen. */
  bands: readonly Band[];
  /** The chart in words. */
  label: string;
  /** A stretch drawn over the chart, epoch ms; left out where nothing may be set. */
  onDraw?: ((a: number, b: number) => void) | undefined;
}

/** Readings as they came, with flags by shape and colour and set spans shaded. */
export function RawChart({ raw, shown, intervalMinutes, bands, label, onDraw }: RawChartProps) {
  const colors = useChartColors();
  const chart = useRef<ChartJS<'line'>>(null);
  const drag = useDrag(chart, onDraw);
  const { data, reach } = useMemo(
    () => rawDrawing(raw, shown, intervalMinutes, colors),
    [raw, shown, intervalMinutes, colors],
  );
  const unit = shown[0]?.series.unit ?? '';
  const options = useMemo(() => rawOptions({ raw, unit, reach, colors }), [raw, unit, reach, colors]);
  useEffect(() => {
    if (chart.current) showRawBackdrop(chart.current, { bands, colors });
  }, [bands, colors, options, data]);
  return (
    <Box
      height={{ base: '300px', md: '380px' }}
      position="relative"
      touchAction={onDraw ? 'pan-y' : undefined}
      cursor={onDraw ? 'crosshair' : undefined}
      {...drag}
    >
      <Chart
        ref={chart}
        type="line"
        data={data}
        options={options}
        plugins={PLUGINS}
        role="img"
        aria-label={label}
      />
    </Box>
  );
}

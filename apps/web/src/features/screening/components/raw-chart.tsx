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
  /** A reading is to be opened. */
  onOpen: (reading: { sensorId: number; t: string }) => void;
}

/** Readings as they came, with flags by shape and colour and set spans shaded. */
export function RawChart({ raw, shown, intervalMinutes, bands, label, onDraw, onOpen }: RawChartProps) {
  const colors = useChartColors();
  const chart = useRef<ChartJS<'line'>>(null);
  const { data, reach } = useMemo(
    () => rawDrawing(raw, shown, intervalMinutes, colors),
    [raw, shown, intervalMinutes, colors],
  );
  const drag = useDrag(chart, {
    onDraw,
    onPoint: (line, index) => {
      const reading = data.datasets[line]?.data[index]?.reading;
      const own = shown.find(({ series }) => series.name === data.datasets[line]?.label);
      if (reading && own) onOpen({ sensorId: own.series.sensorId, t: reading.t });
    },
  });
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

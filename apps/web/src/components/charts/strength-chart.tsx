import { Box } from '@chakra-ui/react';
import { useMemo, useRef } from 'react';
import { Line } from 'react-chartjs-2';
import type { DistrictHistory } from '../../lib/api/types';
import { useChartColors } from './chart-colors';
import { limitLines } from './limit-lines';
import './register';
import { backdropPlugin, type Backdrop } from './strength-backdrop';
import { strengthOptions } from './strength-options';
import { gapsOf, strengthPoints, withBreaks } from './strength-series';

const ms = (instant: string) => new Date(instant).getTime();

/** Strength within the tower over time, with nights, notices, limits and what is not known. Its words are elsewhere. */
export function StrengthChart({
  history,
  label,
  height,
}: {
  history: DistrictHistory;
  label: string;
  height: number;
}) {
  const colors = useChartColors();
  const points = useMemo(() => strengthPoints(history), [history]);
  const backdrop: Backdrop = useMemo(
    () => ({
      colors,
      gaps: gapsOf(points, history.stepMinutes),
      limits: limitLines(history.limits),
      nights: history.nights.map(({ from, to }) => ({ from: ms(from), to: ms(to) })),
      notices: history.notices.map((notice) => ({
        ...notice,
        from: ms(notice.effectiveAt),
        to: ms(notice.endedAt ?? notice.expiresAt),
      })),
    }),
    [colors, history, points],
  );
  const shown = useRef(backdrop);
  shown.current = backdrop;
  const plugins = useMemo(() => [backdropPlugin(() => shown.current)], []);
  const options = useMemo(
    () =>
      strengthOptions({
        zone: history.timeZone,
        from: ms(history.from),
        to: ms(history.to),
        colors,
        points: new Map(points.map((point) => [point.x, point])),
        highest: Math.max(0, ...backdrop.limits.map(({ y }) => y + 0.5)),
      }),
    [history, colors, points, backdrop],
  );
  const data = useMemo(
    () => ({
      datasets: [
        {
          data: withBreaks(points, history.stepMinutes),
          borderColor: colors.air,
          borderWidth: 1.8,
          pointRadius: 0,
          pointHoverRadius: 4,
          pointHoverBackgroundColor: colors.card,
          spanGaps: false,
          tension: 0,
        },
      ],
    }),
    [points, history.stepMinutes, colors],
  );
  return (
    <Box height={`${height}px`} position="relative">
      <Line data={data} options={options} plugins={plugins} role="img" aria-label={label} />
    </Box>
  );
}

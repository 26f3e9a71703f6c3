import type { ChartData } from 'chart.js';
import type { DistrictHistory } from '../../lib/api/types';
import type { ColorName } from '../../theme/palette';
import { nightly } from './nightly';
import { strengthPoints, withBreaks, type StrengthPoint } from './strength-series';

type XY = { x: number; y: number | null };

/** What chart.js draws, and the point of the history that stands behind each x. */
export interface StrengthDrawing {
  data: ChartData<'line' | 'bar', XY[]>;
  behind: ReadonlyMap<number, StrengthPoint>;
}

/** Each mean as a point of a line that breaks where nothing is known. */
export function lineDrawing(history: DistrictHistory, colors: Record<ColorName, string>): StrengthDrawing {
  const points = strengthPoints(history);
  return {
    behind: new Map(points.map((point) => [point.x, point])),
    data: {
      datasets: [
        {
          type: 'line',
          data: withBreaks(points, history.stepMinutes),
          borderColor: colors.air,
          borderWidth: 1.8,
          pointRadius: 0,
          pointHoverRadius: 4,
          pointHoverBackgroundColor: colors.card,
          spanGaps: false,
        },
      ],
    },
  };
}

/** Each night's strongest as a bar; a night of which nothing is known has none. */
export function nightlyDrawing(history: DistrictHistory, colors: Record<ColorName, string>): StrengthDrawing {
  const nights = nightly(strengthPoints(history), history.timeZone).map(({ from, to, strongest }) => ({
    x: (from + to) / 2,
    strongest,
  }));
  const known = nights.flatMap(({ x, strongest }) => (strongest ? [[x, strongest] as const] : []));
  return {
    behind: new Map(known),
    data: {
      datasets: [
        {
          type: 'bar',
          data: nights.map(({ x, strongest }) => ({ x, y: strongest?.y ?? null })),
          backgroundColor: colors.air,
          barPercentage: 0.8,
          categoryPercentage: 1,
          maxBarThickness: 24,
        },
      ],
    },
  };
}

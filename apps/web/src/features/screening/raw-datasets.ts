import type { ChartData, ChartDataset } from 'chart.js';
import type { ColorName } from '../../theme/palette';
import { joinedMs, rawPoints, reachOf, type RawPoint, type Reach } from './raw-points';
import type { RawReadings, RawSeries } from './types';

/** What chart.js draws of some sensors, and how far it reaches. */
export interface RawDrawing {
  data: ChartData<'line', RawPoint[]>;
  reach: Reach;
}

/** Lines from the ground up; their names stand at their ends, so none is told by its colour alone. */
const LINES: readonly ColorName[] = ['ground', 'air', 'none', 'suspended', 'advisory', 'unknown'];

/** The colour of the line of the n-th sensor. */
export const lineColor = (index: number): ColorName => LINES[index % LINES.length]!;

/** A mark at the edge of the chart is drawn whole. */
const EDGE_PX = 8;

const SHAPES = { valid: 'circle', suspect: 'triangle', failed: 'crossRot', missing: 'circle' } as const;
const RADII = { valid: 0, suspect: 4.5, failed: 5, missing: 0 } as const;

const qualityOf = ({ reading }: RawPoint) => reading?.quality ?? 'valid';

function asRead(series: RawSeries, color: string, marks: Record<ColorName, string>, points: RawPoint[]) {
  const markColor = { valid: color, missing: color, suspect: marks.lid, failed: marks.ban };
  const colors = points.map((point) => markColor[qualityOf(point)]);
  return {
    ...{ label: series.name, data: points, borderColor: color, borderWidth: 1.6, spanGaps: false },
    pointStyle: points.map((point) => SHAPES[qualityOf(point)]),
    pointRadius: points.map((point) => RADII[qualityOf(point)]),
    ...{ pointBackgroundColor: colors, pointBorderColor: colors, pointBorderWidth: 2 },
    ...{ pointHoverRadius: 5, pointHitRadius: 8, clip: EDGE_PX },
  } satisfies ChartDataset<'line', RawPoint[]>;
}

/** The readings of some sensors as lines, flagged ones marked by shape and colour; corrected values dashed beside. */
export function rawDrawing(
  { from, to }: RawReadings,
  shown: readonly { series: RawSeries; line: number }[],
  intervalMinutes: number,
  colors: Record<ColorName, string>,
): RawDrawing {
  const reach = reachOf(shown.map(({ series }) => series));
  const spanMs = Date.parse(to) - Date.parse(from);
  const datasets = shown.flatMap(({ series, line }) => {
    const color = colors[lineColor(line)];
    const gapMs = joinedMs(series.thinned, intervalMinutes, spanMs);
    const read = asRead(series, color, colors, rawPoints(series.points, reach, gapMs));
    const corrected = series.points.filter((reading) => reading.corrected !== undefined);
    if (corrected.length === 0) return [read];
    const dashed = {
      ...{ label: '', borderColor: color, borderWidth: 1.4, borderDash: [5, 4], spanGaps: false },
      ...{ pointRadius: 0, pointHitRadius: 0, pointHoverRadius: 0 },
      data: rawPoints(corrected, reach, gapMs, (reading) => reading.corrected ?? reading.value),
    };
    return [read, dashed];
  });
  return { data: { datasets }, reach };
}

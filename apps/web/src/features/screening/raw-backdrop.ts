import type { Chart, ChartArea, Plugin } from 'chart.js';
import type { ColorName } from '../../theme/palette';

/** A stretch of time behind the lines. Instants in epoch ms. */
export interface Band {
  from: number;
  to: number;
  /** *aside* and *right*: what people have set; *chosen*: what is selected now. */
  kind: 'aside' | 'right' | 'chosen';
  label: string;
}

/** What lies behind the lines, and in which colours. */
export interface RawBackdrop {
  bands: readonly Band[];
  colors: Record<ColorName, string>;
}

const FONT = '600 12px "Source Sans 3", sans-serif';
const LABEL_STEP_PX = 14;

interface Drawing {
  context: CanvasRenderingContext2D;
  area: ChartArea;
  x: (ms: number) => number;
}

function drawingOf(chart: Chart): Drawing | null {
  const { ctx: context, chartArea: area, scales } = chart;
  const scale = scales.x;
  if (!area || !scale) return null;
  return {
    ...{ context, area },
    x: (ms) => Math.min(area.right, Math.max(area.left, scale.getPixelForValue(ms))),
  };
}

const fillOf = ({ kind }: Band, colors: Record<ColorName, string>): [string, string] =>
  ({
    aside: [colors.banSoft, colors.ban] as [string, string],
    right: [colors.noneSoft, colors.none] as [string, string],
    chosen: [`${colors.air}2E`, colors.air] as [string, string],
  })[kind];

function drawBands({ context, area, x }: Drawing, { bands, colors }: RawBackdrop): void {
  context.font = FONT;
  context.textAlign = 'left';
  for (const band of bands) {
    const [left, right] = [x(band.from), Math.max(x(band.to), x(band.from) + 2)];
    if (right <= area.left || left >= area.right) continue;
    const [fill, edge] = fillOf(band, colors);
    context.fillStyle = fill;
    context.fillRect(left, area.top, right - left, area.bottom - area.top);
    context.strokeStyle = context.fillStyle = edge;
    context.lineWidth = 1.5;
    context.setLineDash(band.kind === 'chosen' ? [] : [4, 3]);
    context.strokeRect(left + 0.5, area.top + 0.5, right - left - 1, area.bottom - area.top - 1);
    context.setLineDash([]);
    const width = context.measureText(band.label).width;
    const start = Math.max(area.left, Math.min(left, area.right - width));
    context.fillText(band.label, start, area.top - (band.kind === 'chosen' ? 4 : 8));
  }
}

/** The sensors' names at the ends of their lines, moved apart where lines end close together. */
function nameLines(chart: Chart, { context, area }: Drawing): void {
  const ends = chart.data.datasets
    .map((dataset, index) => ({ dataset, last: chart.getDatasetMeta(index).data.at(-1) }))
    .filter(({ dataset, last }) => dataset.label && last && !Number.isNaN(last.y))
    .map(({ dataset, last }) => ({
      ...{ label: dataset.label!, color: String(dataset.borderColor), y: last!.y },
    }))
    .sort((a, b) => a.y - b.y);
  context.font = FONT;
  context.textAlign = 'left';
  let lowest = -Infinity;
  for (const { label, color, y } of ends) {
    const at = Math.max(y + 4, lowest + LABEL_STEP_PX);
    lowest = at;
    context.fillStyle = color;
    context.fillText(label, area.right + 6, at);
  }
}

const backdrops = new WeakMap<Chart, RawBackdrop>();

/** Gives a chart of raw readings its backdrop and draws it. */
export function showRawBackdrop(chart: Chart, backdrop: RawBackdrop): void {
  backdrops.set(chart, backdrop);
  chart.draw();
}

/** The chart.js plugin that draws set and chosen stretches behind the lines and the sensors' names at their ends. */
export const rawBackdropPlugin: Plugin<'line'> = {
  id: 'raw-backdrop',
  beforeDatasetsDraw: (chart) => {
    const [drawing, backdrop] = [drawingOf(chart), backdrops.get(chart)];
    if (!drawing || !backdrop) return;
    drawing.context.save();
    drawBands(drawing, backdrop);
    drawing.context.restore();
  },
  afterDatasetsDraw: (chart) => {
    const drawing = drawingOf(chart);
    if (!drawing) return;
    drawing.context.save();
    nameLines(chart, drawing);
    drawing.context.restore();
  },
};

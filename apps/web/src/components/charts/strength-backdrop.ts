import type { Chart, ChartArea, Plugin } from 'chart.js';
import type { NoticeBrief } from '../../lib/api/types';
import { KIND_NAME } from '../../lib/words';
import type { ColorName } from '../../theme/palette';
import type { LimitLine } from './limit-lines';
import type { Gap } from './strength-series';

/** What lies behind and above the line: nights, gaps, the rule's limits, notices. Instants in epoch ms. */
export interface Backdrop {
  nights: readonly { from: number; to: number }[];
  gaps: readonly Gap[];
  limits: readonly LimitLine[];
  notices: readonly (Pick<NoticeBrief, 'kind' | 'ref'> & { from: number; to: number })[];
  colors: Record<ColorName, string>;
}

const BAR_PX = 7;
/** Room above the line for two rows of notices with their names. */
export const NOTICE_ROOM_PX = 36;

interface Drawing {
  context: CanvasRenderingContext2D;
  area: ChartArea;
  x: (ms: number) => number;
  y: (value: number) => number;
}

function drawingOf(chart: Chart): Drawing | null {
  const { ctx: context, chartArea: area, scales } = chart;
  const [xScale, yScale] = [scales.x, scales.y];
  if (!area || !xScale || !yScale) return null;
  const clamp = (px: number) => Math.min(area.right, Math.max(area.left, px));
  return {
    context,
    area,
    x: (ms) => clamp(xScale.getPixelForValue(ms)),
    y: (value) => yScale.getPixelForValue(value),
  };
}

function drawNights({ context, area, x }: Drawing, { nights, colors }: Backdrop): void {
  context.fillStyle = `${colors.ink}0D`;
  for (const { from, to } of nights)
    context.fillRect(x(from), area.top, x(to) - x(from), area.bottom - area.top);
}

function drawGaps({ context, area, x }: Drawing, { gaps, colors }: Backdrop): void {
  context.strokeStyle = context.fillStyle = colors.unknown;
  context.font = '12px "Source Sans 3", sans-serif';
  context.textAlign = 'center';
  context.lineWidth = 1;
  context.setLineDash([3, 3]);
  for (const { from, to } of gaps) {
    const width = x(to) - x(from);
    if (width < 2) continue;
    context.strokeRect(x(from) + 0.5, area.top + 2, width - 1, area.bottom - area.top - 3);
    if (width > 58) context.fillText('not known', x(from) + width / 2, area.bottom - 8);
  }
  context.setLineDash([]);
}

function drawLimits({ context, area, y }: Drawing, { limits, colors }: Backdrop): void {
  context.strokeStyle = colors.lid;
  context.lineWidth = 1.6;
  context.setLineDash([6, 4]);
  for (const { y: value } of limits) {
    const at = y(value);
    if (at < area.top || at > area.bottom) continue;
    context.beginPath();
    context.moveTo(area.left, at);
    context.lineTo(area.right, at);
    context.stroke();
  }
  context.setLineDash([]);
}

/** The limits' names, over the line on a halo of the sheet's colour, so that no line runs through a word. */
function nameLimits({ context, area, y }: Drawing, { limits, colors }: Backdrop): void {
  context.font = '12px "Source Sans 3", sans-serif';
  context.textAlign = 'right';
  context.strokeStyle = colors.card;
  context.fillStyle = colors.lid;
  context.lineWidth = 4;
  context.lineJoin = 'round';
  for (const { y: value, label } of limits) {
    if (y(value) < area.top || y(value) > area.bottom) continue;
    context.strokeText(label, area.right - 4, y(value) - 5);
    context.fillText(label, area.right - 4, y(value) - 5);
  }
}

/** Bans fill the upper row, advisories are framed in the lower: told apart without colour. */
function drawNotices({ context, area, x }: Drawing, { notices, colors }: Backdrop): void {
  context.font = '600 12px "Source Sans 3", sans-serif';
  context.textAlign = 'left';
  context.lineWidth = 1.5;
  for (const kind of ['burnBan', 'advisory'] as const) {
    context.fillStyle = context.strokeStyle = kind === 'burnBan' ? colors.ban : colors.advisory;
    const top = area.top - NOTICE_ROOM_PX + (kind === 'burnBan' ? 4 : 20);
    const row = notices.filter((notice) => notice.kind === kind).sort((a, b) => a.from - b.from);
    row.forEach(({ ref, from, to }, index) => {
      const [left, right] = [x(from), x(to)];
      if (right <= left) return;
      if (kind === 'burnBan') context.fillRect(left, top, right - left, BAR_PX);
      else context.strokeRect(left + 0.75, top + 0.75, Math.max(1, right - left - 1.5), BAR_PX - 1.5);
      const name = `${KIND_NAME[kind]} ${ref}`;
      const needed = context.measureText(name).width + 10;
      const next = row[index + 1];
      const free = (next ? x(next.from) : area.right) - right;
      if (free > needed) context.fillText(name, right + 5, top + BAR_PX + 1);
      else if (index === 0 && left - area.left > needed)
        context.fillText(name, left - needed + 5, top + BAR_PX + 1);
    });
  }
}

const backdrops = new WeakMap<Chart, Backdrop>();

/** Gives a chart its backdrop and draws it. */
export function showBackdrop(chart: Chart, backdrop: Backdrop): void {
  backdrops.set(chart, backdrop);
  chart.draw();
}

function drawn(chart: Chart, parts: readonly ((d: Drawing, b: Backdrop) => void)[]): void {
  const [drawing, backdrop] = [drawingOf(chart), backdrops.get(chart)];
  if (!drawing || !backdrop) return;
  drawing.context.save();
  for (const draw of parts) draw(drawing, backdrop);
  drawing.context.restore();
}

/** The chart.js plugin that draws the backdrop a chart was given; names come last, over the line. */
export const backdropPlugin: Plugin<'line' | 'bar'> = {
  id: 'backdrop',
  beforeDatasetsDraw: (chart) => drawn(chart, [drawNights, drawGaps, drawLimits, drawNotices]),
  afterDatasetsDraw: (chart) => drawn(chart, [nameLimits]),
};

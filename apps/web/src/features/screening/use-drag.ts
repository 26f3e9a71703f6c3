import type { Chart } from 'chart.js';
import { useRef, type PointerEvent, type RefObject } from 'react';

/** Less than this is a click, px. */
const LEAST_PX = 4;

/** Pointer handlers of a chart's frame by which a stretch of time is drawn; instants in epoch ms. */
export function useDrag(
  chart: RefObject<Chart<'line'> | null>,
  onDraw: ((a: number, b: number) => void) | undefined,
) {
  const start = useRef<number | null>(null);
  const timeAt = (px: number): number => chart.current?.scales.x?.getValueForPixel(px) ?? NaN;
  const pxOf = (event: PointerEvent): number =>
    event.clientX - (chart.current?.canvas.getBoundingClientRect().left ?? 0);
  if (!onDraw) return {};
  return {
    onPointerDown: (event: PointerEvent) => {
      if (event.button === 0) start.current = pxOf(event);
    },
    onPointerMove: (event: PointerEvent) => {
      if (start.current === null || event.buttons === 0) return;
      const px = pxOf(event);
      if (Math.abs(px - start.current) >= LEAST_PX) onDraw(timeAt(start.current), timeAt(px));
    },
    onPointerUp: () => {
      start.current = null;
    },
    onPointerCancel: () => {
      start.current = null;
    },
  };
}

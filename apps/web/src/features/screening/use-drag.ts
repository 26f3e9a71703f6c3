import type { Chart } from 'chart.js';
import { useRef, type MouseEvent, type PointerEvent, type RefObject } from 'react';

/** Less than this is a click, px. */
const LEAST_PX = 4;
/** A click so near to a point opens it, px. */
const NEAR_PX = 24;

/** What may be done with the pointer over a chart. */
interface Pointing {
  /** A stretch of time is drawn, epoch ms; left out where none may be chosen. */
  onDraw: ((a: number, b: number) => void) | undefined;
  /** A point is clicked: numbers of its line and of the point. */
  onPoint: (line: number, index: number) => void;
}

/** Pointer handlers of a chart's frame, by which a stretch of time is drawn or a point is opened. */
export function useDrag(chart: RefObject<Chart<'line'> | null>, { onDraw, onPoint }: Pointing) {
  const start = useRef<number | null>(null);
  const drawn = useRef(false);
  const timeAt = (px: number): number => chart.current?.scales.x?.getValueForPixel(px) ?? NaN;
  const pxOf = (event: PointerEvent): number =>
    event.clientX - (chart.current?.canvas.getBoundingClientRect().left ?? 0);
  return {
    onPointerDown: (event: PointerEvent) => {
      if (event.button !== 0) return;
      start.current = pxOf(event);
      drawn.current = false;
    },
    onPointerMove: (event: PointerEvent) => {
      if (!onDraw || start.current === null || event.buttons === 0) return;
      const px = pxOf(event);
      if (!drawn.current && Math.abs(px - start.current) < LEAST_PX) return;
      drawn.current = true;
      onDraw(timeAt(start.current), timeAt(px));
    },
    onPointerUp: () => {
      start.current = null;
    },
    onClick: (event: MouseEvent) => {
      const mode = { axis: 'xy', intersect: false } as const;
      const [hit] = chart.current?.getElementsAtEventForMode(event.nativeEvent, 'nearest', mode, false) ?? [];
      if (!hit || drawn.current) return;
      const { offsetX, offsetY } = event.nativeEvent;
      if (Math.hypot(hit.element.x - offsetX, hit.element.y - offsetY) <= NEAR_PX)
        onPoint(hit.datasetIndex, hit.index);
    },
    onPointerCancel: () => {
      start.current = null;
    },
  };
}

import { knownLevels, type ColumnLevel, type TemperatureScale } from './column-data';

/** The sizes a column is drawn at: in a list's row, beside a headline, alone. */
export type ColumnSize = 'small' | 'medium' | 'full';

/** Where things are within the drawing, px. */
export interface Geometry {
  width: number;
  height: number;
  left: number;
  right: number;
  /** The upper edge of the air. */
  top: number;
  /** The ground. */
  bottom: number;
  x: (temperatureC: number) => number;
  y: (heightM: number) => number;
}

const MARGINS: Record<ColumnSize, { left: number; right: number; top: number; bottom: number }> = {
  small: { left: 2, right: 2, top: 3, bottom: 3 },
  medium: { left: 3, right: 3, top: 5, bottom: 4 },
  full: { left: 40, right: 54, top: 8, bottom: 30 },
};

/** How much of the drawn air lies above the highest sensor: room for a lid that is open at the top. */
const HEADROOM = 0.07;

/** Heights to y and temperatures to x, for a drawing of this size. */
export function geometryOf(
  size: ColumnSize,
  width: number,
  height: number,
  levels: readonly ColumnLevel[],
  scale: TemperatureScale,
): Geometry {
  const margin = MARGINS[size];
  const [left, right, top, bottom] = [margin.left, width - margin.right, margin.top, height - margin.bottom];
  const highestM = Math.max(1, ...levels.map(({ heightM }) => heightM));
  const inner = (bottom - top) * (1 - HEADROOM);
  return {
    width,
    height,
    left,
    right,
    top,
    bottom,
    x: (temperatureC) => left + ((temperatureC - scale.lo) / (scale.hi - scale.lo)) * (right - left),
    y: (heightM) => bottom - (heightM / highestM) * inner,
  };
}

/** The scale of a column that stands alone: its own levels, with the band of two standard uncertainties inside. */
export function ownScale(levels: readonly ColumnLevel[]): TemperatureScale {
  const ends = knownLevels(levels).flatMap(({ temperatureC, sigmaC = 0 }) => [
    temperatureC - 2 * sigmaC,
    temperatureC + 2 * sigmaC,
  ]);
  if (ends.length === 0) return { lo: -3, hi: 3 };
  const [lo, hi] = [Math.min(...ends), Math.max(...ends)];
  const missing = Math.max(0, 4 - (hi - lo)) / 2;
  return { lo: Math.floor(lo - missing - 0.3), hi: Math.ceil(hi + missing + 0.3) };
}

/** Whole degrees to mark on the axis: at most about six of them. */
export function ticksOf({ lo, hi }: TemperatureScale): number[] {
  const step = [1, 2, 5, 10].find((each) => (hi - lo) / each <= 7) ?? 20;
  const ticks: number[] = [];
  for (let tick = Math.ceil(lo / step) * step; tick <= hi; tick += step) ticks.push(tick);
  return ticks;
}

/** Moves labels apart that would overlap, keeping their order; the lowest stays above `lowest`. Positions in px down. */
export function spreadLabels(wanted: readonly number[], distance: number, lowest: number): number[] {
  const order = wanted.map((y, index) => ({ y, index })).sort((a, b) => b.y - a.y);
  const placed = new Array<number>(wanted.length);
  let below = lowest + distance;
  for (const { y, index } of order) {
    below = Math.min(y, below - distance);
    placed[index] = below;
  }
  return placed;
}

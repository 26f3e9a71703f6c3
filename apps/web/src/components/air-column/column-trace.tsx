import { colorVar } from '../../theme/palette';
import { knownLevels, unbrokenRuns, type ColumnLevel, type KnownLevel } from './column-data';
import type { ColumnSize, Geometry } from './geometry';

const DRAWN: Record<ColumnSize, { line: number; dot: number; ring: number }> = {
  small: { line: 1.8, dot: 1.7, ring: 1.3 },
  medium: { line: 2.2, dot: 2.6, ring: 1.6 },
  full: { line: 2.4, dot: 3.8, ring: 1.9 },
};

/** Temperature with height: unbroken runs as lines, sensors as open dots, at full size the band of two sigma. */
export function ColumnTrace({
  levels,
  size,
  geometry: { x, y },
}: {
  levels: readonly ColumnLevel[];
  size: ColumnSize;
  geometry: Geometry;
}) {
  const { line, dot, ring } = DRAWN[size];
  const at = ({ temperatureC, heightM }: KnownLevel, offC = 0) =>
    `${x(temperatureC + offC).toFixed(1)},${y(heightM).toFixed(1)}`;
  return (
    <>
      {size === 'full' &&
        unbrokenRuns(levels).map((run) => (
          <polygon
            key={run[0]?.heightM}
            fill={colorVar('air')}
            opacity="0.16"
            points={[
              ...run.map((level) => at(level, -2 * (level.sigmaC ?? 0))),
              ...[...run].reverse().map((level) => at(level, 2 * (level.sigmaC ?? 0))),
            ].join(' ')}
          />
        ))}
      {unbrokenRuns(levels).map((run) => (
        <polyline
          key={run[0]?.heightM}
          fill="none"
          stroke={colorVar('air')}
          strokeWidth={line}
          strokeLinejoin="round"
          points={run.map((level) => at(level)).join(' ')}
        />
      ))}
      {knownLevels(levels).map((level) => (
        <circle
          key={level.heightM}
          cx={x(level.temperatureC)}
          cy={y(level.heightM)}
          r={dot}
          fill={colorVar('card')}
          stroke={colorVar('air')}
          strokeWidth={ring}
        />
      ))}
    </>
  );
}

import { useId } from 'react';
import { decimal } from '../../lib/format/number';
import { colorVar } from '../../theme/palette';
import { dryAdiabat, moistAdiabat, type ColumnPoint } from './adiabats';
import type { ColumnLevel, ColumnLid, TemperatureScale } from './column-data';
import { spreadLabels, ticksOf, type Geometry } from './geometry';

interface FullMarksProps {
  levels: readonly ColumnLevel[];
  lid: ColumnLid | null;
  geometry: Geometry;
  scale: TemperatureScale;
  pressureHPa?: number | undefined;
}

const TEXT = { fontSize: 12.5, fontFamily: 'inherit' } as const;
const LABEL_DISTANCE = 14;

/**
 * What a full-size column adds: heights and temperatures in the margins (never on a line), the axis, and the dry and
 * moist adiabats from each marked degree at the ground.
 */
export function FullMarks({ levels, lid, geometry, scale, pressureHPa }: FullMarksProps) {
  const { left, right, top, bottom, x, y } = geometry;
  const labels = spreadLabels(
    levels.map(({ heightM }) => y(heightM)),
    LABEL_DISTANCE,
    bottom - 3,
  );
  const topM = Math.max(...levels.map(({ heightM }) => heightM)) * 1.07;
  const line = (points: ColumnPoint[]) =>
    points
      .map(({ temperatureC, heightM }) => `${x(temperatureC).toFixed(1)},${y(heightM).toFixed(1)}`)
      .join(' ');
  const clip = useId();
  return (
    <>
      <clipPath id={clip}>
        <rect x={left} y={top} width={right - left} height={bottom - top} />
      </clipPath>
      <g clipPath={`url(#${clip})`} fill="none" stroke={colorVar('mute')} opacity="0.55">
        {ticksOf({ lo: scale.lo, hi: scale.hi + 2 }).map((tick) => (
          <g key={tick}>
            <polyline points={line(dryAdiabat(tick, topM))} strokeWidth="0.9" />
            {pressureHPa !== undefined && (
              <polyline
                points={line(moistAdiabat(tick, pressureHPa, topM))}
                strokeWidth="1.1"
                strokeDasharray="1.5 3"
              />
            )}
          </g>
        ))}
      </g>
      {levels.map(({ heightM, temperatureC }, index) => (
        <g key={heightM} {...TEXT} fill={colorVar(temperatureC === null ? 'unknown' : 'ink')}>
          <text x={left - 8} y={(labels[index] ?? 0) + 4} textAnchor="end" {...lidWeight(heightM, lid)}>
            {heightM}
          </text>
          <text x={right + 48} y={(labels[index] ?? 0) + 4} textAnchor="end">
            {temperatureC === null ? 'no value' : decimal(temperatureC)}
          </text>
          <path d={`M${left - 4} ${y(heightM)}h4M${right} ${y(heightM)}h4`} stroke={colorVar('edge')} />
        </g>
      ))}
      {ticksOf(scale).map((tick) => (
        <g key={tick} {...TEXT} fill={colorVar('mute')}>
          <path d={`M${x(tick)} ${bottom + 2}v4`} stroke={colorVar('edge')} />
          <text x={x(tick)} y={bottom + 19} textAnchor="middle">
            {decimal(tick, 0)}
          </text>
        </g>
      ))}
      <text x={left - 8} y={bottom + 19} textAnchor="end" {...TEXT} fill={colorVar('mute')}>
        m
      </text>
      <text x={right + 48} y={bottom + 19} textAnchor="end" {...TEXT} fill={colorVar('mute')}>
        °C
      </text>
    </>
  );
}

const lidWeight = (heightM: number, lid: ColumnLid | null) =>
  lid?.topM === heightM ? { fontWeight: 600, fill: colorVar('lid') } : {};

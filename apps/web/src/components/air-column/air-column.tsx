import { colorVar } from '../../theme/palette';
import { sharedScale, type ColumnLevel, type ColumnLid, type TemperatureScale } from './column-data';
import { ColumnTrace } from './column-trace';
import { describeColumn } from './describe-column';
import { FullMarks } from './full-marks';
import { geometryOf, ownScale, type ColumnSize } from './geometry';
import { LidDrawing } from './lid-drawing';

const SIZES: Record<ColumnSize, { width: number; height: number }> = {
  small: { width: 40, height: 42 },
  medium: { width: 96, height: 112 },
  full: { width: 360, height: 280 },
};

interface AirColumnProps {
  levels: readonly ColumnLevel[];
  /** The surface inversion's lid; null when there is none. Ignored while the air is not known. */
  lid: ColumnLid | null;
  size: ColumnSize;
  /** One scale for all columns of a list; a full-size column has its own. */
  scale?: TemperatureScale;
  /** False draws the empty dashed frame of *not known*, whatever the levels say. */
  known?: boolean;
  /** Pressure at the ground, hPa: with it a full-size column shows moist adiabats too. */
  pressureHPa?: number;
  /** Width at full size, px; smaller sizes have their own. */
  width?: number;
  height?: number;
}

/**
 * The product's face: height up, temperature across, sensors as open dots, cold air under the lid tinted, the lid a
 * copper line (dashed, with a chevron, where it is open at the top). Not known is an empty dashed frame.
 * Plain SVG, so that the residents' page can carry it.
 */
export function AirColumn({ levels, lid, size, scale, known = true, pressureHPa, ...given }: AirColumnProps) {
  const width = given.width ?? SIZES[size].width;
  const height = given.height ?? SIZES[size].height;
  const shown = known && levels.some(({ temperatureC }) => temperatureC !== null);
  const shownScale = scale ?? (size === 'full' ? ownScale(levels) : sharedScale([levels]));
  const geometry = geometryOf(size, width, height, levels, shownScale);
  const { left, right, top, bottom } = geometry;
  const label = shown ? describeColumn(levels, lid) : 'Air column: not known.';
  return (
    <svg
      width={width}
      height={height}
      viewBox={`0 0 ${width} ${height}`}
      role="img"
      aria-label={label}
      data-column={shown ? (lid ? lid.open : 'no inversion') : 'not known'}
      style={{ flex: 'none', maxWidth: '100%', height: 'auto', display: 'block' }}
    >
      {shown ? (
        <>
          <rect
            x={left}
            y={top}
            width={right - left}
            height={bottom - top}
            fill={colorVar('airSoft')}
            rx="3"
          />
          {lid && <LidDrawing lid={lid} levels={levels} size={size} geometry={geometry} />}
          {size === 'full' && (
            <FullMarks
              levels={levels}
              lid={lid}
              geometry={geometry}
              scale={shownScale}
              pressureHPa={pressureHPa}
            />
          )}
          <ColumnTrace levels={levels} size={size} geometry={geometry} />
        </>
      ) : (
        <rect
          x={left}
          y={top}
          width={right - left}
          height={bottom - top}
          fill="none"
          stroke={colorVar('unknown')}
          strokeDasharray="3 3"
          rx="3"
        />
      )}
      <path
        d={`M${left} ${bottom}H${right}`}
        stroke={colorVar('ground')}
        strokeWidth={size === 'full' ? 3 : 2.5}
        strokeLinecap="round"
      />
    </svg>
  );
}

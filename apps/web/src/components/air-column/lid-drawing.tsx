import { colorVar } from '../../theme/palette';
import { knownLevels, type ColumnLevel, type ColumnLid } from './column-data';
import type { ColumnSize, Geometry } from './geometry';

const LINE: Record<ColumnSize, number> = { small: 2, medium: 2.4, full: 3 };

interface LidDrawingProps {
  lid: ColumnLid;
  levels: readonly ColumnLevel[];
  size: ColumnSize;
  geometry: Geometry;
}

/**
 * The cold air under the lid, tinted, and the lid: a line where the tower reaches it, dashed with a chevron where not.
 * The chevron stands on the side away from the trace.
 */
export function LidDrawing({ lid, levels, size, geometry }: LidDrawingProps) {
  const { left, right, top, bottom, x, y } = geometry;
  const open = lid.open !== 'no';
  const lidY = lid.open === 'at the top' ? top + 1 : y(lid.topM);
  const reach = size === 'small' ? 3 : 5;
  const highest = knownLevels(levels).at(-1);
  const traceIsRight = highest !== undefined && x(highest.temperatureC) > (left + right) / 2;
  const chevronX = traceIsRight ? left + reach + 4 : right - reach - 4;
  return (
    <>
      <rect x={left} y={lidY} width={right - left} height={bottom - lidY} fill={colorVar('lidSoft')} />
      <path
        d={`M${left} ${lidY}H${right}`}
        stroke={colorVar('lid')}
        strokeWidth={LINE[size]}
        strokeDasharray={open ? '5 3' : undefined}
      />
      {open && (
        <path
          d={`M${chevronX - reach} ${lidY + reach + 4}l${reach} ${-reach}l${reach} ${reach}`}
          fill="none"
          stroke={colorVar('lid')}
          strokeWidth={size === 'small' ? 1.4 : 1.8}
          strokeLinecap="round"
          strokeLinejoin="round"
        />
      )}
    </>
  );
}

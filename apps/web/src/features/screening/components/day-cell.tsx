import { colorVar } from '../../../theme/palette';
import type { DayLook } from '../day-words';

const [WIDTH, HEIGHT] = [20, 24];

/** One sensor's day: as high as what can be used, a dashed frame where nothing came, marks for suspect and failed. */
export function DayCell({ look: { kind, share, suspect, failed } }: { look: DayLook }) {
  const high = Math.round(share * (HEIGHT - 2));
  return (
    <svg width={WIDTH} height={HEIGHT} viewBox={`0 0 ${WIDTH} ${HEIGHT}`} aria-hidden="true">
      {kind === 'none' && <circle cx={WIDTH / 2} cy={HEIGHT / 2} r="1.5" fill={colorVar('edge')} />}
      {kind !== 'none' && (
        <rect
          x="1"
          y="1"
          width={WIDTH - 2}
          height={HEIGHT - 2}
          rx="2"
          fill={kind === 'silent' ? 'none' : colorVar('raised')}
          stroke={colorVar(kind === 'silent' ? 'unknown' : 'edge')}
          strokeDasharray={kind === 'silent' ? '3 3' : undefined}
        />
      )}
      {high > 0 && (
        <rect
          x="2"
          y={HEIGHT - 1 - high}
          width={WIDTH - 4}
          height={high}
          fill={colorVar('air')}
          opacity="0.55"
        />
      )}
      {suspect && (
        <path d="M6 10l4-6 4 6z" fill={colorVar('lid')} stroke={colorVar('card')} strokeWidth="1" />
      )}
      {failed && (
        <>
          <path d="M5 13l9 8M14 13l-9 8" stroke={colorVar('card')} strokeWidth="4.5" />
          <path d="M5 13l9 8M14 13l-9 8" stroke={colorVar('ban')} strokeWidth="2.2" />
        </>
      )}
    </svg>
  );
}

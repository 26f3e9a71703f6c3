import type { ReactNode } from 'react';

/** What holds in a district, or is held of a notice. Official AQI colours never stand for these. */
export type StateName = 'none' | 'advisory' | 'burnBan' | 'suspended' | 'unknown';

const DOME = 'M2.2 11.2C2.2 6 4.8 3.2 8 3.2s5.8 2.8 5.8 8';
const GROUND = <path d="M2 14h12" />;

/** One family of shapes over the ground line, so that a state is told without colour. */
const SHAPES: Record<StateName, ReactNode> = {
  none: (
    <>
      {GROUND}
      <path d="M8 11V3M4.8 6 8 2.8 11.2 6" />
    </>
  ),
  advisory: (
    <>
      {GROUND}
      <path d={DOME} />
    </>
  ),
  burnBan: (
    <>
      {GROUND}
      <path d={`${DOME}z`} fill="currentColor" />
    </>
  ),
  suspended: (
    <>
      {GROUND}
      <path d={DOME} strokeDasharray="2.4 2" />
      <path d="M6.6 7.6v3.2M9.4 7.6v3.2" />
    </>
  ),
  unknown: (
    <>
      <path d="M2 14h12" strokeDasharray="2 2" />
      <path d="M5.8 5c.2-1.4 1.1-2.2 2.3-2.2S10.3 3.6 10.3 4.8c0 1.7-2.2 1.8-2.2 3.6M8.1 10.9v.5" />
    </>
  ),
};

/** The shape of a state, in the text's colour: rising arrow, open dome, filled dome, dashed dome, question mark. */
export function StateShape({ state, size = 16 }: { state: StateName; size?: number }) {
  return (
    <svg
      width={size}
      height={size}
      viewBox="0 0 16 16"
      fill="none"
      stroke="currentColor"
      strokeWidth="1.8"
      aria-hidden="true"
      style={{ flex: 'none' }}
    >
      {SHAPES[state]}
    </svg>
  );
}

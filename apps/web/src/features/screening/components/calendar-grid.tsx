import { Box, chakra } from '@chakra-ui/react';
import { useEffect, useRef } from 'react';
import { dayOf } from '../../../lib/format/time';
import { dayLook, dayWords } from '../day-words';
import type { TowerCalendar } from '../types';
import { DayCell } from './day-cell';

const DayButton = chakra('button', {
  base: {
    width: '28px',
    height: '28px',
    borderRadius: 'l1',
    fontSize: 'sm',
    color: 'ink',
    cursor: 'pointer',
    _hover: { bg: 'air-soft' },
  },
  variants: { chosen: { true: { bg: 'air', color: 'on-air', _hover: { bg: 'air-strong' } } } },
});
const SensorHead = chakra('th', {
  base: {
    ...{ textAlign: 'start', fontWeight: '400', whiteSpace: 'nowrap', pe: '2', ps: '0' },
    ...{ position: 'sticky', left: '0', bg: 'card', fontSize: 'sm' },
  },
});
const Month = chakra('th', {
  base: { textAlign: 'start', fontWeight: '600', fontSize: 'sm', color: 'mute', whiteSpace: 'nowrap' },
});

interface CalendarGridProps {
  calendar: TowerCalendar;
  /** The days the chart shows. */
  chosen: readonly string[];
  onDay: (day: string) => void;
}

/** The months of the days, each with how many of its days are shown. */
function monthsOf(days: TowerCalendar['days']): { name: string; days: number }[] {
  const months: { name: string; days: number }[] = [];
  for (const { day } of days) {
    const name = new Date(`${day}T12:00:00Z`).toLocaleString('en-US', {
      ...{ month: 'short', year: 'numeric', timeZone: 'UTC' },
    });
    if (months.at(-1)?.name === name) months.at(-1)!.days += 1;
    else months.push({ name, days: 1 });
  }
  return months.map(({ name, days: n }) => ({ name: n < 3 ? '' : name, days: n }));
}

/** Days across, sensors down; each day's number is a button that shows its readings. */
export function CalendarGrid({ calendar: { days, sensors, timeZone }, chosen, onDay }: CalendarGridProps) {
  const frame = useRef<HTMLDivElement>(null);
  const last = chosen[0];
  useEffect(() => {
    const button = frame.current?.querySelector(`[data-day="${last}"]`)?.getBoundingClientRect();
    const seen = frame.current?.getBoundingClientRect();
    if (button && seen) frame.current!.scrollLeft += button.left - seen.left - seen.width / 2;
  }, [last, days]);
  return (
    <Box
      ref={frame}
      position="relative"
      overflowX="auto"
      tabIndex={0}
      role="region"
      aria-label="Calendar"
      pb="1"
    >
      <chakra.table borderCollapse="collapse">
        <chakra.caption srOnly>Completeness of each day by sensor</chakra.caption>
        <thead>
          <tr>
            <SensorHead as="td" />
            {monthsOf(days).map(({ name, days: n }, i) => (
              <Month key={i} as={name ? 'th' : 'td'} colSpan={n}>
                {name}
              </Month>
            ))}
          </tr>
          <tr>
            <SensorHead as="td" />
            {days.map(({ day, from }) => (
              <chakra.th key={day} scope="col" p="0">
                <DayButton
                  type="button"
                  data-day={day}
                  chosen={chosen.includes(day)}
                  aria-pressed={chosen.includes(day)}
                  aria-label={`Show ${dayOf(from, timeZone)}`}
                  onClick={() => onDay(day)}
                >
                  {Number(day.slice(8))}
                </DayButton>
              </chakra.th>
            ))}
          </tr>
        </thead>
        <tbody>
          {sensors.map(({ sensorId, name }, k) => (
            <tr key={sensorId}>
              <SensorHead scope="row">{name}</SensorHead>
              {days.map(({ day, from, sensors: own }) => (
                <chakra.td
                  key={day}
                  p="0"
                  textAlign="center"
                  title={`${dayOf(from, timeZone)}: ${dayWords(own[k]!)}`}
                >
                  <Box display="flex" justifyContent="center">
                    <DayCell look={dayLook(own[k]!)} />
                  </Box>
                  <Box srOnly>{dayWords(own[k]!)}</Box>
                </chakra.td>
              ))}
            </tr>
          ))}
        </tbody>
      </chakra.table>
    </Box>
  );
}

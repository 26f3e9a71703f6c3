import type { ChartOptions } from 'chart.js';
import type { DistrictHistory } from '../../lib/api/types';
import { rangeText } from '../../lib/format/range';
import { dayAndTime } from '../../lib/format/time';
import type { ColorName } from '../../theme/palette';
import { NOTICE_ROOM_PX } from './strength-backdrop';
import type { StrengthPoint } from './strength-series';

interface Shown {
  history: DistrictHistory;
  colors: Record<ColorName, string>;
  /** The point of the history behind each x. */
  behind: ReadonlyMap<number, StrengthPoint>;
  /** What the axis must reach, °C. */
  highest: number;
}

const SURE = { true: 'sure', false: 'not sure', 'not known': '' } as const;

/** Chart.js options for the strength history: the district's zone on the axis, a 24-hour clock, no animation. */
export function strengthOptions({ history, colors, behind, highest }: Shown): ChartOptions<'line' | 'bar'> {
  const zone = history.timeZone;
  const [from, to] = [new Date(history.from).getTime(), new Date(history.to).getTime()];
  const days = (to - from) / 86_400_000;
  const text = { color: colors.mute, font: { family: '"Source Sans 3", sans-serif', size: 12.5 } };
  return {
    responsive: true,
    maintainAspectRatio: false,
    animation: false,
    layout: { padding: { top: NOTICE_ROOM_PX } },
    interaction: { mode: 'nearest', axis: 'x', intersect: false },
    scales: {
      x: {
        type: 'time',
        min: from,
        max: to,
        adapters: { date: { zone, locale: 'en-GB' } },
        time: {
          unit: days > 45 ? 'month' : days > 3 ? 'day' : 'hour',
          displayFormats: { hour: 'ccc HH:mm', day: 'd LLL', month: 'LLL yyyy' },
        },
        ticks: { ...text, maxRotation: 0, autoSkipPadding: 24 },
        grid: { display: false },
        border: { color: colors.ground, width: 2 },
      },
      y: {
        min: 0,
        suggestedMax: Math.max(4, highest),
        ticks: { ...text, maxTicksLimit: 6 },
        grid: { color: colors.line },
        border: { display: false },
        title: { display: true, text: '°C', ...text },
      },
    },
    plugins: {
      legend: { display: false },
      tooltip: {
        displayColors: false,
        backgroundColor: colors.ink,
        titleColor: colors.card,
        bodyColor: colors.card,
        callbacks: {
          title: ([item]) => {
            const point = behind.get(Number(item?.parsed.x));
            return point ? dayAndTime(point.x, zone) : '';
          },
          label: ({ parsed }) => {
            const point = behind.get(Number(parsed.x))?.from;
            if (!point) return '';
            return `${rangeText(point.strength, { unit: '°C', style: 'words' })} · ${SURE[point.sure]}`;
          },
        },
      },
    },
  };
}

import type { ChartOptions } from 'chart.js';
import { decimal } from '../../lib/format/number';
import { dayAndTime } from '../../lib/format/time';
import type { ColorName } from '../../theme/palette';
import type { RawPoint, Reach } from './raw-points';
import type { RawReadings } from './types';
import { CHECK_NAME, QUALITY_NAME } from './words';

interface Shown {
  raw: RawReadings;
  unit: string;
  reach: Reach;
  colors: Record<ColorName, string>;
}

const HOUR_MS = 3_600_000;

/** What is said of the reading under the pointer. */
export function readingWords(name: string, unit: string, { reading }: RawPoint): string {
  if (!reading) return '';
  const { value, corrected, quality, checks = [] } = reading;
  const parts = [`${name}: ${decimal(value, 2)} ${unit}`];
  if (corrected !== undefined) parts.push(`corrected ${decimal(corrected, 2)} ${unit}`);
  if (quality !== 'valid' || checks.length > 0) parts.push(QUALITY_NAME[quality]);
  return [...parts, ...checks.map((check) => CHECK_NAME[check])].join(', ');
}

/** Chart.js options for raw readings: the tower's zone on the axis, a 24-hour clock, no animation. */
export function rawOptions({ raw, unit, reach, colors }: Shown): ChartOptions<'line'> {
  const [from, to] = [Date.parse(raw.from), Date.parse(raw.to)];
  const text = { color: colors.mute, font: { family: '"Source Sans 3", sans-serif', size: 12.5 } };
  return {
    ...{ responsive: true, maintainAspectRatio: false, animation: false, parsing: false, normalized: true },
    layout: { padding: { top: 22, right: 76 } },
    interaction: { mode: 'nearest', axis: 'xy', intersect: false },
    scales: {
      x: {
        type: 'time',
        ...{ min: from, max: to },
        adapters: { date: { zone: raw.timeZone, locale: 'en-GB' } },
        time: {
          unit: to - from > 50 * HOUR_MS ? 'day' : 'hour',
          displayFormats: { hour: 'HH:mm', day: 'ccc d LLL' },
        },
        ticks: { ...text, maxRotation: 0, autoSkipPadding: 20 },
        grid: { display: false },
        border: { color: colors.ground, width: 2 },
      },
      y: {
        ...{ min: reach.lowest, max: reach.highest },
        ticks: {
          ...{ ...text, maxTicksLimit: 7, includeBounds: false },
          callback: (value) => decimal(Number(value), reach.highest - reach.lowest < 8 ? 1 : 0),
        },
        grid: { color: colors.line },
        border: { display: false },
        title: { display: true, text: unit, ...text },
      },
    },
    plugins: {
      legend: { display: false },
      tooltip: {
        displayColors: false,
        ...{ backgroundColor: colors.ink, titleColor: colors.card, bodyColor: colors.card },
        callbacks: {
          title: ([item]) => (item ? dayAndTime(Number(item.parsed.x), raw.timeZone) : ''),
          label: ({ dataset, raw: point }) => readingWords(dataset.label ?? '', unit, point as RawPoint),
        },
      },
    },
  };
}

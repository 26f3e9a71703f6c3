import { instantOf, localTime } from './basin-time';
import { chance, numberOf } from './noise';
import type { Mishap, Story } from './story';
import type { DemoSensor, DemoTower } from './tower-list';

/** Share of rows that never reach the file: with the outages some 98 % are there. */
const LOST_SHARE = 0.013;

/** Share of readings struck by a spike, and its size, °C or the sensor's unit. */
const SPIKE_SHARE = 0.0004;
const SPIKE_SIZE = [9, 20] as const;

/** The mishap of a kind that a tower suffers at an instant, if any. */
function mishapAt(
  story: Story,
  kind: 'outages' | 'stuck' | 'clocks',
  tower: DemoTower,
  t: number,
): Mishap | undefined {
  const { day } = localTime(t);
  const season = story.season(day);
  if (!season || story.isAroundTheStart(day)) return undefined;
  return season.winter[kind].find((mishap) => {
    const begin = instantOf(day - season.day + mishap.day, mishap.hour);
    return mishap.tower === tower.slug && t > begin && t <= begin + mishap.hours * 3600;
  });
}

/** Whether the row of an instant is lost: an outage, or one of the few that go astray. */
export function isLost(story: Story, tower: DemoTower, t: number): boolean {
  return (
    mishapAt(story, 'outages', tower, t) !== undefined ||
    chance(story.seed, 200, numberOf(tower.slug), t) < LOST_SHARE
  );
}

/** Seconds by which a logger's clock is wrong at an instant; it stamps its rows by it. */
export function clockErrorS(story: Story, tower: DemoTower, t: number): number {
  return (mishapAt(story, 'clocks', tower, t)?.minutes ?? 0) * 60;
}

/** The instant whose value a sensor shows: its own, or that at which it got stuck. */
export function shownInstant(story: Story, tower: DemoTower, sensor: DemoSensor, t: number): number {
  const stuck = mishapAt(story, 'stuck', tower, t);
  if (stuck?.sensor !== sensor.name) return t;
  const { day } = localTime(t);
  return instantOf(day - (story.season(day)?.day ?? 0) + stuck.day, stuck.hour);
}

/** What a spike adds to a reading; almost always 0. */
export function spike(story: Story, tower: DemoTower, sensor: DemoSensor, t: number): number {
  if (sensor.quantity !== 'air temperature') return 0;
  const channel = numberOf(tower.slug + sensor.name);
  if (chance(story.seed, 201, channel, t) >= SPIKE_SHARE) return 0;
  const size = SPIKE_SIZE[0] + (SPIKE_SIZE[1] - SPIKE_SIZE[0]) * chance(story.seed, 202, channel, t);
  return chance(story.seed, 203, channel, t) < 0.5 ? size : -size;
}

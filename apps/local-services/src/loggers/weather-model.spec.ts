import { dayOfDate, instantOf, localTime } from './basin-time';
import { hourlySmoke } from './smoke';
import { Story, type Weather } from './story';
import { floorHumidityPct, SITES, towerTemperatureC, towerWindMPerS, type Site } from './tower-air';

const story = new Story(20_251, Date.UTC(2026, 10, 30, 22) / 1000);
const site = (slug: string): Site => SITES[slug] as Site;
const mill = (t: number, heightM: number): number => towerTemperatureC(story, site('mill-mast'), t, heightM);
const gainC = (t: number): number => mill(t, 60) - mill(t, 2);

const NOVEMBER = dayOfDate(2025, 11, 1);
const DAYS = Array.from({ length: 120 }, (_, i) => NOVEMBER + i);
const daysOf = (...letters: Weather[]): number[] =>
  DAYS.filter((day) => letters.includes(story.weather(day)));
const hours = (from: number, to: number): number[] => Array.from({ length: to - from }, (_, i) => from + i);
const mean = (values: readonly number[]): number => values.reduce((sum, v) => sum + v, 0) / values.length;
const smokeDay = (day: number): number =>
  mean(hours(1, 25).map((h) => hourlySmoke(story, 1, instantOf(day, h))));

/** The demo's own table of one clear calm January night: local hour, then °C at 2, 10, 30 and 60 m. */
const JANUARY_NIGHT: readonly [hour: number, ...levels: number[]][] = [
  [15.67, -1.0, -1.2, -1.4, -1.7],
  [17.5, -3.2, -2.6, -2.2, -2.1],
  [20, -6.5, -5.0, -3.8, -3.3],
  [26, -9.5, -7.7, -5.6, -4.4],
  [31, -11.0, -9.0, -6.6, -5.2],
  [33.5, -8.5, -8.2, -6.4, -5.0],
  [35.25, -3.5, -3.7, -3.9, -4.2],
];

describe('the clear calm January night on the Mill mast', () => {
  it.each(JANUARY_NIGHT)('is within 1.3 °C of the table at local hour %p', (hour, ...levels) => {
    const t = instantOf(dayOfDate(2026, 1, 13), hour);
    [2, 10, 30, 60].forEach((heightM, i) => {
      expect(Math.abs(mill(t, heightM) - (levels[i] ?? NaN))).toBeLessThan(1.3);
    });
  });

  it('has at least half of its gain below 30 m and is open at the top before dawn', () => {
    const t = instantOf(dayOfDate(2026, 1, 14), 6);
    expect(mill(t, 30) - mill(t, 2)).toBeGreaterThan(gainC(t) / 2);
    expect(mill(t, 60)).toBeGreaterThan(mill(t, 30));
  });
});

describe('nights of a winter', () => {
  const best = (day: number): number => Math.max(...hours(20, 30).map((h) => gainC(instantOf(day, h))));
  it('gain 3 to 6.5 °C when clear, 9 °C at the season’s best', () => {
    const clear = daysOf('C').map(best);
    expect(Math.min(...clear)).toBeGreaterThan(3);
    expect(Math.max(...clear)).toBeLessThan(6.8);
    expect(best(daysOf('X')[0] as number)).toBeCloseTo(9, 0);
  });
  it('gain next to nothing in wind', () => {
    expect(Math.max(...daysOf('W').map(best))).toBeLessThan(0.5);
  });
});

describe('the cold pool', () => {
  const stratus = daysOf('4', '5');
  const noons = stratus.map((day) => instantOf(day, 13));
  it('keeps the mast mixed all day under stratus', () => {
    for (const day of stratus) {
      for (const h of [12, 16, 20, 24, 28]) {
        const gain = gainC(instantOf(day, h));
        expect(gain).toBeGreaterThan(-0.8);
        expect(gain).toBeLessThan(0);
      }
    }
  });
  it('leaves the relay on the tarn 4 to 8 °C warmer than the mast', () => {
    for (const t of noons) {
      const warmer = towerTemperatureC(story, site('tarn-relay'), t, 2) - mill(t, 2);
      expect(warmer).toBeGreaterThan(4);
      expect(warmer).toBeLessThan(9);
    }
  });
  it('gathers smoke from day to day', () => {
    const first = daysOf('1').find((day) => story.weather(day + 4) === '5') as number;
    const days = [0, 1, 2, 3, 4].map((i) => smokeDay(first + i));
    [18, 26, 33, 40, 46].forEach((told, i) => expect(Math.abs((days[i] ?? 0) - told)).toBeLessThan(6));
  });
});

describe('the warm wind', () => {
  const day = daysOf('E')[1] as number;
  const times = hours(0, 40).map((i) => instantOf(day, 7) + i * 600);
  it('warms 2 m by 6 to 10 °C within two hours, drops the humidity and blows the smoke away', () => {
    const rises = times.slice(0, -12).map((t) => mill(t + 7200, 2) - mill(t, 2));
    expect(Math.max(...rises)).toBeGreaterThan(6);
    expect(Math.max(...rises)).toBeLessThan(11);
    const [before, after] = [instantOf(day, 8), instantOf(day, 12)];
    expect(floorHumidityPct(story, before)).toBeGreaterThan(85);
    expect(floorHumidityPct(story, after)).toBeLessThan(52);
    expect(towerWindMPerS(story, site('mill-mast'), after)).toBeGreaterThan(6);
    expect(hourlySmoke(story, 1, after + 3600)).toBeLessThan(10);
  });
  it('is felt at 60 m twenty to forty minutes before it is felt at 2 m', () => {
    const half = (heightM: number): number => {
      const [from, to] = [mill(instantOf(day, 8), heightM), mill(instantOf(day, 11.5), heightM)];
      return times.find((t) => mill(t, heightM) > (from + to) / 2) ?? NaN;
    };
    expect((half(2) - half(60)) / 60).toBeGreaterThanOrEqual(20);
    expect((half(2) - half(60)) / 60).toBeLessThanOrEqual(40);
  });
});

describe('smoke in Mill Flats', () => {
  it('has a winter mean of 11 to 14.5 µg/m³ and four to ten days over 35', () => {
    const days = DAYS.map(smokeDay);
    expect(mean(days)).toBeGreaterThan(11);
    expect(mean(days)).toBeLessThan(14.5);
    const over = days.filter((d) => d > 35).length;
    expect(over).toBeGreaterThanOrEqual(4);
    expect(over).toBeLessThanOrEqual(10);
  });
  it('peaks between 20 and 23 h and is low at noon on clear nights', () => {
    for (const day of daysOf('C')) {
      const peak = Math.max(...hours(20, 24).map((h) => hourlySmoke(story, 1, instantOf(day, h))));
      expect(peak).toBeGreaterThan(38);
      expect(peak).toBeLessThan(90);
      expect(hourlySmoke(story, 1, instantOf(day, 14))).toBeLessThan(13);
    }
  });
  it('is sometimes reported as less than nothing', () => {
    const all = DAYS.flatMap((day) => hours(1, 25).map((h) => hourlySmoke(story, 0.65, instantOf(day, h))));
    expect(Math.min(...all)).toBeGreaterThan(-4);
  });
});

describe('the story', () => {
  it('tells of a cold pool whose last night was clear again, at whatever date the demo is first started', () => {
    for (const start of [Date.UTC(2026, 6, 14, 3), Date.UTC(2027, 0, 31, 12), Date.UTC(2028, 1, 29, 23)]) {
      const told = new Story(1, start / 1000);
      const { day } = localTime(start / 1000);
      const days = [-4, -3, -2, -1, 0, 1, 2, 3, 4];
      expect(days.map((i) => told.weather(day + i)).join('')).toBe('12323456E');
      const noon = instantOf(day, 12);
      expect(hourlySmoke(told, 1, noon)).toBeGreaterThan(20);
    }
  });
});

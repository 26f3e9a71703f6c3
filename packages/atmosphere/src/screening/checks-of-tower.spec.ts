import type { Quality } from '../profile';
import { screenTower, type ScreenedReading, type ScreeningInput, type SensorSeries } from '.';

const S = 600;
const sensor = (sensorId: string, heightM: number, values: readonly number[]): SensorSeries => ({
  ...{ sensorId, heightM, quantity: 'air temperature', intervalS: S },
  readings: values.map((value, i) => ({ tEnd: (i + 1) * S, value })),
});
type Given = Pick<ScreeningInput, 'sensors' | 'overrides'>;
const screened = (input: Given, id: string): readonly ScreenedReading[] =>
  screenTower({ from: 0, to: 1e9, ...input }).get(id)!;
const qualities = (input: Given, id = 'a'): Quality[] => screened(input, id).map((r) => r.quality);

describe('a broken level', () => {
  /** Levels that go on cooling, the middle one far off for the second half. */
  const cooling = (base: number) =>
    Array.from({ length: 60 }, (_, i) => base - i * 0.1 + ((i * 7) % 10) / 20);
  const levels = (middle: readonly number[]) => [
    sensor('low', 2, cooling(-6)),
    sensor('a', 10, middle),
    sensor('high', 60, cooling(-3)),
  ];
  const stuck = cooling(-5).map((v, i) => (i < 20 ? v : 3));
  const wandering = cooling(-5).map((v, i) => (i < 20 ? v : v + 8));
  const setAside = (quality: 'valid' | 'failed') => ({
    overrides: [{ sensorId: 'a', from: 21 * S, to: 60 * S, quality, reason: 'cable', at: 1 }],
  });
  const checksOf = (input: Given, id: string) =>
    new Set(screened(input, id).flatMap(({ flags }) => flags.map(({ check }) => check)));

  it('that is stuck makes no other suspect', () => {
    expect(new Set(qualities({ sensors: levels(stuck) }, 'low'))).toEqual(new Set(['valid']));
    expect(qualities({ sensors: levels(stuck) })).toContain('failed');
  });
  it('makes others suspect until a person sets it aside, and is still told what it did', () => {
    const sensors = levels(wandering);
    expect(qualities({ sensors }, 'high')).toContain('suspect');
    expect(new Set(qualities({ sensors, ...setAside('failed') }, 'high'))).toEqual(new Set(['valid']));
    expect(qualities({ sensors, ...setAside('failed') }).filter((q) => q === 'failed')).toHaveLength(40);
    expect(checksOf({ sensors, ...setAside('failed') }, 'a')).toContain('vertical');
  });
  it('is no step for what comes after it', () => {
    const back = cooling(-5).map((v, i) => (i < 20 || i >= 40 ? v : v + 8));
    const overrides = [{ ...setAside('failed').overrides[0]!, to: 40 * S }];
    const after = (input: Omit<Given, 'sensors'>) =>
      qualities({ sensors: levels(back), ...input }).slice(40, 46);
    expect(after({})).toContain('suspect');
    expect(new Set(after({ overrides }))).toEqual(new Set(['valid']));
  });
  it('is evidence again where a person sets it right', () => {
    expect(qualities({ sensors: levels(stuck), ...setAside('valid') }, 'low')).toContain('suspect');
  });
});

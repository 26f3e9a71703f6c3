import { clockShifts, type Arrival } from './clock-shift';

const FROM = Date.UTC(2026, 9, 25) / 1000;
const HOUR_S = 3600;

/** Arrivals of a logger that sends `lagS` after each interval's end; `change` alters one. */
const logger = (
  count: number,
  { everyS = 600, lagS = 40 }: { everyS?: number; lagS?: number },
  change: (arrival: Arrival, i: number) => Arrival | undefined = (arrival) => arrival,
): Arrival[] =>
  Array.from({ length: count }, (_, i) => i).flatMap((i) => {
    const newestT = FROM + i * everyS;
    return change({ receivedAt: newestT + lagS + (i % 3) * 7, newestT }, i) ?? [];
  });
const stampsBy =
  (byS: number, fromI: number, untilI = Infinity) =>
  (arrival: Arrival, i: number) =>
    i >= fromI && i < untilI ? { ...arrival, newestT: arrival.newestT + byS } : arrival;

describe('a clock shifted by an hour', () => {
  it.each([60, 300, 600, 900, 1800, 3600])('is seen at an interval of %i s, both ways', (everyS) => {
    const back = logger(30, { everyS }, stampsBy(-HOUR_S, 15));
    expect(clockShifts(back, everyS)).toEqual([{ at: back[15]!.receivedAt, hours: -1 }]);
    const on = logger(30, { everyS, lagS: 4000 }, stampsBy(HOUR_S, 15));
    expect(clockShifts(on, everyS)).toEqual([{ at: on[15]!.receivedAt, hours: 1 }]);
  });

  it('is seen from the third arrival on, and its end too', () => {
    const arrivals = logger(40, {}, stampsBy(-HOUR_S, 12, 24));
    expect(clockShifts(arrivals.slice(0, 14), 600)).toEqual([]);
    expect(clockShifts(arrivals.slice(0, 15), 600)).toHaveLength(1);
    expect(clockShifts(arrivals, 600).map(({ hours }) => hours)).toEqual([-1, 1]);
  });

  it('is seen where the logger is asked once an hour', () => {
    const arrivals = logger(30, { everyS: HOUR_S, lagS: 200 }, stampsBy(-HOUR_S, 15));
    expect(clockShifts(arrivals, 600)).toHaveLength(1);
  });

  const FALSE_ALARMS: Record<string, Arrival[]> = {
    'a steady logger': logger(200, {}),
    'a link that is down for an hour and then sends in order': logger(60, {}, (arrival, i) =>
      i >= 20 && i < 26
        ? { ...arrival, receivedAt: FROM + 26 * 600 + 40 + i }
        : { ...arrival, receivedAt: arrival.receivedAt + (i < 20 ? 0 : 30) },
    ),
    'a link that begins to delay by an hour': logger(60, {}, (arrival, i) =>
      i < 20 ? arrival : { ...arrival, receivedAt: arrival.receivedAt + HOUR_S },
    ),
    'a pause of an hour and then as before': logger(60, {}, (arrival, i) =>
      i >= 20 && i < 26 ? undefined : arrival,
    ),
    'delays that come and go': logger(200, {}, (arrival, i) => ({
      ...arrival,
      receivedAt: arrival.receivedAt + ((i * 7919) % 11) * 400,
    })),
    'a shift by half an hour': logger(60, {}, stampsBy(-1800, 20)),
    'a shift by two hours': logger(60, {}, stampsBy(-7200, 20)),
    'one file of old readings among the new': logger(60, {}, stampsBy(-HOUR_S, 20, 21)),
    'too few to tell': logger(8, {}, stampsBy(-HOUR_S, 4)),
    'nothing at all': [],
  };
  it.each(Object.keys(FALSE_ALARMS))('is not %s', (name) => {
    expect(clockShifts(FALSE_ALARMS[name]!, 600)).toEqual([]);
  });
});

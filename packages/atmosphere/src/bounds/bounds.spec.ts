import fc from 'fast-check';
import {
  add,
  and,
  atLeast,
  atMost,
  between,
  compare,
  COMPARISONS,
  divide,
  exactly,
  fromMeasured,
  fromWire,
  isKnown,
  isNotKnown,
  maximum,
  median,
  minimum,
  multiply,
  narrow,
  not,
  NotANumberError,
  notKnown,
  or,
  scale,
  subtract,
  toWire,
  type Comparison,
  type Quantity,
  type Truth,
} from '.';

const [T, F, U]: Truth[] = ['true', 'false', 'not known'];
const number = fc.integer({ min: -50, max: 50 });
const quantity: fc.Arbitrary<Quantity> = fc.oneof(
  number.map((x) => exactly(x)),
  fc.tuple(number, number).map(([a, b]) => between(Math.min(a, b), Math.max(a, b))),
  number.map((x) => atLeast(x)),
  number.map((x) => atMost(x)),
  fc.constant(notKnown('silent')),
);
const inside = (q: Quantity): number => (q.lo === -Infinity ? Math.min(q.hi, 0) : q.lo);

describe('quantities', () => {
  it('are never NaN', () => {
    for (const make of [() => exactly(NaN), () => between(NaN, 1), () => atLeast(NaN), () => atMost(NaN)]) {
      expect(make).toThrow(NotANumberError);
    }
    expect(() => exactly(Infinity)).toThrow(NotANumberError);
    expect(() => between(2, 1)).toThrow('upside down');
    expect(() => notKnown('')).toThrow('reason');
  });

  it.each([null, undefined, NaN, Infinity])('take a measured %s as not known, with its reason', (value) => {
    expect(fromMeasured(value, 'nothing from 10 m')).toEqual({
      lo: -Infinity,
      hi: Infinity,
      reason: 'nothing from 10 m',
    });
  });

  it('tell known, range and not known apart', () => {
    expect([exactly(1), atLeast(1), notKnown('x')].map(isKnown)).toEqual([true, false, false]);
    expect([exactly(1), atLeast(1), notKnown('x')].map(isNotKnown)).toEqual([false, false, true]);
    expect(isNotKnown(between(-Infinity, Infinity))).toBe(true);
    expect(Object.is(exactly(-0).lo, 0)).toBe(true);
  });
});

describe('compare', () => {
  const cases: [string, Quantity, Comparison, number, Truth][] = [
    ['exactly the limit', exactly(5), '>=', 5, T!],
    ['exactly the limit, strictly', exactly(5), '>', 5, F!],
    ['at least above', atLeast(5.8), '>=', 5, T!],
    ['at least on the limit, strictly', atLeast(5), '>', 5, U!],
    ['at least below', atLeast(3), '>=', 5, U!],
    ['at least is never below', atLeast(5), '<', 5, F!],
    ['at most below', atMost(3), '<', 5, T!],
    ['at most on the limit', atMost(5), '<=', 5, T!],
    ['at most on the limit, strictly', atMost(5), '<', 5, U!],
    ['a range across', between(4, 6), '>=', 5, U!],
    ['a range whose end is the limit', between(4, 5), '>', 5, F!],
    ['a range whose end is the limit, reached', between(4, 5), '>=', 5, U!],
    ['equal', exactly(5), '=', 5, T!],
    ['a range never equals', between(4, 6), '=', 5, U!],
    ['outside is unequal', between(6, 7), '=', 5, F!],
    ['not known', notKnown('silent'), '>=', 5, U!],
    ['not known', notKnown('silent'), '<', 5, U!],
  ];
  it.each(cases)('%s', (_, q, comparison, value, expected) => {
    expect(compare(q, comparison, value)).toBe(expected);
  });

  it('refuses a limit that is no number, and a comparison that is none', () => {
    expect(() => compare(exactly(1), '>', NaN)).toThrow(NotANumberError);
    expect(() => compare({ lo: NaN, hi: 1 }, '>', 1)).toThrow(NotANumberError);
    expect(() => compare(exactly(1), '!=' as Comparison, 1)).toThrow('Use one of');
  });

  it('never turns not known into true or false when the range grows', () => {
    fc.assert(
      fc.property(
        quantity,
        fc.nat(20),
        fc.nat(20),
        fc.constantFrom(...COMPARISONS),
        number,
        (q, down, up, op, limit) => {
          const wider = between(q.lo - down, q.hi + up, 'wider');
          const [narrower, wide] = [compare(q, op, limit), compare(wider, op, limit)];
          expect(wide === U || wide === narrower).toBe(true);
        },
      ),
    );
  });
});

describe("Kleene's strong tables", () => {
  const table: [Truth, Truth, Truth, Truth][] = [
    [T!, T!, T!, T!],
    [T!, F!, F!, T!],
    [T!, U!, U!, T!],
    [F!, F!, F!, F!],
    [F!, U!, F!, U!],
    [U!, U!, U!, U!],
  ];
  it.each(table)('%s with %s', (a, b, both, either) => {
    expect([and(a, b), and(b, a), or(a, b), or(b, a)]).toEqual([both, both, either, either]);
  });
  it('turns true and false round and leaves not known', () => {
    expect([not(T!), not(F!), not(U!)]).toEqual([F, T, U]);
    expect([and(), or()]).toEqual([T, F]);
  });
});

describe('arithmetic', () => {
  it('holds every possible result', () => {
    fc.assert(
      fc.property(quantity, quantity, number, (a, b, factor) => {
        const [x, y] = [inside(a), inside(b)];
        const holds = (q: Quantity, value: number) => expect(q.lo <= value && value <= q.hi).toBe(true);
        holds(add(a, b), x + y);
        holds(subtract(a, b), x - y);
        holds(multiply(a, b), x * y);
        holds(scale(a, factor), x * factor);
        holds(maximum(a, b), Math.max(x, y));
        holds(minimum(a, b), Math.min(x, y));
      }),
    );
  });

  it('keeps open ends and reasons', () => {
    expect(add(atLeast(2, 'open'), exactly(3))).toEqual({ lo: 5, hi: Infinity, reason: 'open' });
    expect(subtract(exactly(3), atLeast(2, 'open'))).toEqual({ lo: -Infinity, hi: 1, reason: 'open' });
    expect(scale(atLeast(2), -1)).toEqual({ lo: -Infinity, hi: -2 });
    expect(multiply(notKnown('silent'), exactly(0))).toEqual(exactly(0));
    expect(isNotKnown(divide(exactly(1), 0))).toBe(true);
    expect(narrow(notKnown('silent'), between(0, Infinity))).toEqual({
      lo: 0,
      hi: Infinity,
      reason: 'silent',
    });
  });

  it('bounds the greatest, least and median by what is known', () => {
    const silent = notKnown('silent');
    expect(maximum(exactly(5), silent)).toEqual({ lo: 5, hi: Infinity, reason: 'silent' });
    expect(minimum(exactly(5), silent)).toEqual({ lo: -Infinity, hi: 5, reason: 'silent' });
    expect(median(exactly(1), exactly(5), silent)).toEqual({ lo: 1, hi: 5, reason: 'silent' });
    expect(median(exactly(1), exactly(5))).toEqual(exactly(3));
    expect([maximum(), minimum(), median()].every(isNotKnown)).toBe(true);
  });
});

describe('wire form', () => {
  it('goes there and back', () => {
    fc.assert(
      fc.property(quantity, (q) => expect(fromWire(JSON.parse(JSON.stringify(toWire(q))))).toEqual(q)),
    );
  });
  it('says at least', () => {
    expect(toWire(atLeast(5.8))).toEqual({ atLeast: 5.8 });
    expect(toWire(notKnown('silent'))).toEqual({ notKnown: 'silent' });
  });
});

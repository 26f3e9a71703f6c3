import fc from 'fast-check';
import { atLeast, exactly, isNotKnown, notKnown, type Quantity } from '../bounds';
import {
  episodesOf,
  episodeSettingsProblems,
  episodeStep,
  liveDurationS,
  NO_EPISODE,
  type EpisodeBlock,
  type EpisodeSettings,
} from '.';

const B = 900;
const settings: EpisodeSettings = {
  onC: 2,
  onForS: 2 * B,
  offC: 1,
  offForS: 2 * B,
  gapLimitS: 2 * B,
  blockS: B,
};
const strength = (value: number | null | Quantity): Quantity =>
  value === null ? notKnown('silent') : typeof value === 'number' ? exactly(value) : value;
const blocks = (...values: (number | null | Quantity)[]): EpisodeBlock[] =>
  values.map((value, i) => ({ tEnd: (i + 1) * B, strengthC: strength(value) }));
const brief = (...values: (number | null | Quantity)[]) =>
  episodesOf(blocks(...values), settings).map((e) => [
    e.onset / B,
    e.end === null ? null : e.end / B,
    e.howEnded,
    e.bridgedS / B,
  ]);

describe('episodesOf', () => {
  it.each<[string, (number | null | Quantity)[], unknown[]]>([
    [
      'onset and end are the first blocks of their runs',
      [0, 2, 3, 3, 0, 0, 0],
      [[2, 5, 'below the off-limit', 0]],
    ],
    [
      'on the on-limit counts, on the off-limit does not end',
      [2, 2, 1, 1, 0, 0],
      [[1, 5, 'below the off-limit', 0]],
    ],
    ['a run shorter than the on-time is none', [0, 2, 0, 2, 0], []],
    ['between the limits begins nothing', [1.5, 1.5, 1.5], []],
    ['between the limits ends nothing', [2, 2, 1.5, 1.5, 1.5], [[1, null, 'goes on', 0]]],
    ['a short dip ends nothing', [2, 2, 0, 2, 0, 0], [[1, 5, 'below the off-limit', 0]]],
    ['a gap is bridged and counted', [2, 2, null, null, 2, 0, 0], [[1, 6, 'below the off-limit', 2]]],
    ['beyond the gap limit the end is not known', [2, 2, null, null, null, 2], [[1, null, 'not known', 0]]],
    ['a gap adds nothing to the on-time', [2, null, 0], []],
    ['a gap within the on-time is bridged', [2, null, 2, 0, 0], [[1, 4, 'below the off-limit', 1]]],
    ['a gap adds nothing to the off-time', [2, 2, 0, null, 2], [[1, null, 'goes on', 1]]],
    ['at least counts as on', [atLeast(3), atLeast(3), 0, 0], [[1, 3, 'below the off-limit', 0]]],
    ['at least too little does not answer', [2, 2, atLeast(0.5), 2], [[1, null, 'goes on', 0]]],
    [
      'two',
      [2, 2, 0, 0, 2, 2, 0, 0],
      [
        [1, 3, 'below the off-limit', 0],
        [5, 7, 'below the off-limit', 0],
      ],
    ],
    ['nothing', [], []],
  ])('%s', (_, values, expected) => {
    expect(brief(...values)).toEqual(expected);
  });

  it('takes blocks that were left out as not known', () => {
    const all = blocks(2, 2, null, 2, 0, 0);
    expect(
      episodesOf(
        all.filter((b) => b.tEnd !== 3 * B),
        settings,
      ),
    ).toEqual(episodesOf(all, settings));
  });

  it('sums up: duration, peak, degree-hours without bridged time, PM2.5, warm wind', () => {
    const given = blocks(2, 4, null, 3, 0, 0).map((b, i) => ({
      ...b,
      gradientCPer100M: exactly(i),
      pm25UgM3: i < 2 ? 30 + 10 * i : null,
      warmWind: i === 5 ? ('true' as const) : ('false' as const),
    }));
    const [episode] = episodesOf(given, settings);
    expect(episode).toMatchObject({
      durationS: { lo: 4 * B, hi: 4 * B },
      bridgedS: B,
      peakC: { lo: 4, hi: 4 },
      degreeHoursCH: { lo: 2.25, hi: 2.25 },
      meanGradientCPer100M: { lo: 1.5 },
      pm25MeanUgM3: { lo: 35 },
      pm25PeakUgM3: { lo: 40 },
      howEnded: 'warm wind',
    });
  });

  it('keeps "at least" in peak, degree-hours and duration', () => {
    const [episode] = episodesOf(blocks(2, atLeast(5)), settings);
    expect([episode!.peakC.hi, episode!.degreeHoursCH.hi, episode!.durationS.hi]).toEqual([
      Infinity,
      Infinity,
      Infinity,
    ]);
    expect([episode!.peakC.lo, episode!.degreeHoursCH.lo, episode!.durationS.lo]).toEqual([5, 1.75, 2 * B]);
    expect(isNotKnown(episode!.pm25MeanUgM3)).toBe(true);
  });

  it('does not depend on the order of the blocks; refuses two for one instant and settings that contradict', () => {
    const value = fc.constantFrom(0, 1, 1.5, 2, 3, null);
    fc.assert(
      fc.property(fc.array(value, { maxLength: 40 }), (values) => {
        const given = blocks(...values);
        expect(episodesOf([...given].reverse(), settings)).toEqual(episodesOf(given, settings));
      }),
    );
    expect(() => episodesOf([...blocks(1), ...blocks(1)], settings)).toThrow('Two blocks');
    expect(() => episodesOf([], { ...settings, offC: 3 })).toThrow('off-limit');
    expect(episodeSettingsProblems({ ...settings, blockS: 0, onForS: -1, gapLimitS: NaN })).toHaveLength(3);
  });
});

describe('live duration', () => {
  const live = (...values: (number | null)[]) => {
    const given = blocks(...values);
    const state = given.reduce((s, block) => episodeStep(s, block, settings).state, NO_EPISODE);
    const { lo, hi } = liveDurationS(state, given.length * B, settings);
    return [lo / B, hi / B];
  };
  it.each<[string, (number | null)[], number[]]>([
    ['no episode', [0, 0], [0, 0]],
    ['not yet the on-time', [2], [0, 0]],
    ['from the first block of the run', [2, 2], [2, 2]],
    ['falling, not yet the off-time', [2, 2, 0], [3, 3]],
    ['ended', [2, 2, 0, 0], [0, 0]],
    ['bridged', [2, 2, null], [2, 3]],
    ['beyond the gap limit', [2, 2, null, null, null], [-Infinity, Infinity]],
    ['silent without an episode', [0, null], [-Infinity, Infinity]],
  ])('%s', (_, values, expected) => {
    expect(live(...values)).toEqual(expected);
  });
  it('is causal: what comes later changes nothing', () => {
    const value = fc.constantFrom(0, 1.5, 2, 3, null);
    fc.assert(
      fc.property(
        fc.array(value, { minLength: 1, maxLength: 20 }),
        fc.array(value, { maxLength: 20 }),
        (before, after) => {
          const given = blocks(...before, ...after);
          let state = NO_EPISODE;
          let then: number[] = [];
          given.forEach((block, i) => {
            state = episodeStep(state, block, settings).state;
            const { lo, hi } = liveDurationS(state, block.tEnd, settings);
            if (i === before.length - 1) then = [lo / B, hi / B];
          });
          expect(then).toEqual(live(...before));
        },
      ),
    );
  });
  it('refuses a block that is not later', () => {
    const { state } = episodeStep(NO_EPISODE, blocks(1)[0]!, settings);
    expect(() => episodeStep(state, blocks(1)[0]!, settings)).toThrow('in order');
  });
});

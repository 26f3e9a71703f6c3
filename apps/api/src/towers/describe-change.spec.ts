import { changedFields, describeChange } from './describe-change';

describe('a change in words', () => {
  it('says what was and what became, and from when', () => {
    const changes = changedFields({ heightM: 30, gain: 1, note: '' }, { heightM: 31, gain: 1 }, [
      'heightM',
      'gain',
    ]);
    expect(changes).toEqual({ heightM: [30, 31] });
    expect(describeChange({ sensor: 'T 30 m', from: '2026-11-24T17:00:00Z', changes, note: 'moved' })).toBe(
      'T 30 m from 2026-11-24 17:00 UTC: height 30 m → 31 m (moved)',
    );
    expect(
      describeChange({
        changes: { staleLimitMinutes: [null, 60], retired: [false, true], latitude: [-1.5, 2] },
      }),
    ).toBe('silent after none → 60 min, retired no → yes, latitude −1.5° → 2°');
  });

  it('tells of older entries what is worth telling', () => {
    expect(describeChange({ name: 'mast.csv', reason: 'wrong logger', import: 4, mapping: {} })).toBe(
      'mast.csv, wrong logger',
    );
    expect(describeChange({})).toBe('');
  });
});

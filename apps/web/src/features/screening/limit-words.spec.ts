import { changedPhrases } from './limit-words';

const levelDifference = { riseC: 5, fallC: 3, risePerMetreByDayC: 0.1, fallPerMetreAtNightC: 0.1 };
const usual = {
  ...{ plausible: null, spike: 5, stuckHours: 3, fastChanges: true, steadiness: true },
  ...{ levelDifference, neighbourDifference: null },
};

it('names what is other than usual', () => {
  expect(changedPhrases(usual, usual, '°C')).toEqual([]);
  const limits = { ...usual, plausible: { lowest: -30, highest: 35 }, spike: null, steadiness: false };
  expect(changedPhrases(limits, usual, '°C')).toEqual([
    'expected −30 to 35 °C',
    'spikes not checked',
    'steady hours not checked',
  ]);
  const near = { ...usual, levelDifference: { ...levelDifference, fallC: 4 }, neighbourDifference: 6 };
  expect(changedPhrases(near, usual, '°C')).toEqual([
    '+5 or −4 °C to the level below, +0.1 °C/m by day, −0.1 °C/m at night',
    'no more than 6 °C from neighbouring towers',
  ]);
});

import { changedPhrases } from './limit-words';

const usual = { plausible: null, spike: 5, stuckHours: 3, fastChanges: true, steadiness: true };

it('names what is other than usual', () => {
  expect(changedPhrases(usual, usual, '°C')).toEqual([]);
  const limits = { ...usual, plausible: { lowest: -30, highest: 35 }, spike: null, steadiness: false };
  expect(changedPhrases(limits, usual, '°C')).toEqual([
    'expected −30 to 35 °C',
    'spikes not checked',
    'steady hours not checked',
  ]);
});

import { leadTimesS } from './lead-times';

const span = (from: number, to: number) => ({ from, to });

test('the first warning that shares time with an event gives its lead', () => {
  expect(leadTimesS([span(5, 20), span(0, 12)], [span(10, 30)])).toEqual([10]);
});

test('a warning that came after the event began has no lead', () => {
  expect(leadTimesS([span(15, 20)], [span(10, 30)])).toEqual([0]);
});

test('a warning that only touches an event is none of it, and an event without one gives nothing', () => {
  expect(leadTimesS([span(0, 10), span(30, 40)], [span(10, 30)])).toEqual([]);
});

import { selectedEnds, selectionOf, snapped } from './selection';

const zone = 'America/Boise';

test('a span goes into the fields and comes back', () => {
  const ends = { from: '2026-01-15T09:10:00.000Z', to: '2026-01-15T13:00:00.000Z' };
  const selection = selectionOf(3, ends, zone);
  expect(selection).toEqual({ sensorId: 3, from: '2026-01-15T02:10', to: '2026-01-15T06:00' });
  expect(selectedEnds(selection, zone)).toEqual(ends);
  expect(selectedEnds({ ...selection, to: '' }, zone)).toBeNull();
  expect(selectedEnds({ ...selection, to: '2026-01-15T02:00' }, zone)).toBeNull();
});

test('what is drawn by hand holds whole intervals, either way round', () => {
  const minute = 60_000;
  expect(snapped(34 * minute, 11 * minute, 10)).toEqual({ from: 20 * minute, to: 30 * minute });
  expect(snapped(11 * minute, 12 * minute, 10)).toBeNull();
});

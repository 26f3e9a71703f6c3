import { referencePrefix } from './reference';

const newYearUtc = Date.parse('2027-01-01T03:00:00Z') / 1000;

describe('the reference of a notice', () => {
  it.each([
    ['Mill Flats', 'MF-26-'],
    ['Northgate', 'NOR-26-'],
    ['The Old Upper Tarn', 'TOU-26-'],
    ['Río Ñandú', 'RN-26-'],
    ['42', 'N-26-'],
  ])('of %s begins with %s while it is still the old year there', (name, expected) =>
    expect(referencePrefix(name, 'America/Denver', newYearUtc)).toBe(expected),
  );
});

import {
  answered,
  chooseSensor,
  columnsOfOpenUnit,
  marksOf,
  setSensor,
  setTwice,
  setUnit,
  sensorOf,
  unitOf,
} from './mapping-draft';
import type { Mapping, Question } from './types';

const mapping: Mapping = { columns: { A: 't2', B: 't10' }, units: { A: '°F' } };
const question = (id: Question['id']): Question => ({ id, text: '', choices: [], examples: [] });

describe('correcting how a file is read', () => {
  it('sets a column to a sensor, and leaves it out with its unit', () => {
    expect(sensorOf(setSensor(mapping, 'C', 't60'), 'C')).toBe('t60');
    const left = setSensor(mapping, 'A', '');
    expect([sensorOf(left, 'A'), unitOf(left, 'A')]).toEqual([undefined, undefined]);
    expect(unitOf(setUnit(mapping, 'A', ''), 'A')).toBeUndefined();
  });

  it('names a sensor that two columns are set to', () => {
    expect(setTwice(mapping)).toEqual([]);
    expect(setTwice(setSensor(mapping, 'C', 't2'))).toEqual(['t2']);
  });

  it('takes the unit that stood in the file when a person names a column, where it can be that', () => {
    const air = { name: 't60', quantity: 'air temperature' };
    expect(unitOf(chooseSensor(mapping, 'Low [°F]', air, '°F'), 'Low [°F]')).toBe('°F');
    expect(unitOf(chooseSensor(mapping, 'A', air, null), 'A')).toBe('°F');
    const wind = { name: 'wind', quantity: 'wind speed' };
    expect(unitOf(chooseSensor(mapping, 'A', wind, '°F'), 'A')).toBeUndefined();
    expect(sensorOf(chooseSensor(mapping, 'A', undefined, '°F'), 'A')).toBeUndefined();
  });

  it('asks about the units of those columns alone that may be in °F', () => {
    const column = { index: 0, name: 'A', samples: [], sensor: 't2', unit: null, note: null };
    const odd = { ...column, name: 'B', note: 'Values up to 59: look whether this is °F.' };
    const said = { ...column, name: 'C', unit: '°F', note: 'Called "T [°F]" in the file.' };
    const renamed = { ...column, name: 'D', note: 'Called "wind" in the file.' };
    expect(columnsOfOpenUnit([column, odd, said, renamed])).toEqual(['B']);
  });

  it('takes answers', () => {
    expect(answered(mapping, question('repeated-hour'), 'in-order', []).repeatedHour).toBe('in-order');
    expect(answered(mapping, question('missing-hour'), 'later', []).missingHour).toBe('later');
    const day = answered(mapping, question('day-or-month-first'), '{"timeForm":"day/month/year"}', []);
    expect(day.timeForm).toBe('day/month/year');
    expect(unitOf(answered(mapping, question('unit'), '°F', ['B']), 'B')).toBe('°F');
    expect(unitOf(answered(mapping, question('unit'), '°C', ['A']), 'A')).toBeUndefined();
  });

  it('reads marks as they are typed', () => {
    expect(marksOf(' -999  NaN ')).toEqual(['-999', 'NaN']);
  });
});

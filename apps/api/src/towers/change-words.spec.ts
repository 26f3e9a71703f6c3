import { sensorChangeWords, towerChangeWords } from './change-words';
import type { SensorPatch } from './dto/sensor-input.dto';

const sensor = { name: 'T 30 m', unit: '°C' };

it.each<[SensorPatch, string]>([
  [{ offset: -0.4, gain: 1, note: 'compared for 2 h' }, 'T 30 m: offset −0.4 °C, gain 1 (compared for 2 h)'],
  [{ heightM: 28, limits: 0.2 }, 'T 30 m: height 28 m, uncertainty'],
  [{ retired: true }, 'T 30 m: retired'],
  [{ note: 'new shield' }, 'T 30 m: changed (new shield)'],
])('says %j', (patch, words) => expect(sensorChangeWords(sensor, patch)).toBe(words));

it('names the settings of a tower that count', () => {
  expect(towerChangeWords({ version: 1, elevationM: 1150, screening: 'full', name: 'Mill mast' })).toBe(
    'Tower settings: elevation, screening',
  );
});

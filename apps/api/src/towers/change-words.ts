import type { SensorPatch } from './dto/sensor-input.dto';
import type { TowerPatch } from './dto/tower-input.dto';

const written = (value: number): string => String(value).replace('-', '−');

/** What a change of a sensor is, for the record: `T 30 m: offset 0.4 °C, gain 1 (compared with the reference)`. */
export function sensorChangeWords(sensor: { name: string; unit: string }, patch: SensorPatch): string {
  const { offset, gain, heightM, sigma, limits, pairSigma, retired, note } = patch;
  const parts = [
    offset === undefined ? [] : [`offset ${written(offset)} ${sensor.unit}`],
    gain === undefined ? [] : [`gain ${written(gain)}`],
    heightM === undefined ? [] : [`height ${written(heightM)} m`],
    (sigma ?? limits ?? pairSigma) === undefined ? [] : ['uncertainty'],
    retired === undefined ? [] : [retired ? 'retired' : 'in use again'],
  ].flat();
  return `${sensor.name}: ${parts.join(', ') || 'changed'}${note ? ` (${note})` : ''}`;
}

const SETTINGS: readonly (readonly [keyof TowerPatch, string])[] = [
  ['elevationM', 'elevation'],
  ['latitude', 'latitude'],
  ['longitude', 'longitude'],
  ['screening', 'screening'],
  ['inversionForm', 'form of inversions'],
  ['embedDepthM', 'embed depth'],
];

/** What a change of a tower's settings is, for the record: `Tower settings: elevation, screening`. */
export function towerChangeWords(patch: TowerPatch): string {
  const named = SETTINGS.filter(([key]) => patch[key] !== undefined).map(([, name]) => name);
  return `Tower settings: ${named.join(', ')}`;
}

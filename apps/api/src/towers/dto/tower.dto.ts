import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { toIso } from '../../common/instants';
import { sensorQuantities, type SensorQuantity } from '../quantities';
import type { Sensor } from '../models/sensor.model';
import type { SensorVersion } from '../models/sensor-version.model';
import type { Tower } from '../models/tower.model';

/** What stamps may mean. */
export const stamps = ['instant', 'start', 'middle', 'end'] as const;
/** Whether screening leaves failed readings out of means, or only reports what it would have done. */
export const screenings = ['full', 'report-only'] as const;
/** How inversions are found. */
export const inversionForms = ['plain', 'sensor-aware'] as const;

/** What is true of a sensor from an instant on. */
@ApiSchema({ name: 'SensorVersion' })
export class SensorVersionDto {
  @ApiProperty({ type: String, nullable: true, description: 'null: from the beginning' }) from!:
    string | null;
  @ApiProperty() heightM!: number;
  @ApiProperty({ description: 'One standard deviation, in the unit' }) sigma!: number;
  @ApiProperty({ type: Number, nullable: true }) pairSigma!: number | null;
  @ApiProperty() offset!: number;
  @ApiProperty() gain!: number;
  @ApiProperty() note!: string;
}

/** A sensor as the API shows it; height, uncertainty and correction are those of its newest version. */
@ApiSchema({ name: 'Sensor' })
export class SensorDto {
  @ApiProperty() id!: number;
  @ApiProperty() towerId!: number;
  @ApiProperty({ description: "The column name of the sensor's readings" }) name!: string;
  @ApiProperty({ enum: sensorQuantities }) quantity!: SensorQuantity;
  @ApiProperty() unit!: string;
  @ApiProperty() heightM!: number;
  @ApiProperty() sigma!: number;
  @ApiProperty({ type: Number, nullable: true }) pairSigma!: number | null;
  @ApiProperty() offset!: number;
  @ApiProperty() gain!: number;
  @ApiProperty() retired!: boolean;
  @ApiProperty({ type: [SensorVersionDto] }) versions!: SensorVersionDto[];
}

/** A tower as the API shows it. */
@ApiSchema({ name: 'Tower' })
export class TowerDto {
  @ApiProperty() id!: number;
  @ApiProperty() slug!: string;
  @ApiProperty() name!: string;
  @ApiProperty() elevationM!: number;
  @ApiProperty() latitude!: number;
  @ApiProperty() longitude!: number;
  @ApiProperty() intervalMinutes!: number;
  @ApiProperty() blockMinutes!: number;
  @ApiProperty({ type: Number, nullable: true }) staleLimitMinutes!: number | null;
  @ApiProperty() clock!: string;
  @ApiProperty({ enum: stamps }) stamp!: (typeof stamps)[number];
  @ApiProperty({ enum: screenings }) screening!: (typeof screenings)[number];
  @ApiProperty({ enum: inversionForms }) inversionForm!: (typeof inversionForms)[number];
  @ApiProperty() embedDepthM!: number;
  @ApiProperty() retired!: boolean;
  @ApiProperty({ type: [SensorDto] }) sensors!: SensorDto[];
  @ApiProperty() version!: number;
}

const showVersion = (version: SensorVersion): SensorVersionDto => {
  const { fromT, heightM, sigma, pairSigma, offset, gain, note } = version;
  return { from: fromT === 0 ? null : toIso(fromT), heightM, sigma, pairSigma, offset, gain, note };
};

/** A stored sensor in the API's shape. */
export function showSensor(sensor: Sensor): SensorDto {
  const versions = [...sensor.versions].sort((a, b) => a.fromT - b.fromT);
  const { heightM, sigma, pairSigma, offset, gain } = versions.at(-1)!;
  const { id, towerId, name, quantity, unit } = sensor;
  return {
    ...{ id, towerId, name, quantity, unit, heightM, sigma, pairSigma, offset, gain },
    retired: sensor.retiredAt !== null,
    versions: versions.map(showVersion),
  };
}

/** A stored tower in the API's shape. */
export function showTower(tower: Tower): TowerDto {
  const { id, slug, name, elevationM, latitude, longitude, clock, stamp, screening } = tower;
  const { inversionForm, embedDepthM, version } = tower;
  return {
    ...{
      id,
      slug,
      name,
      elevationM,
      latitude,
      longitude,
      clock,
      stamp,
      screening,
      inversionForm,
      embedDepthM,
    },
    intervalMinutes: tower.intervalS / 60,
    blockMinutes: tower.blockS / 60,
    staleLimitMinutes: tower.staleLimitS === null ? null : tower.staleLimitS / 60,
    retired: tower.retiredAt !== null,
    sensors: tower.sensors.map(showSensor).sort((a, b) => a.heightM - b.heightM || a.id - b.id),
    version,
  };
}

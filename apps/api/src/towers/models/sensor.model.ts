import { Column, DataType, HasMany, Model, Table } from 'sequelize-typescript';
import type { SensorQuantity } from '../quantities';
import { SensorVersion } from './sensor-version.model';

/** One sensor of a tower; its name is the column its readings come in. */
@Table({ tableName: 'sensor', underscored: true, timestamps: false })
export class Sensor extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column(DataType.INTEGER)
  declare towerId: number;

  @Column(DataType.TEXT)
  declare name: string;

  @Column(DataType.TEXT)
  declare quantity: SensorQuantity;

  @Column(DataType.TEXT)
  declare unit: string;

  /** Limits of the screening checks that differ from the usual ones, JSON. */
  @Column(DataType.TEXT)
  declare screeningLimits: string | null;

  @Column(DataType.INTEGER)
  declare retiredAt: number | null;

  @HasMany(() => SensorVersion, 'sensorId')
  declare versions: SensorVersion[];
}

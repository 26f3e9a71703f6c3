import { Column, DataType, HasMany, Model, Table } from 'sequelize-typescript';
import { Sensor } from './sensor.model';

/** A mast, or a monitor without temperature levels, and how its logger keeps time. */
@Table({ tableName: 'tower', underscored: true, timestamps: false })
export class Tower extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column(DataType.TEXT)
  declare slug: string;

  @Column(DataType.TEXT)
  declare name: string;

  /** Elevation of the ground above sea level. */
  @Column(DataType.REAL)
  declare elevationM: number;

  @Column(DataType.REAL)
  declare latitude: number;

  @Column(DataType.REAL)
  declare longitude: number;

  /** The logger's interval, s. */
  @Column(DataType.INTEGER)
  declare intervalS: number;

  /** The length of a block, a whole multiple of the interval, s. */
  @Column(DataType.INTEGER)
  declare blockS: number;

  /** After this many seconds without a block the tower no longer speaks; null means the usual limit. */
  @Column(DataType.INTEGER)
  declare staleLimitS: number | null;

  /** `UTC`, a fixed offset such as `-07:00`, or an IANA zone. */
  @Column(DataType.TEXT)
  declare clock: string;

  @Column(DataType.TEXT)
  declare stamp: 'instant' | 'start' | 'middle' | 'end';

  @Column(DataType.TEXT)
  declare screening: 'full' | 'report-only';

  @Column(DataType.TEXT)
  declare inversionForm: 'plain' | 'sensor-aware';

  @Column(DataType.REAL)
  declare embedDepthM: number;

  @Column(DataType.INTEGER)
  declare createdAt: number;

  @Column(DataType.INTEGER)
  declare retiredAt: number | null;

  @Column(DataType.INTEGER)
  declare version: number;

  @HasMany(() => Sensor, 'towerId')
  declare sensors: Sensor[];
}

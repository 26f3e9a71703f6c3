import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** What is true of a sensor from an instant on: a sensor replaced on Tuesday does not rewrite Monday. */
@Table({ tableName: 'sensor_version', underscored: true, timestamps: false })
export class SensorVersion extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true })
  declare sensorId: number;

  /** Holds for readings whose interval ends after this instant, UTC epoch seconds; 0 means from the beginning. */
  @Column({ type: DataType.INTEGER, primaryKey: true })
  declare fromT: number;

  @Column(DataType.REAL)
  declare heightM: number;

  /** Added after the gain: corrected = gain × reading + offset, in the sensor's unit. */
  @Column(DataType.REAL)
  declare offset: number;

  @Column(DataType.REAL)
  declare gain: number;

  /** One standard deviation, in the sensor's unit. */
  @Column(DataType.REAL)
  declare sigma: number;

  /** One standard deviation of the difference to the tower's other matched sensor, °C. */
  @Column(DataType.REAL)
  declare pairSigma: number | null;

  @Column(DataType.TEXT)
  declare note: string;
}

import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** A session as connect-session-sequelize keeps it. Instants are UTC epoch seconds. */
@Table({ tableName: 'session', modelName: 'Session' })
export class SessionRow extends Model {
  @Column({ type: DataType.TEXT, primaryKey: true })
  declare sid: string;

  /** When it ends unless there is another request. */
  @Column(DataType.INTEGER)
  get expires(): number {
    return this.getDataValue('expires') as number;
  }

  /** The session store hands over a Date. */
  set expires(value: Date | number) {
    this.setDataValue('expires', value instanceof Date ? Math.floor(value.getTime() / 1000) : value);
  }

  /** When it ends in any case. */
  @Column(DataType.INTEGER)
  declare absoluteEnd: number | null;

  @Column(DataType.INTEGER)
  declare userId: number | null;

  @Column(DataType.TEXT)
  declare data: string;
}

import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** A way in: a folder or an address that is collected by schedule, or what a site pushes; with the layout of its data. */
@Table({ tableName: 'source', underscored: true, timestamps: false })
export class Source extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column(DataType.INTEGER)
  declare towerId: number;

  @Column(DataType.TEXT)
  declare kind: 'folder' | 'http' | 'push';

  /** folder: path of a file or folder beneath the loggers' folder. */
  @Column(DataType.TEXT)
  declare path: string | null;

  /** http: the address of the file. */
  @Column(DataType.TEXT)
  declare url: string | null;

  @Column(DataType.TEXT)
  declare auth: 'none' | 'basic' | 'bearer';

  /** http: credentials, sealed for the origin of `url`. */
  @Column(DataType.TEXT)
  declare secret: string | null;

  /** http: what the last answer said its body was, to ask only for a newer one. */
  @Column(DataType.TEXT)
  declare etag: string | null;

  @Column(DataType.TEXT)
  declare lastModified: string | null;

  @Column(DataType.TEXT)
  declare bodySha256: string | null;

  @Column(DataType.TEXT)
  declare mapping: string;

  @Column(DataType.INTEGER)
  declare intervalS: number;

  @Column(DataType.INTEGER)
  declare lastAt: number | null;

  @Column(DataType.INTEGER)
  declare lastOkAt: number | null;

  @Column(DataType.TEXT)
  declare lastResult: string | null;

  @Column(DataType.INTEGER)
  declare failures: number;

  /** When the present row of failures began. */
  @Column(DataType.INTEGER)
  declare failingSince: number | null;

  @Column(DataType.INTEGER)
  declare nextAt: number | null;

  /** Counts changes by people: what was collected by the former settings is not kept as the new ones' state. */
  @Column(DataType.INTEGER)
  declare version: number;

  @Column(DataType.INTEGER)
  declare retiredAt: number | null;
}

import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** A way in: files of a folder that are collected by schedule, or what a site pushes; with the layout of its data. */
@Table({ tableName: 'source', underscored: true, timestamps: false })
export class Source extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column(DataType.INTEGER)
  declare towerId: number;

  @Column(DataType.TEXT)
  declare kind: 'folder' | 'push';

  /** folder: path of a file or folder beneath the loggers' folder. */
  @Column(DataType.TEXT)
  declare path: string | null;

  @Column(DataType.TEXT)
  declare mapping: string;

  @Column(DataType.INTEGER)
  declare intervalS: number;

  @Column(DataType.INTEGER)
  declare lastAt: number | null;

  @Column(DataType.TEXT)
  declare lastResult: string | null;

  @Column(DataType.INTEGER)
  declare failures: number;

  @Column(DataType.INTEGER)
  declare nextAt: number | null;

  @Column(DataType.INTEGER)
  declare retiredAt: number | null;
}

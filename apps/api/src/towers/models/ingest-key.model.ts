import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** A key by which one site pushes its readings. Only its hash is kept. */
@Table({ tableName: 'ingest_key', underscored: true, timestamps: false })
export class IngestKey extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column(DataType.INTEGER)
  declare towerId: number;

  @Column(DataType.TEXT)
  declare name: string;

  @Column(DataType.TEXT)
  declare hash: string;

  @Column(DataType.INTEGER)
  declare createdAt: number;

  @Column(DataType.INTEGER)
  declare createdBy: number;

  @Column(DataType.INTEGER)
  declare lastUsedAt: number | null;

  @Column(DataType.INTEGER)
  declare revokedAt: number | null;
}

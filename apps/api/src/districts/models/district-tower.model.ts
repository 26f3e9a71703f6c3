import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** A tower that speaks for a district, in which order, and whether it may begin or end a finding. */
@Table({ tableName: 'district_tower', underscored: true, timestamps: false })
export class DistrictTower extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true })
  declare districtId: number;

  @Column({ type: DataType.INTEGER, primaryKey: true })
  declare towerId: number;

  @Column(DataType.INTEGER)
  declare position: number;

  @Column({ type: DataType.INTEGER })
  declare mayBegin: boolean;

  @Column({ type: DataType.INTEGER })
  declare mayEnd: boolean;
}

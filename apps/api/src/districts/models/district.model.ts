import { Column, DataType, HasMany, Model, Table } from 'sequelize-typescript';
import { DistrictTower } from './district-tower.model';

/** A district: the place a notice is for, and the towers that speak for its air. */
@Table({ tableName: 'district', underscored: true, timestamps: false })
export class District extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column(DataType.TEXT)
  declare slug: string;

  @Column(DataType.TEXT)
  declare name: string;

  /** IANA zone in which its people live. */
  @Column(DataType.TEXT)
  declare timeZone: string;

  @Column(DataType.REAL)
  declare elevationM: number | null;

  @Column(DataType.REAL)
  declare latitude: number;

  @Column(DataType.REAL)
  declare longitude: number;

  @Column(DataType.INTEGER)
  declare population: number | null;

  @Column(DataType.TEXT)
  declare areaText: string;

  @Column(DataType.TEXT)
  declare ordinanceRef: string;

  @Column(DataType.TEXT)
  declare contactPhone: string;

  /** How several towers speak as one. */
  @Column(DataType.TEXT)
  declare combine: 'first-fresh' | 'any' | 'all' | 'median';

  @Column(DataType.INTEGER)
  declare floorTowerId: number | null;

  @Column(DataType.INTEGER)
  declare benchTowerId: number | null;

  @Column({ type: DataType.INTEGER, field: 'pm25_tower_id' })
  declare pm25TowerId: number | null;

  @Column(DataType.INTEGER)
  declare createdAt: number;

  @Column(DataType.INTEGER)
  declare version: number;

  @HasMany(() => DistrictTower, 'districtId')
  declare towers: DistrictTower[];
}

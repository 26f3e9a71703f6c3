import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** Where a version of a rule stands. Once in force its body never changes; it becomes past when another takes over. */
export type RuleState = 'draft' | 'in force' | 'past';

/** One version of a district's rule. */
@Table({ tableName: 'rule', underscored: true, timestamps: false })
export class Rule extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column(DataType.INTEGER)
  declare districtId: number;

  @Column(DataType.INTEGER)
  declare version: number;

  /** The definition as JSON. */
  @Column(DataType.TEXT)
  declare body: string;

  @Column(DataType.TEXT)
  declare sha256: string;

  @Column(DataType.TEXT)
  declare note: string;

  @Column(DataType.TEXT)
  declare state: RuleState;

  @Column(DataType.INTEGER)
  declare createdAt: number;

  @Column(DataType.INTEGER)
  declare createdBy: number;

  @Column(DataType.INTEGER)
  declare fromAt: number | null;

  @Column(DataType.INTEGER)
  declare toAt: number | null;
}

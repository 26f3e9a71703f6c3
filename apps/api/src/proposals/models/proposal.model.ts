import type { ProposalState } from '@lidwatch/contracts';
import type { NoticeKind } from '@lidwatch/rules';
import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** What the rule in force asks people to decide: to begin or to end a kind of notice in a district. */
@Table({ tableName: 'proposal', underscored: true, timestamps: false })
export class Proposal extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column(DataType.INTEGER)
  declare districtId: number;

  @Column(DataType.TEXT)
  declare kind: NoticeKind;

  @Column(DataType.TEXT)
  declare act: 'begin' | 'end';

  @Column(DataType.TEXT)
  declare state: ProposalState;

  @Column(DataType.INTEGER)
  declare ruleId: number;

  @Column(DataType.INTEGER)
  declare evidenceId: number;

  /** End of the block that was judged. */
  @Column(DataType.INTEGER)
  declare tEnd: number;

  @Column(DataType.INTEGER)
  declare openedAt: number;

  @Column(DataType.INTEGER)
  declare confirmedAt: number | null;

  @Column(DataType.INTEGER)
  declare confirmedBy: number | null;

  /** The analyst's sentence for the officer. */
  @Column(DataType.TEXT)
  declare note: string | null;

  @Column(DataType.INTEGER)
  declare closedAt: number | null;

  @Column(DataType.INTEGER)
  declare closedBy: number | null;

  /** Why it was declined or returned, or why it lapsed. */
  @Column(DataType.TEXT)
  declare reason: string | null;

  @Column(DataType.INTEGER)
  declare noticeId: number | null;

  @Column(DataType.INTEGER)
  declare version: number;
}

import type { NoticeKind, NoticeState } from '@lidwatch/contracts';
import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** A notice as it was issued, and how it ended. */
@Table({ tableName: 'notice', underscored: true, timestamps: false })
export class Notice extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true })
  declare id: number;

  /** Short reference for people, `MF-26-017`. */
  @Column(DataType.TEXT)
  declare ref: string;

  @Column(DataType.INTEGER)
  declare districtId: number;

  @Column(DataType.TEXT)
  declare kind: NoticeKind;

  @Column(DataType.TEXT)
  declare state: NoticeState;

  @Column(DataType.TEXT)
  declare origin: 'proposal' | 'by hand';

  @Column(DataType.TEXT)
  declare reason: string;

  @Column(DataType.INTEGER)
  declare issuedAt: number;

  @Column(DataType.INTEGER)
  declare issuedBy: number;

  @Column(DataType.INTEGER)
  declare effectiveAt: number;

  /** Written end, UTC epoch seconds. */
  @Column(DataType.INTEGER)
  declare expiresAt: number;

  @Column(DataType.INTEGER)
  declare endedAt: number | null;

  @Column(DataType.INTEGER)
  declare endedBy: number | null;

  @Column(DataType.TEXT)
  declare endReason: string | null;

  /** JSON of `NoticeTexts`, as sent. */
  @Column(DataType.TEXT)
  declare texts: string;

  @Column(DataType.INTEGER)
  declare evidenceId: number | null;

  @Column(DataType.INTEGER)
  declare version: number;
}

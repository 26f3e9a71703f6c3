import type { Role, UserState } from '@lidwatch/contracts';
import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** Somebody who signs in. Instants are UTC epoch seconds. */
@Table({ tableName: 'user' })
export class User extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column(DataType.TEXT)
  declare email: string;

  @Column(DataType.TEXT)
  declare name: string;

  @Column(DataType.TEXT)
  declare role: Role;

  /** argon2id in its own text form; null until the invitation is accepted. */
  @Column(DataType.TEXT)
  declare passwordHash: string | null;

  @Column(DataType.INTEGER)
  declare createdAt: number;

  @Column(DataType.INTEGER)
  declare retiredAt: number | null;

  /** Sessions carry the number they were made under; raising it ends them all. */
  @Column(DataType.INTEGER)
  declare sessionEpoch: number;

  /** Where the account stands. */
  get state(): UserState {
    if (this.retiredAt !== null) return 'retired';
    return this.passwordHash === null ? 'invited' : 'active';
  }
}

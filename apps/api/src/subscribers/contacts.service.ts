import { Injectable } from '@nestjs/common';
import { randomBytes } from 'node:crypto';
import { sha256 } from '../activity/digest';
import { Clock } from '../common/clock';
import { Settings } from '../config/settings';
import { Sql } from '../database/sql';
import { addressHash, type Channel } from './addresses';

/** One way a person is reached. `address` is null once it was forgotten. */
export interface Contact {
  readonly id: number;
  readonly personId: number;
  readonly channel: Channel;
  readonly address: string | null;
  readonly confirmedAt: number | null;
}

const CONFIRM_WITHIN_S = 3 * 24 * 3600;
const TOKEN_BYTES = 18;
const SELECT = `SELECT id, person_id personId, channel, address, confirmed_at confirmedAt FROM contact`;

/** Addresses: the one place they are kept in, found by hash, confirmed by link, stopped by word. */
@Injectable()
export class ContactsService {
  constructor(
    private readonly sql: Sql,
    private readonly clock: Clock,
    private readonly settings: Settings,
  ) {}

  /** The contact in use for an address; undefined without one. */
  byAddress(channel: Channel, address: string): Promise<Contact | undefined> {
    return this.sql.get<Contact>(
      `${SELECT} WHERE channel = $1 AND address_hash = $2 AND stopped_at IS NULL`,
      [channel, addressHash(this.settings.secret, channel, address)],
    );
  }

  /** A person's contacts in use. */
  ofPerson(personId: number): Promise<Contact[]> {
    return this.sql.all<Contact>(`${SELECT} WHERE person_id = $1 AND stopped_at IS NULL ORDER BY id`, [
      personId,
    ]);
  }

  /** Adds an address that has yet to be confirmed. */
  async add(personId: number, channel: Channel, address: string): Promise<number> {
    const [row] = await this.sql.returning<{ id: number }>(
      `WITH new(person_id, channel, address, hash, at) AS (SELECT $1, $2, $3, $4, $5)
       INSERT INTO contact (person_id, channel, address, address_hash, created_at)
       SELECT person_id, channel, address, hash, at FROM new RETURNING id`,
      [personId, channel, address, addressHash(this.settings.secret, channel, address), this.clock.now()],
    );
    return row!.id;
  }

  /** A new token that confirms a contact; the one before it stops working. Only its hash is kept. */
  async newConfirmToken(contactId: number): Promise<string> {
    const token = randomBytes(TOKEN_BYTES).toString('base64url');
    await this.sql.run('UPDATE contact SET confirm_token_hash = $2, confirm_until = $3 WHERE id = $1', [
      contactId,
      sha256(token),
      this.clock.now() + CONFIRM_WITHIN_S,
    ]);
    return token;
  }

  /** Confirms the contact a token was made for; undefined when the token is unknown or too old. A second time is fine. */
  async confirm(token: string): Promise<Contact | undefined> {
    const now = this.clock.now();
    const contact = await this.sql.get<Contact>(
      `${SELECT} WHERE confirm_token_hash = $1 AND confirm_until >= $2 AND stopped_at IS NULL`,
      [sha256(token), now],
    );
    if (contact)
      await this.sql.run('UPDATE contact SET confirmed_at = coalesce(confirmed_at, $2) WHERE id = $1', [
        contact.id,
        now,
      ]);
    return contact;
  }

  /** Sends nothing to an address any more until its owner asks again; says whose it was. */
  async stopByAddress(channel: Channel, address: string, reason: string): Promise<number | undefined> {
    const contact = await this.byAddress(channel, address);
    if (contact) await this.stop(contact.id, reason);
    return contact?.personId;
  }

  /** Takes an address back that its owner had stopped with a word; says whose it is. */
  async resumeByAddress(channel: Channel, address: string): Promise<number | undefined> {
    const current = await this.byAddress(channel, address);
    if (current) return current.personId;
    const stopped = await this.sql.get<Contact>(
      `${SELECT} WHERE channel = $1 AND address_hash = $2 AND address IS NOT NULL ORDER BY stopped_at DESC LIMIT 1`,
      [channel, addressHash(this.settings.secret, channel, address)],
    );
    if (stopped)
      await this.sql.run('UPDATE contact SET stopped_at = NULL, stop_reason = NULL WHERE id = $1', [
        stopped.id,
      ]);
    return stopped?.personId;
  }

  /** Marks a contact as stopped. */
  async stop(contactId: number, reason: string): Promise<void> {
    await this.sql.run(
      'UPDATE contact SET stopped_at = $2, stop_reason = $3 WHERE id = $1 AND stopped_at IS NULL',
      [contactId, this.clock.now(), reason],
    );
  }

  /** Forgets every address of a person who left; the hash stays, so that a text of theirs is still understood. */
  async forget(personId: number): Promise<void> {
    await this.sql.run(
      `UPDATE contact SET address = NULL, confirm_token_hash = NULL,
         stopped_at = coalesce(stopped_at, $2), stop_reason = coalesce(stop_reason, 'left') WHERE person_id = $1`,
      [personId, this.clock.now()],
    );
  }
}

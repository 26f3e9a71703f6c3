import { Injectable } from '@nestjs/common';
import { hash, verify } from '@node-rs/argon2';
import { Problem } from '../../common/problem';
import { Turns } from './turns';

/**
 * argon2id (the library's default kind) with 19 MiB, two passes, one lane: the least that the OWASP Password Storage
 * Cheat Sheet asks for argon2id.
 */
const cost = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

/** Makes and checks password hashes, two at a time, so that sign-ins leave the processor to everybody else. */
@Injectable()
export class PasswordHasher {
  private readonly turns = new Turns(2, 40);
  private nobodys: Promise<string> | undefined;

  /** The hash of a password in argon2's own text form. */
  hash(password: string): Promise<string> {
    return this.inTurn(() => hash(password, cost));
  }

  /**
   * Whether a password belongs to a hash. Without a hash (no such account, no password yet) it takes the same time
   * and the answer is no, so that the time tells nothing.
   */
  async matches(passwordHash: string | null | undefined, password: string): Promise<boolean> {
    if (passwordHash) return this.inTurn(() => verify(passwordHash, password));
    this.nobodys ??= this.hash('the password of nobody');
    const nobodys = await this.nobodys;
    await this.inTurn(() => verify(nobodys, password));
    return false;
  }

  private inTurn<T>(work: () => Promise<T>): Promise<T> {
    if (this.turns.full)
      throw new Problem('too-many-attempts', 'Many people are signing in. Try again in a minute.');
    return this.turns.take(work);
  }
}

import { Injectable } from '@nestjs/common';
import type { Request, Response } from 'express';
import { ActivityService } from '../activity/activity.service';
import { Problem } from '../common/problem';
import { UserDistricts } from '../users/user-districts';
import { UsersService } from '../users/users.service';
import type { Me } from './dto/me.dto';
import type { SignIn } from './dto/sign-in.dto';
import { again, Attempts, fromAddress, onAccount, onAccountFrom } from './passwords/attempts';
import { PasswordHasher } from './passwords/password-hasher';
import { SessionService } from './sessions/session.service';
import { SignedInPeople } from './sessions/signed-in-people';
import type { SignedIn } from './signed-in';

/** Signing in and out, and asking for the password again. */
@Injectable()
export class AuthService {
  constructor(
    private readonly users: UsersService,
    private readonly districts: UserDistricts,
    private readonly sessions: SessionService,
    private readonly hasher: PasswordHasher,
    private readonly attempts: Attempts,
    private readonly people: SignedInPeople,
    private readonly activity: ActivityService,
  ) {}

  /**
   * Signs somebody in under a new session. Throws 401 `sign-in-failed`, the same for an unknown e-mail and a wrong
   * password, and 429 after too many attempts on the account or from the address.
   */
  async signIn(request: Request, response: Response): Promise<Me> {
    const user = await this.sessions.authenticate(request, response);
    if (!user) throw new Problem('sign-in-failed', 'The e-mail or the password is wrong.');
    return this.beginSession(request, user);
  }

  /** Begins a session for somebody whose identity was just shown. */
  async beginSession(request: Request, user: SignedIn): Promise<Me> {
    await this.sessions.begin(request, user);
    await this.activity.record({ actor: user, act: 'signed in', subject: `user ${user.id}` });
    return this.me(user);
  }

  /** Ends the session. */
  async signOut(request: Request, response: Response, user: SignedIn): Promise<void> {
    await this.sessions.end(request, response);
    await this.activity.record({ actor: user, act: 'signed out', subject: `user ${user.id}` });
  }

  /** The signed-in person with their districts. */
  async me({ id, name, email, role }: SignedIn): Promise<Me> {
    const districts = role === 'officer' ? await this.districts.of(id) : await this.districts.all();
    return { id, name, email, role, districts };
  }

  /**
   * Whether this is the signed-in person's password, asked again before a burn ban. Throws 429 after too many
   * attempts. Call it before a transaction: hashing takes its time.
   */
  async verifyPassword(userId: number, password: string): Promise<boolean> {
    await this.attempts.begin(again(userId));
    const { passwordHash } = await this.users.find(userId);
    const right = await this.hasher.matches(passwordHash, password);
    if (right) await this.attempts.forget(again(userId));
    return right;
  }

  /** Who an e-mail and a password sent from an address belong to; undefined when they do not belong together. */
  async check({ email, password }: SignIn, address: string): Promise<SignedIn | undefined> {
    await this.attempts.begin(onAccountFrom(email, address), onAccount(email), fromAddress(address));
    const user = await this.users.findByEmail(email.trim());
    const right = await this.hasher.matches(user?.retiredAt === null ? user.passwordHash : null, password);
    if (!user || !right) return undefined;
    await this.attempts.forget(onAccountFrom(email, address));
    await this.attempts.takeBack(onAccount(email));
    await this.attempts.takeBack(fromAddress(address));
    return this.people.find(await this.people.owner(user.id));
  }
}

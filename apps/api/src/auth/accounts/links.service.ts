import { Injectable } from '@nestjs/common';
import { isEmail } from 'class-validator';
import type { Request } from 'express';
import { ActivityService } from '../../activity/activity.service';
import { Problem } from '../../common/problem';
import { invalid } from '../../common/validation';
import { UnitOfWork } from '../../database/unit-of-work';
import type { User } from '../../users/models/user.model';
import { UsersService } from '../../users/users.service';
import { AuthService } from '../auth.service';
import type { LinkView, Me } from '../dto/me.dto';
import type { AcceptInvitation, FirstAdministrator } from '../dto/sign-in.dto';
import { LinkTokens } from '../links/link-tokens';
import { PasswordHasher } from '../passwords/password-hasher';
import { passwordFault } from '../passwords/password-rules';

/** What the links do: make the first administrator, or set somebody's own password. */
@Injectable()
export class LinksService {
  constructor(
    private readonly links: LinkTokens,
    private readonly users: UsersService,
    private readonly auth: AuthService,
    private readonly hasher: PasswordHasher,
    private readonly units: UnitOfWork,
    private readonly activity: ActivityService,
  ) {}

  /** What a link is for; throws 410 when it does not work any more. */
  async look(token: string): Promise<LinkView> {
    const { purpose, userId } = await this.links.look(token);
    if (userId === null) return { purpose };
    const { email, name } = await this.users.find(userId);
    return { purpose, email, name };
  }

  /** Makes the first administrator and signs them in. */
  async makeFirstAdministrator(wanted: FirstAdministrator, request: Request): Promise<Me> {
    const { purpose } = await this.links.look(wanted.token);
    if (purpose !== 'first-administrator') throw notThisLink();
    const email = wanted.email.trim();
    if (!isEmail(email))
      throw invalid([{ field: 'email', text: 'Write an e-mail address such as name@example.org.' }]);
    const passwordHash = await this.hashOf(wanted.password, email);
    const user = await this.units.run(async () => {
      await this.links.use(wanted.token);
      if ((await this.users.count()) > 0)
        throw new Problem('already-done', 'There is an administrator already.');
      const invite = { email, name: wanted.name.trim(), role: 'administrator' as const, districtIds: [] };
      const { id } = await this.users.create(invite, 'service');
      return this.users.setPasswordHash(id, passwordHash);
    });
    return this.auth.beginSession(request, asSignedIn(user));
  }

  /** Sets the password of the person an invitation or a password link was made for, without signing in. */
  async acceptLink({ token, password }: AcceptInvitation): Promise<User> {
    const { userId } = await this.links.look(token);
    if (userId === null) throw notThisLink();
    const { email } = await this.users.find(userId);
    const passwordHash = await this.hashOf(password, email);
    return this.units.run(async () => {
      await this.links.use(token);
      const user = await this.users.find(userId);
      if (user.retiredAt !== null) throw notThisLink();
      await this.activity.record({ actor: user, act: 'set a password', subject: `user ${userId}` });
      return this.users.setPasswordHash(userId, passwordHash);
    });
  }

  /** Sets the password and signs in. */
  async accept(wanted: AcceptInvitation, request: Request): Promise<Me> {
    return this.auth.beginSession(request, asSignedIn(await this.acceptLink(wanted)));
  }

  private hashOf(password: string, email: string): Promise<string> {
    const fault = passwordFault(password, email);
    if (fault) throw invalid([{ field: 'password', text: fault }]);
    return this.hasher.hash(password);
  }
}

/** The session's person without districts: they are looked up with the next request. */
function asSignedIn({
  id,
  name,
  email,
  role,
}: User): { districtIds: number[] } & Pick<User, 'id' | 'name' | 'email' | 'role'> {
  return { id, name, email, role, districtIds: [] };
}

function notThisLink(): Problem {
  return new Problem(
    'link-not-valid',
    'This link is for something else. Ask your administrator for a new one.',
  );
}

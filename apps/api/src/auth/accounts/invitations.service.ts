import { Injectable } from '@nestjs/common';
import { ActivityService } from '../../activity/activity.service';
import { Problem } from '../../common/problem';
import { UnitOfWork } from '../../database/unit-of-work';
import type { InvitedUser, PasswordLink } from '../../users/dto/user.dto';
import type { InviteUser } from '../../users/dto/write-user.dto';
import { UsersService } from '../../users/users.service';
import { LinkTokens } from '../links/link-tokens';

type Actor = { id: number; name: string } | 'service';

/** Invitations and new passwords by a link that the administrator hands over. */
@Injectable()
export class InvitationsService {
  constructor(
    private readonly users: UsersService,
    private readonly links: LinkTokens,
    private readonly units: UnitOfWork,
    private readonly activity: ActivityService,
  ) {}

  /** Makes an account and the link its owner sets a password with. */
  invite(wanted: InviteUser, by: Actor): Promise<InvitedUser> {
    return this.units.run(async () => {
      const { id } = await this.users.create(wanted, by);
      return { user: await this.users.view(id), invitationUrl: await this.links.make('invitation', id) };
    });
  }

  /** Makes a link that sets a new password (or, for somebody invited, the first). */
  passwordLink(id: number, by: Actor): Promise<PasswordLink> {
    return this.units.run(async () => {
      const user = await this.users.find(id);
      if (user.retiredAt !== null) throw new Problem('not-possible-now', `${user.name} is retired.`);
      await this.activity.record({ actor: by, act: 'made a password link', subject: `user ${id}` });
      return { url: await this.links.make(user.state === 'invited' ? 'invitation' : 'password', id) };
    });
  }
}

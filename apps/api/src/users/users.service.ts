import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { ActivityService } from '../activity/activity.service';
import { Clock } from '../common/clock';
import { toIso } from '../common/instants';
import { offsetOf, type PageQuery } from '../common/paging';
import { Problem } from '../common/problem';
import { UnitOfWork } from '../database/unit-of-work';
import type { UserView } from './dto/user.dto';
import type { ChangeUser, InviteUser } from './dto/write-user.dto';
import type { UserPage } from './dto/user-page.dto';
import { User } from './models/user.model';
import { UserDistricts } from './user-districts';

const newAccount = { passwordHash: null, retiredAt: null, sessionEpoch: 0 };

type Actor = { id: number; name: string } | 'service';

/** The people who sign in: made, changed and retired, never erased, because the record names them. */
@Injectable()
export class UsersService {
  constructor(
    @InjectModel(User) private readonly users: typeof User,
    private readonly districts: UserDistricts,
    private readonly units: UnitOfWork,
    private readonly activity: ActivityService,
    private readonly clock: Clock,
  ) {}

  /** One page of everybody, by name. */
  async page(query: PageQuery): Promise<UserPage> {
    const { rows, count } = await this.users.findAndCountAll({
      order: ['name', 'id'],
      limit: query.pageSize,
      offset: offsetOf(query),
    });
    const districts = await this.districts.byUser();
    const items = rows.map((user) => toView(user, districts.get(user.id) ?? []));
    return { items, total: count, page: query.page, pageSize: query.pageSize };
  }

  /** How many accounts there are, retired ones included. */
  count(): Promise<number> {
    return this.users.count();
  }

  /** One account; throws 404. */
  async find(id: number): Promise<User> {
    const user = await this.users.findByPk(id);
    if (!user) throw new Problem('not-found', `There is no user ${id}.`);
    return user;
  }

  /** One account as it is shown. */
  async view(id: number): Promise<UserView> {
    const districts = await this.districts.of(id);
    return toView(
      await this.find(id),
      districts.map((district) => district.id),
    );
  }

  /** The account with this e-mail, in whatever case it is written. */
  findByEmail(email: string): Promise<User | null> {
    return this.users.findOne({ where: { email } });
  }

  /** Makes an account without a password; throws 409 `name-taken` when the e-mail has one. */
  create(wanted: InviteUser, by: Actor): Promise<User> {
    return this.units.run(async () => {
      if (await this.findByEmail(wanted.email))
        throw new Problem('name-taken', `There is an account for ${wanted.email} already.`, {
          errors: [{ field: 'email', text: 'There is an account for this e-mail already.' }],
        });
      const { email, name, role } = wanted;
      const user = await this.users.create({ email, name, role, ...newAccount, createdAt: this.clock.now() });
      await this.districts.set(user.id, wanted.districtIds ?? []);
      await this.activity.record({
        actor: by,
        act: 'made an account',
        subject: `user ${user.id}`,
        body: { ...wanted },
      });
      return user;
    });
  }

  /** Changes name, role or districts; what a session may do changes with the next request. */
  change(id: number, wanted: ChangeUser, by: Actor): Promise<UserView> {
    return this.units.run(async () => {
      const user = await this.find(id);
      if (user.retiredAt !== null)
        throw new Problem('not-possible-now', `${user.name} is retired and cannot be changed.`);
      if (wanted.role && wanted.role !== 'administrator') await this.keepAnAdministrator(user);
      await user.update({ name: wanted.name ?? user.name, role: wanted.role ?? user.role });
      if (wanted.districtIds) await this.districts.set(id, wanted.districtIds);
      await this.activity.record({
        actor: by,
        act: 'changed an account',
        subject: `user ${id}`,
        body: { ...wanted },
      });
      return this.view(id);
    });
  }

  /** Retires somebody: their sessions end at once and they cannot sign in again. */
  retire(id: number, by: Actor): Promise<UserView> {
    return this.units.run(async () => {
      const user = await this.find(id);
      if (user.retiredAt !== null)
        throw new Problem('already-done', `${user.name} was retired at ${toIso(user.retiredAt)}.`);
      await this.keepAnAdministrator(user);
      await user.update({ retiredAt: this.clock.now(), sessionEpoch: user.sessionEpoch + 1 });
      await this.activity.record({ actor: by, act: 'retired an account', subject: `user ${id}` });
      return this.view(id);
    });
  }

  /** Sets the password's hash and ends every session made under the old one. */
  async setPasswordHash(id: number, passwordHash: string): Promise<User> {
    const user = await this.find(id);
    return user.update({ passwordHash, sessionEpoch: user.sessionEpoch + 1 });
  }

  private async keepAnAdministrator(leaving: User): Promise<void> {
    if (leaving.role !== 'administrator') return;
    const administrators = await this.users.findAll({ where: { role: 'administrator', retiredAt: null } });
    if (administrators.every(({ id }) => id === leaving.id))
      throw new Problem(
        'not-possible-now',
        `${leaving.name} is the only administrator. Make another one first.`,
      );
  }
}

function toView(user: User, districtIds: number[]): UserView {
  const { id, email, name, role, state, createdAt, retiredAt } = user;
  return {
    ...{ id, email, name, role, state, districtIds },
    createdAt: toIso(createdAt),
    ...(retiredAt !== null && { retiredAt: toIso(retiredAt) }),
  };
}

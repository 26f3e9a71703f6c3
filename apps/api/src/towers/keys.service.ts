import { createHash, randomBytes } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { ActivityService } from '../activity/activity.service';
import type { SignedIn } from '../auth/signed-in';
import { Clock } from '../common/clock';
import { Problem } from '../common/problem';
import { UnitOfWork } from '../database/unit-of-work';
import { showKey, type KeyDto, type KeyMade } from './dto/key.dto';
import { IngestKey } from './models/ingest-key.model';
import { TowerLayouts } from './tower-layouts';

/** A key holds 256 random bits, so a plain hash of it cannot be searched. */
const hashOf = (key: string): string => createHash('sha256').update(key).digest('hex');
/** `last used` is written at most this often, s. */
const LAST_USED_EVERY_S = 60;

/** Who pushes readings: a key, by what it was made for, and its tower. */
export interface Site {
  readonly keyId: number;
  readonly towerId: number;
  readonly name: string;
}

/** Keys by which sites push their readings: shown once, kept as a hash, each good for one tower. */
@Injectable()
export class KeysService {
  constructor(
    @InjectModel(IngestKey) private readonly keys: typeof IngestKey,
    private readonly layouts: TowerLayouts,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
    private readonly activity: ActivityService,
  ) {}

  /** A tower's keys, the newest first, without the keys themselves. */
  async list(towerId: number): Promise<KeyDto[]> {
    return (await this.keys.findAll({ where: { towerId }, order: [['id', 'DESC']] })).map(showKey);
  }

  /** Makes a key and shows it, this once. */
  create(towerId: number, name: string, by: SignedIn): Promise<KeyMade> {
    const key = `site-${randomBytes(32).toString('base64url')}`;
    return this.work.run(async () => {
      await this.layouts.of(towerId);
      const at = this.clock.now();
      const { id } = await this.keys.create({
        towerId,
        name,
        hash: hashOf(key),
        createdAt: at,
        createdBy: by.id,
      });
      await this.record('ingest key made', towerId, by, { id, name });
      return { id, key };
    });
  }

  /** Revokes a key: from now on nothing is taken with it. */
  revoke(id: number, by: SignedIn): Promise<void> {
    return this.work.run(async () => {
      const key = await this.keys.findByPk(id);
      if (!key) throw new Problem('not-found', `There is no key ${id}.`);
      if (key.revokedAt !== null) return;
      await this.keys.update({ revokedAt: this.clock.now() }, { where: { id } });
      await this.record('ingest key revoked', key.towerId, by, { id, name: key.name });
    });
  }

  /** The site whose key this is; undefined for an unknown or revoked one. Keeps when the key was used. */
  async siteOf(key: string): Promise<Site | undefined> {
    const found = await this.keys.findOne({ where: { hash: hashOf(key), revokedAt: null } });
    if (!found) return undefined;
    const now = this.clock.now();
    if (found.lastUsedAt === null || now - found.lastUsedAt >= LAST_USED_EVERY_S) {
      await this.keys.update({ lastUsedAt: now }, { where: { id: found.id } });
    }
    return { keyId: found.id, towerId: found.towerId, name: found.name };
  }

  private record(act: string, towerId: number, by: SignedIn, body: object): Promise<void> {
    return this.activity.record({ actor: by, act, subject: `tower ${towerId}`, body });
  }
}

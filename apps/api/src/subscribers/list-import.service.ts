import { Injectable } from '@nestjs/common';
import type { NoticeKind } from '@lidwatch/contracts';
import { Clock } from '../common/clock';
import { Settings } from '../config/settings';
import { Sql } from '../database/sql';
import { UnitOfWork } from '../database/unit-of-work';
import { addressHash, normalEmail, normalPhone, type Channel } from './addresses';
import type { Language } from './dto/subscription.dto';
import { WishesService } from './wishes.service';

/** One person of a list kept elsewhere who agreed there to be told. */
export interface ListedPerson {
  lang: Language;
  email?: string;
  phone?: string;
  districtSlugs: string[];
  kinds: NoticeKind[];
}

/** How many people of a list were taken over, were here already, or could not be read. */
export interface ListCounts {
  added: number;
  known: number;
  unread: { row: number; text: string }[];
}

interface NewPerson extends ListedPerson {
  contacts: [Channel, string, string][];
}

const CHUNK = 500;

/** Takes over a list of subscribers who gave their consent before; their addresses count as confirmed. */
@Injectable()
export class ListImportService {
  constructor(
    private readonly sql: Sql,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
    private readonly settings: Settings,
    private readonly wishes: WishesService,
  ) {}

  /** Adds everybody of the list who is not here yet; `origin` says where their consent was given. */
  async add(people: readonly ListedPerson[], origin: string): Promise<ListCounts> {
    const counts: ListCounts = { added: 0, known: 0, unread: [] };
    const slugs = [...new Set(people.flatMap(({ districtSlugs }) => districtSlugs))];
    const ids = await this.wishes.districtIds(slugs);
    const idOf = new Map(slugs.map((slug, at) => [slug, ids[at]!]));
    for (let start = 0; start < people.length; start += CHUNK) {
      const readable = people.slice(start, start + CHUNK).flatMap((person, at) => {
        const contacts = this.contactsOf(person);
        if (contacts.length > 0) return [{ ...person, contacts }];
        counts.unread.push({
          row: start + at + 1,
          text: 'Neither e-mail address nor telephone number can be read.',
        });
        return [];
      });
      await this.work.run(async () => {
        const fresh = await this.unknownOf(readable);
        counts.added += fresh.length;
        counts.known += readable.length - fresh.length;
        await this.insert(fresh, idOf, origin);
      }, 'bulk');
    }
    return counts;
  }

  private contactsOf({ email = '', phone = '' }: ListedPerson): [Channel, string, string][] {
    const found: [Channel, string | undefined][] = [
      ['email', normalEmail(email)],
      ['sms', normalPhone(phone)],
    ];
    return found.flatMap(([channel, address]) =>
      address ? [[channel, address, addressHash(this.settings.secret, channel, address)]] : [],
    );
  }

  /** Those of whom no address is in use here, each address once. */
  private async unknownOf(people: NewPerson[]): Promise<NewPerson[]> {
    const hashes = people.flatMap(({ contacts }) => contacts.map(([, , hash]) => hash));
    const rows = await this.sql.all<{ hash: string }>(
      `SELECT address_hash hash FROM contact WHERE stopped_at IS NULL AND address_hash IN (SELECT value FROM json_each($1))`,
      [JSON.stringify(hashes)],
    );
    const taken = new Set(rows.map(({ hash }) => hash));
    return people.filter(({ contacts }) => {
      if (contacts.some(([, , hash]) => taken.has(hash))) return false;
      for (const [, , hash] of contacts) taken.add(hash);
      return true;
    });
  }

  /** Nobody else writes meanwhile, so the next ids are ours to give. */
  private async insert(people: NewPerson[], idOf: Map<string, number>, origin: string): Promise<void> {
    const last = await this.sql.get<{ id: number }>('SELECT coalesce(max(id), 0) id FROM person');
    const first = (last?.id ?? 0) + 1;
    const rows = people.map((person, at) => ({ ...person, id: first + at }));
    const now = this.clock.now();
    await this.sql.run(
      `INSERT INTO person (id, lang, created_at) SELECT value->>0, value->>1, $2 FROM json_each($1)`,
      [JSON.stringify(rows.map(({ id, lang }) => [id, lang])), now],
    );
    await this.sql.run(
      `INSERT INTO contact (person_id, channel, address, address_hash, confirmed_at, created_at)
       SELECT value->>0, value->>1, value->>2, value->>3, $2, $2 FROM json_each($1)`,
      [JSON.stringify(rows.flatMap(({ id, contacts }) => contacts.map((contact) => [id, ...contact]))), now],
    );
    const wishes = rows.flatMap(({ id, districtSlugs, kinds }) =>
      districtSlugs.flatMap((slug) => kinds.map((kind) => [id, idOf.get(slug), kind])),
    );
    await this.sql.run(
      `INSERT INTO subscription (person_id, district_id, kind, created_at)
       SELECT value->>0, value->>1, value->>2, $2 FROM json_each($1)`,
      [JSON.stringify(wishes), now],
    );
    await this.sql.run(
      `INSERT INTO consent (person_id, act, text, origin, at) SELECT value, 'confirmed', '', $2, $3 FROM json_each($1)`,
      [JSON.stringify(rows.map(({ id }) => id)), origin, now],
    );
  }
}

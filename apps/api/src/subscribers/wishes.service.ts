import { Injectable } from '@nestjs/common';
import type { NoticeKind } from '@lidwatch/contracts';
import { Clock } from '../common/clock';
import { Problem } from '../common/problem';
import { Sql } from '../database/sql';
import { DistrictsService } from '../districts/districts.service';
import type { Language, SubscriptionWishes } from './dto/subscription.dto';

/** What each person wants to be told: districts and kinds of notice, and the language. */
@Injectable()
export class WishesService {
  constructor(
    private readonly sql: Sql,
    private readonly districts: DistrictsService,
    private readonly clock: Clock,
  ) {}

  /** The ids of districts by their address parts; 422 naming those that do not exist. */
  async districtIds(slugs: readonly string[]): Promise<number[]> {
    const found = await Promise.all(slugs.map((slug) => this.districts.bySlug(slug)));
    const unknown = slugs.filter((_, at) => !found[at]);
    if (unknown.length === 0) return found.flatMap((district) => (district ? [district.id] : []));
    throw new Problem('invalid', `There is no district "${unknown.join('", "')}".`, {
      errors: [{ field: 'districtSlugs', text: 'Choose from the districts in the list.' }],
    });
  }

  /** Makes a person with their wishes, in the running transaction; returns their id. */
  async addPerson(
    lang: Language,
    districtIds: readonly number[],
    kinds: readonly NoticeKind[],
  ): Promise<number> {
    const [person] = await this.sql.returning<{ id: number }>(
      `WITH new(lang, at) AS (SELECT $1, $2)
       INSERT INTO person (lang, created_at) SELECT lang, at FROM new RETURNING id`,
      [lang, this.clock.now()],
    );
    await this.set(person!.id, districtIds, kinds);
    return person!.id;
  }

  /** Puts a person's wishes in the place of the ones before. */
  async set(personId: number, districtIds: readonly number[], kinds: readonly NoticeKind[]): Promise<void> {
    await this.sql.run('DELETE FROM subscription WHERE person_id = $1', [personId]);
    await this.sql.run(
      `INSERT INTO subscription (person_id, district_id, kind, created_at)
       SELECT $1, d.value, k.value, $4 FROM json_each($2) d, json_each($3) k`,
      [personId, JSON.stringify(districtIds), JSON.stringify(kinds), this.clock.now()],
    );
  }

  /** Changes the language a person is written to in. */
  async setLanguage(personId: number, lang: Language): Promise<void> {
    await this.sql.run('UPDATE person SET lang = $2 WHERE id = $1', [personId, lang]);
  }

  /** A person's wishes; undefined when they do not exist or have left. */
  async of(personId: number): Promise<SubscriptionWishes | undefined> {
    const person = await this.sql.get<{ lang: Language }>(
      'SELECT lang FROM person WHERE id = $1 AND left_at IS NULL',
      [personId],
    );
    if (!person) return undefined;
    const rows = await this.sql.all<{ slug: string; kind: NoticeKind }>(
      `SELECT d.slug, s.kind FROM subscription s JOIN district d ON d.id = s.district_id
       WHERE s.person_id = $1 ORDER BY d.name, s.kind`,
      [personId],
    );
    return {
      lang: person.lang,
      districtSlugs: [...new Set(rows.map(({ slug }) => slug))],
      kinds: [...new Set(rows.map(({ kind }) => kind))],
    };
  }

  /** Keeps what somebody agreed to or took back, in which words, and where it came from. */
  async keepConsent(personId: number, act: string, text: string, origin: string): Promise<void> {
    await this.sql.run('INSERT INTO consent (person_id, act, text, origin, at) VALUES ($1, $2, $3, $4, $5)', [
      personId,
      act,
      text,
      origin,
      this.clock.now(),
    ]);
  }
}

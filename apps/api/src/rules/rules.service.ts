import { createHash } from 'node:crypto';
import { validateRule, type RuleDefinition } from '@lidwatch/rules';
import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { ActivityService } from '../activity/activity.service';
import type { SignedIn } from '../auth/signed-in';
import { Clock } from '../common/clock';
import { Problem } from '../common/problem';
import { DirtyStages } from '../database/dirty';
import { Sql } from '../database/sql';
import { UnitOfWork } from '../database/unit-of-work';
import { DistrictsService } from '../districts/districts.service';
import { showRule, type RuleDto } from './dto/rule.dto';
import type { RuleInput } from './dto/rule-input.dto';
import { Rule } from './models/rule.model';

/** The version of a district's rule that decides now. */
export interface RuleInForce {
  readonly id: number;
  readonly districtId: number;
  readonly version: number;
  readonly sha256: string;
  readonly body: RuleDefinition;
}

/** The versions of each district's rule: drafts, the one in force, and those before it. */
@Injectable()
export class RulesService {
  constructor(
    @InjectModel(Rule) private readonly rules: typeof Rule,
    private readonly districts: DistrictsService,
    private readonly activity: ActivityService,
    private readonly dirty: DirtyStages,
    private readonly sql: Sql,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
  ) {}

  /** A district's versions, newest first. */
  async list(districtId: number): Promise<RuleDto[]> {
    await this.districts.get(districtId);
    return (await this.rules.findAll({ where: { districtId }, order: [['version', 'DESC']] })).map(showRule);
  }

  /** The rule in force in a district; undefined where none is. */
  async inForce(districtId: number): Promise<RuleInForce | undefined> {
    return (await this.inForceIn([districtId])).get(districtId);
  }

  /** The rules in force in some districts, by district. */
  async inForceIn(districtIds: readonly number[]): Promise<Map<number, RuleInForce>> {
    const rules = await this.rules.findAll({ where: { districtId: [...districtIds], state: 'in force' } });
    return new Map(
      rules.map(({ id, districtId, version, sha256, body }) => [
        districtId,
        { id, districtId, version, sha256, body: JSON.parse(body) as RuleDefinition },
      ]),
    );
  }

  /** The definition of one version; 404 without it. */
  async body(id: number): Promise<RuleDefinition> {
    const rule = await this.rules.findByPk(id);
    if (!rule) throw new Problem('not-found', `There is no rule ${id}.`);
    return JSON.parse(rule.body) as RuleDefinition;
  }

  /** Keeps a draft; 422 `rule-not-valid` with each fault by its path. */
  async draft(districtId: number, input: RuleInput, by: SignedIn): Promise<RuleDto> {
    const validation = validateRule(input.body);
    if (!validation.ok) {
      const errors = validation.problems.map(({ path, text }) => ({ field: `body${path.slice(1)}`, text }));
      throw new Problem('rule-not-valid', errors.map(({ text }) => text).join(' '), { errors });
    }
    const body = JSON.stringify(validation.rule);
    return this.work.run(async () => {
      await this.districts.get(districtId);
      const last = (await this.rules.max<number, Rule>('version', { where: { districtId } })) ?? 0;
      const rule = await this.rules.create({
        ...{ districtId, version: last + 1, body, note: input.note, state: 'draft' },
        ...{ sha256: createHash('sha256').update(body).digest('hex') },
        ...{ createdAt: this.clock.now(), createdBy: by.id, fromAt: null, toAt: null },
      });
      await this.record('drafted a rule', rule, by);
      return showRule(rule);
    });
  }

  /** Puts a draft in force from now on in the place of the version before it. */
  putInForce(id: number, by: SignedIn): Promise<RuleDto> {
    return this.work.run(async () => {
      const rule = await this.rules.findByPk(id);
      if (!rule) throw new Problem('not-found', `There is no rule ${id}.`);
      if (rule.state !== 'draft') {
        throw new Problem(
          'not-possible-now',
          `Version ${rule.version} is ${rule.state}. Draft a new version.`,
        );
      }
      const { districtId } = rule;
      const now = this.clock.now();
      await this.rules.update({ state: 'past', toAt: now }, { where: { districtId, state: 'in force' } });
      await rule.update({ state: 'in force', fromAt: now });
      await this.record('put a rule in force', rule, by);
      await this.evaluateAnew(districtId);
      return showRule(rule);
    });
  }

  /** Has the newest block of a district judged by the new rule, without waiting for the next. */
  private async evaluateAnew(districtId: number): Promise<void> {
    const newest = await this.sql.get<{ tEnd: number | null }>(
      'SELECT max(t_end) tEnd FROM district_block WHERE district_id = $1',
      [districtId],
    );
    if (newest?.tEnd) await this.dirty.mark(3, [[districtId, newest.tEnd]]);
  }

  private record(act: string, rule: Rule, by: SignedIn): Promise<void> {
    const { id, districtId, version, sha256 } = rule;
    return this.activity.record({
      ...{ actor: by, act, subject: `rule ${id}`, districtId },
      body: { version, sha256 },
    });
  }
}

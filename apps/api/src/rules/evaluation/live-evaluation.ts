import {
  blockSeries,
  evaluator,
  NOTICE_KINDS,
  partsOf,
  type Condition,
  type EvaluatedNode,
  type NoticeKind,
} from '@lidwatch/rules';
import { Injectable } from '@nestjs/common';
import { EventEmitter2 } from '@nestjs/event-emitter';
import { Clock } from '../../common/clock';
import { groupBy } from '../../common/group-by';
import { Sql } from '../../database/sql';
import { UnitOfWork } from '../../database/unit-of-work';
import { DistrictPlans, staleAfterS } from '../findings/district-plan';
import { DistrictRows } from '../findings/district-rows';
import type { EvaluatedInput } from '../findings/evaluated-input';
import { RulesService, type RuleInForce } from '../rules.service';

/** Only blocks that ended this recently are judged live; older ones were judged when they were new, s. */
const LIVE_S = 24 * 3600;
/** How far before the longest held-for a series is read, so that a silence does not hide who spoke before it, s. */
const LOOK_BACK_S = 3 * 3600;

/** What the rule in force says of one block. */
export interface DistrictEvaluation {
  readonly districtId: number;
  readonly tEnd: number;
  /** Whether the block ended recently enough to speak for now. */
  readonly fresh: boolean;
  readonly timeZone: string;
  readonly rule: RuleInForce;
  /** Which towers spoke, for beginning. */
  readonly spoke: string | null;
  readonly kinds: ReadonlyMap<NoticeKind, Readonly<Record<'begin' | 'end', EvaluatedNode>>>;
}

type Listener = (evaluation: DistrictEvaluation) => Promise<void>;

const KEEP = `INSERT INTO evaluation (district_id, t_end, rule_id, input_rev, truths, at)
  SELECT value->>0, value->>1, value->>2, value->>3, value->>4, $2 FROM json_each($1) WHERE true
  ON CONFLICT DO UPDATE SET rule_id = excluded.rule_id, input_rev = excluded.input_rev, truths = excluded.truths,
    at = excluded.at`;

const NEWEST = `SELECT value districtId, (SELECT max(t_end) FROM district_block WHERE district_id = value) tEnd
  FROM json_each($1)`;

const longestHeldMinutes = (condition: Condition): number =>
  (condition.heldMinutes ?? 0) + Math.max(0, ...partsOf(condition).map(longestHeldMinutes));

const longestHeldS = ({ body }: RuleInForce): number =>
  60 *
  Math.max(
    ...NOTICE_KINDS.flatMap((kind) =>
      [body[kind]?.begin, body[kind]?.end].map((c) => (c ? longestHeldMinutes(c) : 0)),
    ),
  );

/** Judges a district's new blocks by its rule in force, in the transaction that writes them. */
@Injectable()
export class LiveEvaluation {
  private readonly listeners: Listener[] = [];

  constructor(
    private readonly rules: RulesService,
    private readonly rows: DistrictRows,
    private readonly plans: DistrictPlans,
    private readonly sql: Sql,
    private readonly work: UnitOfWork,
    private readonly events: EventEmitter2,
    private readonly clock: Clock,
  ) {}

  /** Has a listener called, in the same transaction, with the evaluation of a district's newest block. */
  onNewest(listener: Listener): void {
    this.listeners.push(listener);
  }

  /** Judges blocks that have just been written; what is not recent is left as it was judged then. */
  async evaluate(blocks: readonly { readonly districtId: number; readonly tEnd: number }[]): Promise<void> {
    const recent = blocks.filter(({ tEnd }) => tEnd > this.clock.now() - LIVE_S);
    if (recent.length === 0) return;
    const ends = new Map(
      [...groupBy(recent, ({ districtId }) => districtId)].map(([id, own]) => [
        id,
        own.map(({ tEnd }) => tEnd),
      ]),
    );
    const rules = [...(await this.rules.inForceIn([...ends.keys()])).values()];
    if (rules.length > 0) await this.evaluateAll(rules, ends);
    for (const [districtId, own] of ends) {
      const tEnd = Math.max(...own);
      this.work.afterCommit(() => this.events.emit('district.evaluated', { districtId, tEnd }));
    }
  }

  private async evaluateAll(
    rules: readonly RuleInForce[],
    ends: ReadonlyMap<number, readonly number[]>,
  ): Promise<void> {
    const judged = rules.map(({ districtId }) => districtId);
    const all = judged.flatMap((id) => ends.get(id)!);
    const after = Math.min(...all) - Math.max(...rules.map(longestHeldS)) - LOOK_BACK_S;
    const series = await this.rows.series(judged, after, Math.max(...all));
    const evaluations = rules.map((rule) =>
      judge(rule, series.get(rule.districtId) ?? [], new Set(ends.get(rule.districtId))),
    );
    const kept = evaluations.flat().map(({ districtId, tEnd, rule, rev, kinds }) => {
      const truths = [...kinds].map(([kind, { begin, end }]) => [
        kind,
        { begin: begin.truth, end: end.truth },
      ]);
      return [districtId, tEnd, rule.id, rev, JSON.stringify(Object.fromEntries(truths))];
    });
    await this.sql.run(KEEP, [JSON.stringify(kept), this.clock.now()]);
    const newest = await this.newestEnds(judged);
    const plans = await this.plans.all();
    for (const found of evaluations.map((own) => own.at(-1))) {
      const plan = found && plans.get(found.districtId);
      if (!found || !plan || found.tEnd !== newest.get(found.districtId)) continue;
      const fresh = this.clock.now() - found.tEnd < staleAfterS(plan);
      for (const listener of this.listeners) await listener({ ...found, fresh, timeZone: plan.timeZone });
    }
  }

  private async newestEnds(districtIds: readonly number[]): Promise<Map<number, number>> {
    const rows = await this.sql.all<{ districtId: number; tEnd: number }>(NEWEST, [
      JSON.stringify(districtIds),
    ]);
    return new Map(rows.map(({ districtId, tEnd }) => [districtId, tEnd]));
  }
}

/** What a rule says of some of a district's blocks, oldest first. */
function judge(
  rule: RuleInForce,
  inputs: readonly EvaluatedInput[],
  ends: ReadonlySet<number>,
): (Omit<DistrictEvaluation, 'fresh' | 'timeZone'> & { rev: number })[] {
  const begins = evaluator(blockSeries(inputs.map(({ begin }) => begin)), 'begin');
  const endings = evaluator(blockSeries(inputs.map(({ end }) => end)), 'end');
  return inputs
    .filter(({ tEnd }) => ends.has(tEnd))
    .map(({ tEnd, rev, begin }) => {
      const kinds = new Map(
        NOTICE_KINDS.flatMap((kind) => {
          const part = rule.body[kind];
          if (!part) return [];
          const found = { begin: begins(part.begin, tEnd), end: endings(part.end, tEnd) };
          return [[kind, found] as const];
        }),
      );
      return { districtId: rule.districtId, tEnd, rev, rule, spoke: begin.speaker, kinds };
    });
}

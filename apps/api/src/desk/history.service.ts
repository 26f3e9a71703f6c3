import { NOTICE_KINDS, type Condition } from '@lidwatch/rules';
import { Injectable } from '@nestjs/common';
import { fromIso, toIso } from '../common/instants';
import { invalid } from '../common/validation';
import { DistrictsService } from '../districts/districts.service';
import { NoticeLogService } from '../notices/notice-log.service';
import { showRange } from '../profiles/dto/range-value.dto';
import { DistrictHistoryService, type HistoryPoint } from '../rules/findings/district-history.service';
import { RulesService } from '../rules/rules.service';
import type { DistrictHistory, HistoryLimit, HistoryPointDto, HistoryQuery } from './dto/history.dto';
import { nightsBetween } from './nights';

/** The longest span a history is given for, s. */
const LONGEST_S = 400 * 86_400;
const STRENGTHS: readonly string[] = ['inversionStrengthC', 'strengthWithinTowerC'];

/** A district's inversion strength over time, with what decides and what was decided. */
@Injectable()
export class HistoryService {
  constructor(
    private readonly districts: DistrictsService,
    private readonly findings: DistrictHistoryService,
    private readonly rules: RulesService,
    private readonly notices: NoticeLogService,
  ) {}

  /** The history of a district over a span. */
  async of(districtId: number, query: HistoryQuery): Promise<DistrictHistory> {
    const { timeZone, latitude, longitude } = await this.districts.get(districtId);
    const { from, to } = spanOf(query);
    const [{ stepS, points }, limits, notices] = await Promise.all([
      this.findings.of(districtId, from, to),
      this.limits(districtId),
      this.notices.between(districtId, from, to),
    ]);
    const nights = nightsBetween(from, to, latitude, longitude);
    return {
      ...{ districtId, timeZone, from: toIso(from), to: toIso(to), stepMinutes: stepS / 60 },
      points: points.map(showPoint),
      ...{ limits, notices },
      nights: nights.map((night) => ({ from: toIso(night.from), to: toIso(night.to) })),
    };
  }

  /** What the rule in force asks of the inversion's strength. */
  private async limits(districtId: number): Promise<HistoryLimit[]> {
    const rule = await this.rules.inForce(districtId);
    return NOTICE_KINDS.flatMap((kind) => {
      const part = rule?.body[kind];
      if (!part) return [];
      return (['begin', 'end'] as const).flatMap((act) =>
        strengthLimits(part[act], 0).map((limit) => ({ kind, act, ...limit })),
      );
    });
  }
}

/** The clauses on the inversion's strength; those under a "not" are left out, for their limit reads the other way. */
function strengthLimits(condition: Condition, heldAround: number): Omit<HistoryLimit, 'kind' | 'act'>[] {
  const heldMinutes = Math.max(heldAround, condition.heldMinutes ?? 0);
  if ('all' in condition) return condition.all.flatMap((part) => strengthLimits(part, heldMinutes));
  if ('any' in condition) return condition.any.flatMap((part) => strengthLimits(part, heldMinutes));
  if ('not' in condition || !STRENGTHS.includes(condition.measure)) return [];
  const { measure, op, value } = condition;
  return [{ measure, op, value: Number(value), heldMinutes }];
}

function spanOf(query: HistoryQuery): { from: number; to: number } {
  const [from, to] = [fromIso(query.from), fromIso(query.to)];
  if (from === undefined)
    throw invalid([{ field: 'from', text: 'Write from with its offset, such as …T00:00:00Z.' }]);
  if (to === undefined)
    throw invalid([{ field: 'to', text: 'Write to with its offset, such as …T00:00:00Z.' }]);
  if (to <= from) throw invalid([{ field: 'to', text: 'The end must lie after the beginning.' }]);
  if (to - from > LONGEST_S) throw invalid([{ field: 'to', text: 'Ask for at most 400 days at a time.' }]);
  return { from, to };
}

const showPoint = (point: HistoryPoint): HistoryPointDto => {
  const { tEnd, strengthC, withinC, sure, speakerId, reason, step } = point;
  return {
    ...{ t: toIso(tEnd), strength: showRange(strengthC), within: withinC, sure, speakerId },
    ...(reason !== null && { reason }),
    ...(step && { lowest: step.lowestC, strongestAt: toIso(step.strongestAt) }),
  };
};

import { compare, isNotKnown, notKnown, type Quantity } from '@lidwatch/atmosphere';
import type { MeasureName } from '@lidwatch/rules';
import { Injectable } from '@nestjs/common';
import { seesDistrict } from '../auth/own-district';
import type { SignedIn } from '../auth/signed-in';
import { Clock } from '../common/clock';
import { toIso } from '../common/instants';
import { DistrictsService } from '../districts/districts.service';
import type { DistrictDto } from '../districts/dto/district.dto';
import type { NoticeBrief } from '../notices/dto/notice.dto';
import { NoticeLogService } from '../notices/notice-log.service';
import type { ProfileDto } from '../profiles/dto/profile.dto';
import { showRange } from '../profiles/dto/range-value.dto';
import { ProfilesService } from '../profiles/profiles.service';
import { ProposalsService } from '../proposals/proposals.service';
import { DistrictFindingsService, type DistrictFinding } from '../rules/findings/district-findings.service';
import type { Desk, DistrictAir } from './dto/desk.dto';
import { TowerNews } from './tower-news';

/** Everything the desk shows at one look. */
@Injectable()
export class DeskService {
  constructor(
    private readonly districts: DistrictsService,
    private readonly findings: DistrictFindingsService,
    private readonly profiles: ProfilesService,
    private readonly notices: NoticeLogService,
    private readonly proposals: ProposalsService,
    private readonly towers: TowerNews,
    private readonly clock: Clock,
  ) {}

  /** All districts' air, what waits for a decision, and which towers are late; officers see their own districts. */
  async at(user: SignedIn): Promise<Desk> {
    const districts = (await this.districts.list()).filter(({ id }) => seesDistrict(user, id));
    const inForce = await this.notices.inForce(this.clock.now());
    return {
      at: toIso(this.clock.now()),
      districts: await Promise.all(
        districts.map((district) =>
          this.air(
            district,
            inForce.filter(({ districtId }) => districtId === district.id),
          ),
        ),
      ),
      proposals: await this.proposals.waiting(user),
      towers: await this.towers.all(),
    };
  }

  private async air(district: DistrictDto, inForce: NoticeBrief[]): Promise<DistrictAir> {
    const finding = (await this.findings.latest(district.id))!;
    const { tEnd, speaker, fresh } = finding;
    const profile = tEnd !== null && speaker ? await this.profiles.at(speaker.id, tEnd) : undefined;
    const { id: districtId, slug, name, timeZone } = district;
    return {
      ...{ districtId, slug, name, timeZone, fresh, inForce },
      tEnd: tEnd === null ? null : toIso(tEnd),
      ...(finding.reason !== undefined && { reason: finding.reason }),
      speaker: speaker && { towerId: speaker.id, name: speaker.name },
      silent: [...finding.silent],
      ...airOf(finding, profile),
    };
  }
}

/** What is known of a district's air; of an old block nothing is said of now. */
function airOf(finding: DistrictFinding, profile: ProfileDto | undefined) {
  const old = notKnown(finding.reason ?? 'nothing was measured');
  const measured = (name: MeasureName): Quantity => (finding.fresh && finding.values[name]) || old;
  const shown = (name: MeasureName) => showRange(measured(name));
  const strength = measured('inversionStrengthC');
  const present = compare(strength, '>', 0);
  return {
    finding: {
      surface: ({ true: 'present', false: 'absent', 'not known': 'not known' } as const)[present],
      strengthC: showRange(strength),
      sure: compare(measured('inversionSure'), '=', 1),
      forMinutes: shown('episodeMinutes'),
      ...(finding.fresh && profile?.inversion && { topM: profile.inversion.topM }),
      open:
        profile?.inversion?.open ?? (!isNotKnown(strength) && strength.hi === Infinity ? 'at the top' : 'no'),
    },
    elevatedLid: compare(measured('elevatedLid'), '=', 1),
    pm25Hour: shown('pm25Hour'),
    pm25NowCast: shown('pm25NowCast'),
    pm25Running24h: shown('pm25Running24h'),
    floorToBenchC: shown('floorToBenchC'),
    heatDeficitMJPerM2: shown('heatDeficitMJPerM2'),
    breakUpTemperatureC: (finding.fresh && profile?.breakUpTemperatureC) || showRange(old),
    mixingHeightM: shown('mixingHeightM'),
    forecastLowC: shown('forecastLowC'),
    forecastWindMPerS: shown('forecastWindMPerS'),
    windSpeedMPerS: shown('windSpeedMPerS'),
    surfaceTemperatureC: shown('surfaceTemperatureC'),
    levels: profile?.levels ?? [],
  };
}

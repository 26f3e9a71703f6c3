import { isNotKnown } from '@lidwatch/atmosphere';
import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import { fromIso, toIso } from '../common/instants';
import { Problem } from '../common/problem';
import { DistrictsService } from '../districts/districts.service';
import type { DistrictDto } from '../districts/dto/district.dto';
import type { NoticeTexts } from '../notices/dto/notice-text.dto';
import type { Notice } from '../notices/models/notice.model';
import { NoticesService } from '../notices/notices.service';
import { OfficeService } from '../office/office.service';
import type { OfficeDto } from '../office/dto/office.dto';
import type { ProfileDto } from '../profiles/dto/profile.dto';
import { showRange } from '../profiles/dto/range-value.dto';
import { ProfilesService } from '../profiles/profiles.service';
import { DistrictFindingsService, type DistrictFinding } from '../rules/findings/district-findings.service';
import type { PublicState, PublicStatusDto, PublicTexts } from './dto/public-status.dto';
import { withoutNotice, type WithoutNotice } from './words/without-notice';

const STATE_OF = { advisory: 'advisory', burnBan: 'burn ban' } as const;

/** What holds in each district right now, for everybody. */
@Injectable()
export class PublicStatusService {
  constructor(
    private readonly districts: DistrictsService,
    private readonly findings: DistrictFindingsService,
    private readonly notices: NoticesService,
    private readonly profiles: ProfilesService,
    private readonly office: OfficeService,
    private readonly clock: Clock,
  ) {}

  /** Every district, by name. */
  async list(): Promise<PublicStatusDto[]> {
    const office = await this.office.get();
    const all = await this.districts.list();
    return Promise.all(all.map((district) => this.statusOf(district, office)));
  }

  /** One district by its address part; 404 without it. */
  async get(slug: string): Promise<PublicStatusDto> {
    const district = await this.districts.bySlug(slug);
    if (!district) throw new Problem('not-found', `There is no district at "${slug}".`);
    return this.statusOf(district, await this.office.get());
  }

  private async statusOf(district: DistrictDto, office: OfficeDto): Promise<PublicStatusDto> {
    const finding = await this.findings.latest(district.id);
    const notice = strictest(await this.notices.inForce(district.id));
    const phone = district.contactPhone || office.phone;
    const state = stateOf(notice, finding);
    return {
      ...{ slug: district.slug, name: district.name, timeZone: district.timeZone, state },
      ...(notice && { notice: publicNotice(notice) }),
      texts: notice ? noticeTexts(notice) : plainTexts(state as WithoutNotice, { ...district, phone }),
      ...(district.pm25TowerId !== null && finding && { smoke: smokeIn(finding, this.clock.now()) }),
      ...(await this.airOf(finding)),
      at: finding?.tEnd ? toIso(finding.tEnd) : null,
      checkedAt: toIso(this.clock.now()),
      ...{ contactPhone: phone, ordinanceRef: district.ordinanceRef, officeName: office.name },
    };
  }

  private async airOf(finding: DistrictFinding | undefined): Promise<Partial<PublicStatusDto>> {
    if (!finding?.fresh || !finding.speaker || finding.tEnd === null) return {};
    const profile = await this.profiles.at(finding.speaker.id, finding.tEnd);
    return profile ? { levels: levelsOf(profile), inversion: inversionOf(profile) } : {};
  }
}

/** A notice in force is known to hold; without one, what is not measured is not known, never "no restriction". */
function stateOf(notice: Notice | undefined, finding: DistrictFinding | undefined): PublicState {
  if (notice) return STATE_OF[notice.kind];
  const strength = finding?.values.strengthWithinTowerC ?? finding?.values.inversionStrengthC;
  return finding?.fresh && strength && !isNotKnown(strength) ? 'no restriction' : 'not known';
}

function strictest(notices: Notice[]): Notice | undefined {
  return notices.find(({ kind }) => kind === 'burnBan') ?? notices[0];
}

function publicNotice({ ref, kind, expiresAt, issuedAt }: Notice): PublicStatusDto['notice'] {
  return { ref, kind, until: toIso(expiresAt), issuedAt: toIso(issuedAt) };
}

function noticeTexts({ texts }: Notice): PublicTexts {
  const { en, es } = JSON.parse(texts) as NoticeTexts;
  return { en: en.public, es: es.public };
}

function plainTexts(
  state: WithoutNotice,
  place: { name: string; ordinanceRef: string; phone: string },
): PublicTexts {
  return { en: withoutNotice(state, 'en', place), es: withoutNotice(state, 'es', place) };
}

function smokeIn({ values, tEnd, fresh }: DistrictFinding, now: number): PublicStatusDto['smoke'] {
  const measured = fresh ? values.pm25NowCast : undefined;
  const pm25 = measured ? showRange(measured) : { notKnown: 'the monitor has sent nothing lately' };
  return { pm25, at: toIso(tEnd ?? now) };
}

function levelsOf({ levels }: ProfileDto): PublicStatusDto['levels'] {
  return levels.map(({ heightM, temperatureC }) => ({ heightM, temperatureC }));
}

function inversionOf({ surface, inversion }: ProfileDto): PublicStatusDto['inversion'] {
  return { surface, topM: inversion?.topM ?? null, open: inversion?.open ?? 'no' };
}

/** Whether a status still holds at an instant: a notice's written end may have come since it was worked out. */
export function stillHolds({ notice }: PublicStatusDto, now: number): boolean {
  return !notice || (fromIso(notice.until) ?? 0) > now;
}

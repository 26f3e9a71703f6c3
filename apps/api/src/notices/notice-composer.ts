import { createHash } from 'node:crypto';
import type { Quantity } from '@lidwatch/atmosphere';
import type { NoticeKind } from '@lidwatch/contracts';
import { fromEvidence, type EvaluatedNode } from '@lidwatch/rules';
import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import { Settings } from '../config/settings';
import { Sql } from '../database/sql';
import { DistrictsService } from '../districts/districts.service';
import type { DistrictDto } from '../districts/dto/district.dto';
import { OfficeService } from '../office/office.service';
import { EvidenceService } from '../rules/evaluation/evidence.service';
import type { NoticeTexts } from './dto/notice-text.dto';
import { referencePrefix } from './reference';
import { writeNotice } from './texts/write-notice';

/** What a notice is to be about. */
export interface NoticeSubject {
  districtId: number;
  kind: NoticeKind;
  act: 'begin' | 'end';
  /** Written end, UTC epoch seconds. */
  expiresAt: number;
  evidenceId?: number | null;
  /** Of a notice that exists already. */
  ref?: string;
}

/** A notice in words, with the hash that issuing has to carry. */
export interface ComposedNotice {
  ref: string;
  texts: NoticeTexts;
  hash: string;
  district: DistrictDto;
}

/** Puts a notice into words, the same each time until something it says changes. */
@Injectable()
export class NoticeComposer {
  constructor(
    private readonly districts: DistrictsService,
    private readonly office: OfficeService,
    private readonly evidence: EvidenceService,
    private readonly sql: Sql,
    private readonly clock: Clock,
    private readonly settings: Settings,
  ) {}

  /** Writes a notice about a subject. */
  async compose(subject: NoticeSubject): Promise<ComposedNotice> {
    const { kind, act, expiresAt } = subject;
    const district = await this.districts.get(subject.districtId);
    const office = await this.office.get();
    const ref = subject.ref ?? (await this.nextReference(district));
    const strengthC = subject.evidenceId ? await this.strengthIn(subject.evidenceId) : undefined;
    const { name, slug, timeZone, ordinanceRef } = district;
    const texts = writeNotice({
      ...{ kind, act, ref, expiresAt, officeName: office.name, publicUrl: this.settings.publicUrl },
      district: { name, slug, timeZone, ordinanceRef, phone: district.contactPhone || office.phone },
      ...(strengthC && { strengthC }),
    });
    const said = JSON.stringify([kind, act, subject.districtId, expiresAt, texts]);
    return { ref, texts, district, hash: createHash('sha256').update(said).digest('hex') };
  }

  /** The next free reference of a district this year; two that would begin alike count on together. */
  private async nextReference(district: DistrictDto): Promise<string> {
    const prefix = referencePrefix(district.name, district.timeZone, this.clock.now());
    const row = await this.sql.get<{ last: number }>(
      `SELECT coalesce(max(CAST(substr(ref, length($1) + 1) AS INTEGER)), 0) last FROM notice
       WHERE substr(ref, 1, length($1)) = $1`,
      [prefix],
    );
    return `${prefix}${String((row?.last ?? 0) + 1).padStart(3, '0')}`;
  }

  private async strengthIn(evidenceId: number): Promise<Quantity | undefined> {
    const { body } = await this.evidence.read(evidenceId);
    return strengthOf(fromEvidence(body.tree));
  }
}

function strengthOf(node: EvaluatedNode): Quantity | undefined {
  if (node.kind === 'clause') return node.measure === 'inversionStrengthC' ? node.measured : undefined;
  return node.parts.map(strengthOf).find((found) => found !== undefined);
}

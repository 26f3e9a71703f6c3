import { noticeKinds, type NoticeKind } from '@lidwatch/contracts';
import { ApiProperty, ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';
import { PublicText } from '../../notices/dto/notice-text.dto';
import { RangeValue } from '../../profiles/dto/range-value.dto';

export const publicStates = ['no restriction', 'advisory', 'burn ban', 'not known'] as const;
export type PublicState = (typeof publicStates)[number];

/** What residents are told, in both languages. */
@ApiSchema({ name: 'PublicTexts' })
export class PublicTexts {
  @ApiProperty({ type: PublicText }) en!: PublicText;
  @ApiProperty({ type: PublicText }) es!: PublicText;
}

/** The notice that holds. */
@ApiSchema({ name: 'PublicNotice' })
export class PublicNotice {
  @ApiProperty() ref!: string;
  @ApiProperty({ enum: noticeKinds }) kind!: NoticeKind;
  @ApiProperty({ format: 'date-time' }) until!: string;
  @ApiProperty({ format: 'date-time' }) issuedAt!: string;
}

/** Smoke at the district's monitor: PM2.5 by NowCast, µg/m³. */
@ApiSchema({ name: 'PublicSmoke' })
export class PublicSmoke {
  @ApiProperty({ type: RangeValue }) pm25!: RangeValue;
  @ApiProperty({ format: 'date-time' }) at!: string;
}

/** One level of the tower's profile. */
@ApiSchema({ name: 'PublicLevel' })
export class PublicLevel {
  @ApiProperty() heightM!: number;
  @ApiProperty({ type: Number, nullable: true }) temperatureC!: number | null;
}

/** The surface inversion as far as the tower sees it. */
@ApiSchema({ name: 'PublicInversion' })
export class PublicInversion {
  @ApiProperty({ enum: ['present', 'absent', 'not known'] }) surface!: 'present' | 'absent' | 'not known';
  @ApiProperty({ type: Number, nullable: true }) topM!: number | null;
  @ApiProperty({ enum: ['no', 'at the top', 'cut by a missing level'] })
  open!: 'no' | 'at the top' | 'cut by a missing level';
}

/** What holds in a district right now, as residents are told. */
@ApiSchema({ name: 'PublicStatus' })
export class PublicStatusDto {
  @ApiProperty() slug!: string;
  @ApiProperty() name!: string;
  @ApiProperty() timeZone!: string;
  @ApiProperty({ enum: publicStates }) state!: PublicState;
  @ApiPropertyOptional({ type: PublicNotice }) notice?: PublicNotice;
  @ApiProperty({ type: PublicTexts }) texts!: PublicTexts;
  @ApiPropertyOptional({ type: PublicSmoke }) smoke?: PublicSmoke;
  @ApiPropertyOptional({ type: [PublicLevel] }) levels?: PublicLevel[];
  @ApiPropertyOptional({ type: PublicInversion }) inversion?: PublicInversion;
  @ApiProperty({ type: String, format: 'date-time', nullable: true, description: 'End of the newest block' })
  at!: string | null;
  @ApiProperty({ format: 'date-time', description: 'When the service last looked' }) checkedAt!: string;
  @ApiProperty() contactPhone!: string;
  @ApiProperty() ordinanceRef!: string;
  @ApiProperty() officeName!: string;
}

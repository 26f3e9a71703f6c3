import { noticeKinds, type NoticeKind } from '@lidwatch/contracts';
import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { NoticeTexts } from './notice-text.dto';

/** How many a notice goes to. */
@ApiSchema({ name: 'RecipientCount' })
export class RecipientCount {
  @ApiProperty() people!: number;
  @ApiProperty() emails!: number;
  @ApiProperty() texts!: number;
}

/** How many parts the text message has, by language. */
@ApiSchema({ name: 'SegmentCount' })
export class SegmentCount {
  @ApiProperty() en!: number;
  @ApiProperty() es!: number;
}

/** A notice exactly as it would go out now. Issuing carries the hash, so nothing else can go out. */
@ApiSchema({ name: 'NoticePreview' })
export class NoticePreview {
  @ApiProperty({ enum: noticeKinds }) kind!: NoticeKind;
  @ApiProperty({ enum: ['begin', 'end'] }) act!: 'begin' | 'end';
  @ApiProperty() districtId!: number;
  @ApiProperty() ref!: string;
  @ApiProperty({ format: 'date-time' }) expiresAt!: string;
  @ApiProperty() hash!: string;
  @ApiProperty({ type: NoticeTexts }) texts!: NoticeTexts;
  @ApiProperty({ type: RecipientCount }) recipients!: RecipientCount;
  @ApiProperty({ type: SegmentCount }) segments!: SegmentCount;
  @ApiProperty({ description: 'Whether issuing or ending asks for the password again' })
  needsPassword!: boolean;
}

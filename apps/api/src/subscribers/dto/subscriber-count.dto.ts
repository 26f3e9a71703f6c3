import { noticeKinds, type NoticeKind } from '@lidwatch/contracts';
import { ApiProperty, ApiSchema } from '@nestjs/swagger';

/** How many residents get one kind of notice for one district. */
@ApiSchema({ name: 'SubscriberCount' })
export class SubscriberCount {
  @ApiProperty() districtId!: number;
  @ApiProperty({ enum: noticeKinds }) kind!: NoticeKind;
  @ApiProperty() people!: number;
  @ApiProperty({ description: 'Confirmed e-mail addresses' }) emails!: number;
  @ApiProperty({ description: 'Confirmed telephone numbers' }) texts!: number;
}

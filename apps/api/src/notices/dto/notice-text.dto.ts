import { ApiProperty, ApiSchema } from '@nestjs/swagger';

/** The kinds of burning a notice speaks of one by one. */
export const burningKinds = ['uncertified', 'certified', 'pellet', 'fireplace', 'open burning'] as const;
export type BurningKind = (typeof burningKinds)[number];

/** What may go on with one kind of burning. */
@ApiSchema({ name: 'StoveText' })
export class StoveText {
  @ApiProperty({ enum: burningKinds }) kind!: BurningKind;
  @ApiProperty({ example: 'certified stove' }) name!: string;
  @ApiProperty() text!: string;
}

/** What the public page says, in one language. Times are written out in the district's zone. */
@ApiSchema({ name: 'PublicText' })
export class PublicText {
  @ApiProperty() headline!: string;
  @ApiProperty() untilText!: string;
  @ApiProperty({ type: [String] }) whatToDo!: string[];
  @ApiProperty({ type: [StoveText] }) stoves!: StoveText[];
  @ApiProperty() why!: string;
  @ApiProperty() exemptions!: string;
  @ApiProperty({ type: [String] }) cautions!: string[];
}

/** A notice in one language, for every way it goes out. */
@ApiSchema({ name: 'NoticeText' })
export class NoticeText {
  @ApiProperty() subject!: string;
  @ApiProperty() mailText!: string;
  @ApiProperty() mailHtml!: string;
  @ApiProperty({ description: 'GSM 7-bit characters only' }) sms!: string;
  @ApiProperty({ type: PublicText }) public!: PublicText;
}

/** A notice in every language it goes out in. */
@ApiSchema({ name: 'NoticeTexts' })
export class NoticeTexts {
  @ApiProperty({ type: NoticeText }) en!: NoticeText;
  @ApiProperty({ type: NoticeText }) es!: NoticeText;
}

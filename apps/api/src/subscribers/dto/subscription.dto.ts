import { noticeKinds, type NoticeKind } from '@lidwatch/contracts';
import { ApiProperty, ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';
import {
  ArrayMaxSize,
  ArrayNotEmpty,
  ArrayUnique,
  IsArray,
  IsIn,
  IsOptional,
  IsString,
  MaxLength,
} from 'class-validator';

/** The languages notices are written in. */
export const languages = ['en', 'es'] as const;
export type Language = (typeof languages)[number];

/** Which notices somebody wants, for which districts, in which language. */
export class SubscriptionWishes {
  @ApiProperty({ enum: languages })
  @IsIn(languages, { message: 'lang must be en or es' })
  lang!: Language;

  @ApiProperty({ type: [String] })
  @IsArray()
  @ArrayNotEmpty({ message: 'Choose at least one district.' })
  @ArrayMaxSize(200)
  @ArrayUnique()
  @IsString({ each: true })
  districtSlugs!: string[];

  @ApiProperty({ enum: noticeKinds, isArray: true })
  @IsArray()
  @ArrayNotEmpty({ message: 'Choose at least one kind of notice.' })
  @ArrayUnique()
  @IsIn(noticeKinds, { each: true, message: 'kinds may hold advisory and burnBan' })
  kinds!: NoticeKind[];
}

/** What a resident gives to be told next time: an e-mail address, a telephone number, or both. */
export class SubscriptionRequest extends SubscriptionWishes {
  @ApiPropertyOptional({ example: 'ada@pellworth.example' })
  @IsOptional()
  @IsString()
  @MaxLength(254)
  email?: string;

  @ApiPropertyOptional({ example: '208 555 0142' })
  @IsOptional()
  @IsString()
  @MaxLength(40)
  phone?: string;
}

/** The same answer for everybody, so that nobody learns who is subscribed. */
export class SubscriptionReceipt {
  @ApiProperty() message!: string;
}

/** The token from the confirmation link. */
export class ConfirmRequest {
  @ApiProperty() @IsString() @MaxLength(200) token!: string;
}

/** The token for the page on which wishes are changed. */
export class ConfirmedDto {
  @ApiProperty() manageToken!: string;
}

/** One way a subscriber is reached, without giving it away. */
export class ContactView {
  @ApiProperty({ enum: ['email', 'sms'] }) channel!: 'email' | 'sms';
  @ApiProperty({ description: 'Masked' }) address!: string;
  @ApiProperty() confirmed!: boolean;
}

/** A subscriber's own view of their subscription. */
@ApiSchema({ name: 'SubscriptionView' })
export class SubscriptionView extends SubscriptionWishes {
  @ApiProperty({ type: [ContactView] }) contacts!: ContactView[];
}

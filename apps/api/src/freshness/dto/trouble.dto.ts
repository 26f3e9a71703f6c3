import { ApiProperty, ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';
import { Transform } from 'class-transformer';
import { IsBoolean, IsOptional } from 'class-validator';

/** What can be wrong with a tower's data. */
export const troubleKinds = ['late', 'silent', 'clock ahead', 'clock shifted', 'source failing'] as const;
/** One of them. */
export type TroubleKind = (typeof troubleKinds)[number];

const instant = { type: String, nullable: true, format: 'date-time' } as const;

/** Which troubles are wanted. */
export class TroublesQuery {
  @ApiPropertyOptional({ description: 'true: only what is not over' })
  @IsOptional()
  @Transform(({ value }) => (value === 'true' ? true : value === 'false' ? false : value))
  @IsBoolean({ message: 'open must be true or false' })
  open?: boolean;
}

/** Something wrong with a tower's data, from when to when, and who was told. */
@ApiSchema({ name: 'Trouble' })
export class TroubleDto {
  @ApiProperty() id!: number;
  @ApiProperty() towerId!: number;
  @ApiProperty() towerName!: string;
  @ApiProperty({ enum: troubleKinds }) kind!: TroubleKind;
  @ApiProperty({ description: 'What is wrong and what to look at, in sentences' }) text!: string;
  @ApiProperty({ format: 'date-time', description: 'Since when, as far as the data tell' }) since!: string;
  @ApiProperty({ format: 'date-time', description: 'When the service saw it' }) seenAt!: string;
  @ApiProperty({ ...instant, description: 'When mail about it was queued for the analysts' })
  toldAt!: string | null;
  @ApiProperty({ description: 'Analysts whose mail server took the mail' }) mailsAccepted!: number;
  @ApiProperty({ description: 'Analysts to whom mail still waits or could not be given' })
  mailsNotAccepted!: number;
  @ApiProperty(instant) endedAt!: string | null;
}

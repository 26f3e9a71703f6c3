import { ApiProperty, ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsInt, IsOptional, IsString, Length } from 'class-validator';
import { PageQuery, pageOf } from '../../common/paging';
import { originKinds } from '../importing/origin';
import { RefusedRowShown } from './ingest-result.dto';

const importStates = ['running', 'done', 'cancelled', 'failed', 'withdrawing', 'withdrawn'] as const;

/** Which imports are wanted. */
export class ImportsQuery extends PageQuery {
  @ApiPropertyOptional()
  @IsOptional()
  @Type(() => Number)
  @IsInt()
  towerId?: number;
}

/** Readings that came together: a push, or what a collection found new. */
@ApiSchema({ name: 'Import' })
export class ImportDto {
  @ApiProperty() id!: number;
  @ApiProperty() towerId!: number;
  @ApiProperty() towerName!: string;
  @ApiProperty({ enum: originKinds }) origin!: (typeof originKinds)[number];
  @ApiProperty() name!: string;
  @ApiProperty() receivedAt!: string;
  @ApiProperty() new!: number;
  @ApiProperty() repeated!: number;
  @ApiProperty() corrected!: number;
  @ApiProperty() refused!: number;
  @ApiProperty({ enum: importStates }) state!: (typeof importStates)[number];
  @ApiProperty({ type: String, nullable: true, description: 'Who sent it; null where a machine did' })
  by!: string | null;
  @ApiProperty({ type: String, nullable: true }) withdrawnAt!: string | null;
  @ApiProperty({ type: String, nullable: true }) withdrawnBy!: string | null;
  @ApiProperty({ description: 'Whether it can be taken back as a whole' }) canWithdraw!: boolean;
}

/** Why an import is taken back. */
export class WithdrawInput {
  @ApiProperty()
  @IsString()
  @Length(3, 500, { message: 'reason must say why, in 3 to 500 characters' })
  reason!: string;
}

/** A refused row with the line as it came. */
@ApiSchema({ name: 'RefusedRow' })
export class RefusedRowDto extends RefusedRowShown {
  @ApiProperty() raw!: string;
}

/** A page of imports, the newest first. */
export class ImportPage extends pageOf(ImportDto) {}
/** A page of an import's refused rows, in the order of the file. */
export class RefusedRowPage extends pageOf(RefusedRowDto) {}

import { ApiProperty, ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsInt, IsOptional } from 'class-validator';
import { PageQuery, pageOf } from '../../common/paging';
import { RefusedRowShown } from './ingest-result.dto';

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
  @ApiProperty({ enum: ['folder', 'push', 'demo'] }) origin!: string;
  @ApiProperty() name!: string;
  @ApiProperty() receivedAt!: string;
  @ApiProperty() new!: number;
  @ApiProperty() repeated!: number;
  @ApiProperty() corrected!: number;
  @ApiProperty() refused!: number;
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

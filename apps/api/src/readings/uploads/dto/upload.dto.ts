import { ApiProperty, ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsInt, IsOptional, IsString, Length, ValidateNested } from 'class-validator';
import { toIso } from '../../../common/instants';
import { MappingInput } from '../../../towers/dto/mapping.dto';
import type { StoredUpload, UploadState } from '../upload-rows';

/** For which tower a file is, and what it is called. */
export class UploadQuery {
  @ApiProperty()
  @Type(() => Number)
  @IsInt({ message: 'towerId must say for which tower the file is' })
  towerId!: number;

  @ApiProperty({ description: "The file's name" })
  @IsString()
  @Length(1, 200)
  name!: string;
}

/** Which uploads are wanted. */
export class UploadsQuery {
  @ApiPropertyOptional()
  @IsOptional()
  @Type(() => Number)
  @IsInt()
  towerId?: number;
}

/** Which sheet of a workbook is wanted. */
export class SheetQuery {
  @ApiPropertyOptional()
  @IsOptional()
  @IsString()
  @Length(1, 100)
  sheet?: string;
}

/** How to read an uploaded file. */
export class MappingBody {
  @ApiProperty({ type: MappingInput })
  @ValidateNested()
  @Type(() => MappingInput)
  mapping!: MappingInput;
}

/** An import of the very same file. */
@ApiSchema({ name: 'SameImport' })
export class SameImportDto {
  @ApiProperty() importId!: number;
  @ApiProperty() receivedAt!: string;
}

const states = [
  'waiting',
  'running',
  'done',
  'cancelled',
  'failed',
] as const satisfies readonly UploadState[];

/** A file that was sent, and how its import stands. */
@ApiSchema({ name: 'Upload' })
export class UploadDto {
  @ApiProperty() id!: number;
  @ApiProperty() towerId!: number;
  @ApiProperty() towerName!: string;
  @ApiProperty() name!: string;
  @ApiProperty({ enum: ['text', 'workbook'] }) kind!: 'text' | 'workbook';
  @ApiProperty() bytes!: number;
  @ApiProperty({ enum: states }) state!: UploadState;
  @ApiProperty({ description: 'Bytes imported so far' }) bytesDone!: number;
  @ApiProperty({ type: Number, nullable: true }) importId!: number | null;
  @ApiProperty({ type: String, nullable: true, description: 'Why it failed, with the cure' }) fault!:
    string | null;
  @ApiProperty() createdAt!: string;
  @ApiProperty({ type: String, nullable: true }) endedAt!: string | null;
  @ApiProperty({ description: 'Who sent it' }) by!: string;
  @ApiProperty({ type: SameImportDto, nullable: true, description: 'The same file was imported before' })
  sameAs!: SameImportDto | null;
  @ApiProperty({ type: MappingInput, nullable: true }) mapping!: MappingInput | null;
}

/** A kept upload in the API's shape. */
export function showUpload(upload: StoredUpload, bytesDone = upload.bytesDone): UploadDto {
  const { sha256: _, sameId, sameAt, createdAt, endedAt, mapping, ...row } = upload;
  return {
    ...row,
    bytesDone: Math.min(bytesDone, upload.bytes),
    createdAt: toIso(createdAt),
    endedAt: endedAt === null ? null : toIso(endedAt),
    sameAs: sameId === null || sameAt === null ? null : { importId: sameId, receivedAt: toIso(sameAt) },
    mapping: mapping === null ? null : (JSON.parse(mapping) as MappingInput),
  };
}

import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { IsString, Length } from 'class-validator';
import { toIso } from '../../common/instants';
import type { IngestKey } from '../models/ingest-key.model';

/** What a new key is to be called. */
export class KeyInput {
  @ApiProperty({ example: 'mast logger' })
  @IsString()
  @Length(1, 80, { message: 'name must have 1 to 80 characters' })
  name!: string;
}

/** A key just made: the only time the key itself is shown. */
export class KeyMade {
  @ApiProperty() id!: number;
  @ApiProperty({ description: 'Keep it now: it is never shown again' }) key!: string;
}

/** A site's key without the key. */
@ApiSchema({ name: 'IngestKey' })
export class KeyDto {
  @ApiProperty() id!: number;
  @ApiProperty() name!: string;
  @ApiProperty() createdAt!: string;
  @ApiProperty({ type: String, nullable: true }) lastUsedAt!: string | null;
  @ApiProperty({ type: String, nullable: true }) revokedAt!: string | null;
}

const orNull = (epochS: number | null): string | null => (epochS === null ? null : toIso(epochS));

/** A stored key in the API's shape. */
export function showKey({ id, name, createdAt, lastUsedAt, revokedAt }: IngestKey): KeyDto {
  return {
    id,
    name,
    createdAt: toIso(createdAt),
    lastUsedAt: orNull(lastUsedAt),
    revokedAt: orNull(revokedAt),
  };
}

import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { toIso } from '../../common/instants';
import type { Source } from '../models/source.model';
import { MappingInput } from './mapping.dto';
import { auths, sourceKinds, type Auth, type SourceKind } from './source-input.dto';

/** A source as the API shows it; its credentials are never in it. */
@ApiSchema({ name: 'Source' })
export class SourceDto {
  @ApiProperty() id!: number;
  @ApiProperty() towerId!: number;
  @ApiProperty({ enum: sourceKinds }) kind!: SourceKind;
  @ApiProperty({ type: String, nullable: true }) path!: string | null;
  @ApiProperty({ type: String, nullable: true }) url!: string | null;
  @ApiProperty({ enum: auths }) auth!: Auth;
  @ApiProperty({ description: 'Whether credentials are kept' }) hasSecret!: boolean;
  @ApiProperty({ type: MappingInput }) mapping!: MappingInput;
  @ApiProperty() intervalSeconds!: number;
  @ApiProperty({ description: 'Whether it is being collected right now' }) collecting!: boolean;
  @ApiProperty({ type: String, nullable: true }) lastAt!: string | null;
  @ApiProperty({ type: String, nullable: true, description: 'The last time it could be collected' })
  lastOkAt!: string | null;
  @ApiProperty({
    type: String,
    nullable: true,
    description: 'What the last collection gave, or why it failed',
  })
  lastResult!: string | null;
  @ApiProperty({ description: 'Failures in a row' }) failures!: number;
  @ApiProperty({ type: String, nullable: true, description: 'When the present row of failures began' })
  failingSince!: string | null;
  @ApiProperty({ type: String, nullable: true }) nextAt!: string | null;
  @ApiProperty({ description: 'Counts changes; a change names the one it began from' }) version!: number;
}

const orNull = (epochS: number | null | undefined): string | null => (epochS == null ? null : toIso(epochS));

/** A stored source in the API's shape. */
export function showSource(source: Source, collecting: boolean): SourceDto {
  const { id, towerId, kind, auth, version } = source;
  return {
    ...{ id, towerId, kind, auth, version, collecting },
    path: source.path ?? null,
    url: source.url ?? null,
    hasSecret: source.secret != null,
    mapping: JSON.parse(source.mapping) as MappingInput,
    intervalSeconds: source.intervalS,
    lastAt: orNull(source.lastAt),
    lastOkAt: orNull(source.lastOkAt),
    lastResult: source.lastResult ?? null,
    failures: source.failures ?? 0,
    failingSince: orNull(source.failingSince),
    nextAt: orNull(source.nextAt),
  };
}

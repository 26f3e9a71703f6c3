import { ApiProperty, ApiPropertyOptional, OmitType, PartialType } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import {
  IsIn,
  IsInt,
  IsOptional,
  IsString,
  Length,
  Matches,
  Max,
  MaxLength,
  Min,
  ValidateNested,
} from 'class-validator';
import { MappingInput } from './mapping.dto';

/** How readings come: from a folder, from an address, or sent by the site. */
export const sourceKinds = ['folder', 'http', 'push'] as const;
export type SourceKind = (typeof sourceKinds)[number];

/** What an address asks for before it gives its file. */
export const auths = ['none', 'basic', 'bearer'] as const;
export type Auth = (typeof auths)[number];

/** What a header can carry: visible ASCII, no blank. */
const TOKEN = /^[\x21-\x7e]+$/;

/** What is needed to add a source; which fields belong to which kind is checked where it is kept. */
export class SourceInput {
  @ApiProperty({ enum: sourceKinds })
  @IsIn(sourceKinds, { message: `kind must be one of ${sourceKinds.join(', ')}` })
  kind!: SourceKind;

  @ApiPropertyOptional({ description: "folder: a file or folder beneath the loggers' folder" })
  @IsOptional()
  @IsString({ message: "path must name a file or folder beneath the loggers' folder" })
  @Matches(/^(?!\/)(?!.*(^|\/)\.\.(\/|$))[^\0]+$/, {
    message: "path must stay beneath the loggers' folder, without a leading / or ..",
  })
  @MaxLength(300)
  path?: string;

  @ApiPropertyOptional({ description: 'http: the address of the file, at a host of HTTP_SOURCE_HOSTS' })
  @IsOptional()
  @IsString({ message: 'url must be an address such as https://loggers.example.org/mast.csv' })
  @MaxLength(1000)
  url?: string;

  @ApiPropertyOptional({ enum: auths, default: 'none' })
  @IsOptional()
  @IsIn(auths, { message: `auth must be one of ${auths.join(', ')}` })
  auth?: Auth;

  @ApiPropertyOptional({ description: 'basic: kept sealed and never shown again' })
  @IsOptional()
  @IsString()
  @Matches(/^[^:\p{Cc}]+$/u, { message: 'username must be without colon and control characters' })
  @Length(1, 200)
  username?: string;

  @ApiPropertyOptional({ description: 'basic: kept sealed and never shown again' })
  @IsOptional()
  @IsString()
  @Matches(/^\P{Cc}+$/u, { message: 'password must be without control characters' })
  @Length(1, 500)
  password?: string;

  @ApiPropertyOptional({ description: 'bearer: kept sealed and never shown again' })
  @IsOptional()
  @IsString()
  @Matches(TOKEN, { message: 'token must be without blanks and of plain letters, digits and signs' })
  @MaxLength(4000)
  token?: string;

  @ApiPropertyOptional({ type: MappingInput })
  @IsOptional()
  @ValidateNested()
  @Type(() => MappingInput)
  mapping?: MappingInput;

  @ApiPropertyOptional({ default: 60, description: 'At least 10 for a folder, 60 over HTTP' })
  @IsOptional()
  @IsInt()
  @Min(10, { message: 'intervalSeconds must be 10 or more' })
  @Max(86_400, { message: 'intervalSeconds must be 86400 (a day) or less' })
  intervalSeconds?: number;
}

/** A change of a source; what is left out stays. */
export class SourcePatch extends PartialType(OmitType(SourceInput, ['kind'] as const)) {
  @ApiProperty({ description: 'The version the change began from' })
  @IsInt()
  version!: number;
}

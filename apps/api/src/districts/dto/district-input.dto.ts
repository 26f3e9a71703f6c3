import { ApiProperty, ApiPropertyOptional, PartialType } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import {
  ArrayUnique,
  IsArray,
  IsBoolean,
  IsIn,
  IsInt,
  IsNumber,
  IsOptional,
  IsString,
  IsTimeZone,
  Length,
  Matches,
  Max,
  MaxLength,
  Min,
  ValidateNested,
} from 'class-validator';
import { combinations } from './district.dto';

/** A tower that is to speak for a district. */
export class DistrictTowerInput {
  @ApiProperty() @IsInt({ message: 'towerId must be the id of a tower' }) towerId!: number;
  @ApiPropertyOptional({ default: true }) @IsOptional() @IsBoolean() mayBegin: boolean = true;
  @ApiPropertyOptional({ default: true }) @IsOptional() @IsBoolean() mayEnd: boolean = true;
}

/** What is needed to make a district. */
export class DistrictInput {
  @ApiPropertyOptional({ description: 'Address part of the public page; from the name when left out' })
  @IsOptional()
  @Matches(/^[a-z0-9]+(-[a-z0-9]+)*$/, { message: 'slug must be small letters, digits and single hyphens' })
  @MaxLength(60)
  slug?: string;

  @ApiProperty() @IsString() @Length(1, 80, { message: 'name must have 1 to 80 characters' }) name!: string;

  @ApiProperty({ example: 'America/Denver' })
  @IsTimeZone({ message: 'timeZone must be an IANA zone such as America/Denver' })
  timeZone!: string;

  @ApiProperty() @IsNumber() @Min(-90) @Max(90) latitude!: number;
  @ApiProperty() @IsNumber() @Min(-180) @Max(180) longitude!: number;

  @ApiPropertyOptional({ type: Number, nullable: true })
  @IsOptional()
  @IsNumber()
  @Min(-500)
  @Max(9000)
  elevationM?: number | null;

  @ApiPropertyOptional({ type: Number, nullable: true }) @IsOptional() @IsInt() @Min(0) population?:
    number | null;
  @ApiPropertyOptional() @IsOptional() @IsString() @MaxLength(2000) areaText?: string;
  @ApiPropertyOptional() @IsOptional() @IsString() @MaxLength(200) ordinanceRef?: string;
  @ApiPropertyOptional() @IsOptional() @IsString() @MaxLength(40) contactPhone?: string;

  @ApiPropertyOptional({ enum: combinations, default: 'first-fresh' })
  @IsOptional()
  @IsIn(combinations, { message: `combine must be one of ${combinations.join(', ')}` })
  combine?: (typeof combinations)[number];

  @ApiPropertyOptional({ type: [DistrictTowerInput], description: 'In the order in which they are asked' })
  @IsOptional()
  @IsArray()
  @ArrayUnique((tower: DistrictTowerInput) => tower.towerId, { message: 'towers must name each tower once' })
  @ValidateNested({ each: true })
  @Type(() => DistrictTowerInput)
  towers?: DistrictTowerInput[];

  @ApiPropertyOptional({ type: Number, nullable: true }) @IsOptional() @IsInt() floorTowerId?: number | null;
  @ApiPropertyOptional({ type: Number, nullable: true }) @IsOptional() @IsInt() benchTowerId?: number | null;
  @ApiPropertyOptional({ type: Number, nullable: true }) @IsOptional() @IsInt() pm25TowerId?: number | null;
}

/** What may be changed of a district; `version` is the one that was read. */
export class DistrictPatch extends PartialType(DistrictInput) {
  @ApiProperty({ description: 'The version that was read' })
  @IsInt({ message: 'version must be the version that was read' })
  version!: number;
}

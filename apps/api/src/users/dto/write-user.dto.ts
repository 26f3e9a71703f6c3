import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { roles, type Role } from '@lidwatch/contracts';
import { Transform } from 'class-transformer';
import {
  ArrayMaxSize,
  ArrayUnique,
  IsArray,
  IsEmail,
  IsIn,
  IsInt,
  IsOptional,
  IsString,
  Length,
} from 'class-validator';

const trimmed = ({ value }: { value: unknown }): unknown =>
  typeof value === 'string' ? value.trim() : value;
const roleWords = { message: `Choose a role: ${roles.join(', ')}.` };

/** What an invitation needs. */
export class InviteUser {
  @ApiProperty({ format: 'email' })
  @Transform(trimmed)
  @IsEmail({}, { message: 'Write an e-mail address such as name@example.org.' })
  @Length(3, 254)
  email!: string;

  @ApiProperty()
  @Transform(trimmed)
  @IsString()
  @Length(1, 100, { message: 'Write the name, up to 100 characters.' })
  name!: string;

  @ApiProperty({ enum: roles })
  @IsIn(roles, roleWords)
  role!: Role;

  @ApiPropertyOptional({ type: [Number] })
  @IsOptional()
  @IsArray()
  @ArrayMaxSize(200)
  @ArrayUnique()
  @IsInt({ each: true })
  districtIds: number[] = [];
}

/** What can be changed about an account. */
export class ChangeUser {
  @ApiPropertyOptional()
  @IsOptional()
  @Transform(trimmed)
  @IsString()
  @Length(1, 100, { message: 'Write the name, up to 100 characters.' })
  name?: string;

  @ApiPropertyOptional({ enum: roles })
  @IsOptional()
  @IsIn(roles, roleWords)
  role?: Role;

  @ApiPropertyOptional({ type: [Number] })
  @IsOptional()
  @IsArray()
  @ArrayMaxSize(200)
  @ArrayUnique()
  @IsInt({ each: true })
  districtIds?: number[];
}

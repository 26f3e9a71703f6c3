import { ApiProperty } from '@nestjs/swagger';
import { IsString, Length, MaxLength } from 'class-validator';

/** What signing in needs. */
export class SignIn {
  @ApiProperty({ format: 'email' })
  @IsString()
  @Length(1, 254, { message: 'Write your e-mail.' })
  email!: string;

  @ApiProperty({ format: 'password' })
  @IsString()
  @Length(1, 512, { message: 'Write your password.' })
  password!: string;
}

/** What the first administrator's link asks for. */
export class FirstAdministrator {
  @ApiProperty()
  @IsString()
  @MaxLength(200)
  token!: string;

  @ApiProperty()
  @IsString()
  @Length(1, 100, { message: 'Write your name, up to 100 characters.' })
  name!: string;

  @ApiProperty({ format: 'email' })
  @IsString()
  @Length(3, 254, { message: 'Write your e-mail.' })
  email!: string;

  @ApiProperty({ format: 'password', minLength: 12, maxLength: 128 })
  @IsString()
  @MaxLength(512)
  password!: string;
}

/** What an invitation or a password link asks for. */
export class AcceptInvitation {
  @ApiProperty()
  @IsString()
  @MaxLength(200)
  token!: string;

  @ApiProperty({ format: 'password', minLength: 12, maxLength: 128 })
  @IsString()
  @MaxLength(512)
  password!: string;
}

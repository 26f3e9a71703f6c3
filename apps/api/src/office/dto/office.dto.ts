import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { IsString, Length, MaxLength } from 'class-validator';

/** Who speaks in the notices. */
@ApiSchema({ name: 'Office' })
export class OfficeDto {
  @ApiProperty({ example: 'Pellworth Clean Air Office' })
  @IsString()
  @Length(2, 60, { message: 'name must have 2 to 60 characters' })
  name!: string;

  @ApiProperty({ example: '208 555 0142', description: 'Where residents may call; empty when nowhere' })
  @IsString()
  @MaxLength(40, { message: 'phone must have at most 40 characters' })
  phone!: string;
}

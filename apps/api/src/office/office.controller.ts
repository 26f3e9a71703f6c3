import { Body, Controller, Get, Put } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { CurrentUser, Roles } from '../auth/decorators';
import type { SignedIn } from '../auth/signed-in';
import { OfficeDto } from './dto/office.dto';
import { OfficeService } from './office.service';

/** The office that signs the notices. */
@ApiTags('office')
@Controller('office')
export class OfficeController {
  constructor(private readonly office: OfficeService) {}

  /** Shows the office. */
  @Get()
  @Roles('administrator', 'analyst', 'officer')
  get(): Promise<OfficeDto> {
    return this.office.get();
  }

  /** Changes the office. */
  @Put()
  @Roles('administrator')
  set(@Body() office: OfficeDto, @CurrentUser() by: SignedIn): Promise<OfficeDto> {
    return this.office.set(office, by);
  }
}

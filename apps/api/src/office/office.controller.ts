import { Body, Controller, Get, Put } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
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
  @ApiOkResponse({ type: OfficeDto })
  @Roles('administrator', 'analyst', 'officer')
  get(): Promise<OfficeDto> {
    return this.office.get();
  }

  /** Changes the office. */
  @Put()
  @ApiOkResponse({ type: OfficeDto })
  @Roles('administrator')
  set(@Body() office: OfficeDto, @CurrentUser() by: SignedIn): Promise<OfficeDto> {
    return this.office.set(office, by);
  }
}

import { Body, Controller, Get, Param, ParseIntPipe, Patch, Post } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { CurrentUser, Roles } from '../auth/decorators';
import type { SignedIn } from '../auth/signed-in';
import { DistrictsService } from './districts.service';
import { DistrictDto } from './dto/district.dto';
import { DistrictInput, DistrictPatch } from './dto/district-input.dto';

/** Districts, for staff. */
@ApiTags('districts')
@Controller('districts')
export class DistrictsController {
  constructor(private readonly districts: DistrictsService) {}

  /** Lists every district. */
  @Get()
  @Roles('administrator', 'analyst', 'officer')
  @ApiOkResponse({ type: [DistrictDto] })
  list(): Promise<DistrictDto[]> {
    return this.districts.list();
  }

  /** Shows one district. */
  @Get(':id')
  @Roles('administrator', 'analyst', 'officer')
  @ApiOkResponse({ type: DistrictDto })
  get(@Param('id', ParseIntPipe) id: number): Promise<DistrictDto> {
    return this.districts.get(id);
  }

  /** Makes a district. */
  @Post()
  @Roles('administrator')
  @ApiCreatedResponse({ type: DistrictDto })
  create(@Body() input: DistrictInput, @CurrentUser() by: SignedIn): Promise<DistrictDto> {
    return this.districts.create(input, by);
  }

  /** Changes a district. */
  @Patch(':id')
  @Roles('administrator')
  @ApiOkResponse({ type: DistrictDto })
  change(
    @Param('id', ParseIntPipe) id: number,
    @Body() patch: DistrictPatch,
    @CurrentUser() by: SignedIn,
  ): Promise<DistrictDto> {
    return this.districts.change(id, patch, by);
  }
}

import { Body, Controller, Get, HttpCode, Post, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { CurrentUser, Roles } from '../auth/decorators';
import type { SignedIn } from '../auth/signed-in';
import {
  ForecastDto,
  ForecastInput,
  ForecastSkillDto,
  ForecastsQuery,
  ForecastTableInput,
  ForecastTableResultDto,
  SkillQuery,
} from './dto/forecast.dto';
import { ForecastsService } from './forecasts.service';

/** Days' forecasts and what they turned out to be, for staff. */
@ApiTags('forecasts')
@Controller('forecasts')
export class ForecastsController {
  constructor(private readonly forecasts: ForecastsService) {}

  /** Lists a district's forecasts, the newest day first. */
  @Get()
  @Roles('administrator', 'analyst', 'officer')
  @ApiOkResponse({ type: [ForecastDto] })
  list(@Query() query: ForecastsQuery): Promise<ForecastDto[]> {
    return this.forecasts.list(query);
  }

  /** How a district's forecasts did lately. */
  @Get('skill')
  @Roles('administrator', 'analyst', 'officer')
  @ApiOkResponse({ type: ForecastSkillDto })
  skill(@Query() { districtId }: SkillQuery): Promise<ForecastSkillDto> {
    return this.forecasts.skill(districtId);
  }

  /** Enters a forecast. */
  @Post()
  @Roles('analyst')
  @ApiCreatedResponse({ type: ForecastDto })
  enter(@Body() input: ForecastInput, @CurrentUser() by: SignedIn): Promise<ForecastDto> {
    return this.forecasts.enter(input, by);
  }

  /** Enters a table of forecasts. */
  @Post('table')
  @HttpCode(200)
  @Roles('analyst')
  @ApiOkResponse({ type: ForecastTableResultDto })
  table(@Body() { text }: ForecastTableInput, @CurrentUser() by: SignedIn): Promise<ForecastTableResultDto> {
    return this.forecasts.enterTable(text, by);
  }
}

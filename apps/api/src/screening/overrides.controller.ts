import { Body, Controller, Delete, Get, Param, ParseIntPipe, Post, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { CurrentUser, Roles } from '../auth/decorators';
import type { SignedIn } from '../auth/signed-in';
import { OverrideDto, OverrideInput, OverridesQuery } from './dto/override.dto';
import { OverridesService } from './overrides.service';

/** Spans of readings that people set aside or set right. */
@ApiTags('readings')
@Controller('overrides')
export class OverridesController {
  constructor(private readonly overrides: OverridesService) {}

  /** Lists a tower's set spans, the newest first. */
  @Get()
  @Roles('administrator', 'analyst', 'officer')
  @ApiOkResponse({ type: [OverrideDto] })
  list(@Query() { towerId }: OverridesQuery): Promise<OverrideDto[]> {
    return this.overrides.list(towerId);
  }

  /** Sets a span of a sensor valid or failed, with the reason. */
  @Post()
  @Roles('analyst')
  @ApiCreatedResponse({ type: OverrideDto })
  set(@Body() input: OverrideInput, @CurrentUser() by: SignedIn): Promise<OverrideDto> {
    return this.overrides.set(input, by);
  }

  /** Undoes a set span; it stays on the record. */
  @Delete(':id')
  @Roles('analyst')
  @ApiOkResponse({ type: OverrideDto })
  undo(@Param('id', ParseIntPipe) id: number, @CurrentUser() by: SignedIn): Promise<OverrideDto> {
    return this.overrides.undo(id, by);
  }
}

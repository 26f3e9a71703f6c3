import { Body, Controller, Get, Param, ParseIntPipe, Put } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { CurrentUser, Roles } from '../auth/decorators';
import type { SignedIn } from '../auth/signed-in';
import { LimitsInput, SensorLimitsDto } from './dto/limits.dto';
import { LimitsService } from './limits.service';

/** The limits of the checks, sensor by sensor. */
@ApiTags('readings')
@Controller()
export class LimitsController {
  constructor(private readonly limits: LimitsService) {}

  /** Shows the limits of a tower's sensors beside the usual ones. */
  @Get('towers/:id/limits')
  @Roles('administrator', 'analyst', 'officer')
  @ApiOkResponse({ type: [SensorLimitsDto] })
  list(@Param('id', ParseIntPipe) id: number): Promise<SensorLimitsDto[]> {
    return this.limits.of(id);
  }

  /** Sets a sensor's limits, with the reason; its tower's record is screened anew. */
  @Put('sensors/:id/limits')
  @Roles('administrator', 'analyst')
  @ApiOkResponse({ type: SensorLimitsDto })
  set(
    @Param('id', ParseIntPipe) id: number,
    @Body() input: LimitsInput,
    @CurrentUser() by: SignedIn,
  ): Promise<SensorLimitsDto> {
    return this.limits.set(id, input, by);
  }
}

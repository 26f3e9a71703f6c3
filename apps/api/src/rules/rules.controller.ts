import { Body, Controller, Get, HttpCode, Param, ParseIntPipe, Post } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { CurrentUser, Roles } from '../auth/decorators';
import type { SignedIn } from '../auth/signed-in';
import { MeasureDto, showMeasures } from './dto/measure.dto';
import { RuleDto } from './dto/rule.dto';
import { RuleInput } from './dto/rule-input.dto';
import { RulesService } from './rules.service';

/** The districts' rules. */
@ApiTags('rules')
@Controller()
export class RulesController {
  constructor(private readonly rules: RulesService) {}

  /** Lists everything a rule may ask about. */
  @Get('rules/measures')
  @Roles('administrator', 'analyst', 'officer')
  @ApiOkResponse({ type: [MeasureDto] })
  measures(): MeasureDto[] {
    return showMeasures();
  }

  /** Lists the versions of a district's rule, newest first. */
  @Get('districts/:id/rules')
  @Roles('administrator', 'analyst', 'officer')
  @ApiOkResponse({ type: [RuleDto] })
  list(@Param('id', ParseIntPipe) districtId: number): Promise<RuleDto[]> {
    return this.rules.list(districtId);
  }

  /** Keeps a draft of a district's rule. */
  @Post('districts/:id/rules')
  @Roles('analyst')
  @ApiCreatedResponse({ type: RuleDto })
  draft(
    @Param('id', ParseIntPipe) districtId: number,
    @Body() input: RuleInput,
    @CurrentUser() by: SignedIn,
  ): Promise<RuleDto> {
    return this.rules.draft(districtId, input, by);
  }

  /** Puts a draft in force. */
  @Post('rules/:id/put-in-force')
  @Roles('analyst')
  @HttpCode(200)
  @ApiOkResponse({ type: RuleDto })
  putInForce(@Param('id', ParseIntPipe) id: number, @CurrentUser() by: SignedIn): Promise<RuleDto> {
    return this.rules.putInForce(id, by);
  }
}

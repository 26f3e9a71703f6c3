import { Body, Controller, Get, HttpCode, Param, ParseIntPipe, Patch, Post } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { CurrentUser, Roles } from '../auth/decorators';
import type { SignedIn } from '../auth/signed-in';
import { SourceDto } from './dto/source.dto';
import { SourceInput, SourcePatch } from './dto/source-input.dto';
import { SourcesService } from './sources.service';

/** Where towers' readings come from. Those over HTTP are the administrator's to keep. */
@ApiTags('towers')
@Controller()
export class SourcesController {
  constructor(private readonly sources: SourcesService) {}

  /** Lists a tower's sources with what their last collection gave. */
  @Get('towers/:id/sources')
  @Roles('administrator', 'analyst')
  @ApiOkResponse({ type: [SourceDto] })
  list(@Param('id', ParseIntPipe) id: number): Promise<SourceDto[]> {
    return this.sources.list(id);
  }

  /** Adds a source. */
  @Post('towers/:id/sources')
  @Roles('administrator', 'analyst')
  @ApiCreatedResponse({ type: SourceDto })
  add(
    @Param('id', ParseIntPipe) id: number,
    @Body() input: SourceInput,
    @CurrentUser() by: SignedIn,
  ): Promise<SourceDto> {
    return this.sources.add(id, input, by);
  }

  /** Changes a source; its files are read anew by the new settings. */
  @Patch('sources/:id')
  @Roles('administrator', 'analyst')
  @ApiOkResponse({ type: SourceDto })
  change(
    @Param('id', ParseIntPipe) id: number,
    @Body() patch: SourcePatch,
    @CurrentUser() by: SignedIn,
  ): Promise<SourceDto> {
    return this.sources.change(id, patch, by);
  }

  /** Retires a source. */
  @Post('sources/:id/retire')
  @HttpCode(200)
  @Roles('administrator', 'analyst')
  @ApiOkResponse({ type: SourceDto })
  retire(@Param('id', ParseIntPipe) id: number, @CurrentUser() by: SignedIn): Promise<SourceDto> {
    return this.sources.retire(id, by);
  }
}

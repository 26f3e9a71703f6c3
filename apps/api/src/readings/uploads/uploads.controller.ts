import type { Request } from 'express';
import {
  Body,
  Controller,
  Delete,
  Get,
  HttpCode,
  Param,
  ParseIntPipe,
  Post,
  Query,
  Req,
} from '@nestjs/common';
import {
  ApiAcceptedResponse,
  ApiBody,
  ApiConsumes,
  ApiCreatedResponse,
  ApiNoContentResponse,
  ApiOkResponse,
  ApiTags,
} from '@nestjs/swagger';
import { CurrentUser, Roles } from '../../auth/decorators';
import type { SignedIn } from '../../auth/signed-in';
import { PreviewDto, ProposalDto } from './dto/proposal.dto';
import { MappingBody, SheetQuery, UploadDto, UploadQuery, UploadsQuery } from './dto/upload.dto';
import { PreviewsService } from './previews.service';
import { ProposalsService } from './proposals.service';
import { UploadRuns } from './upload-runs.service';
import { UploadsService } from './uploads.service';

/** Files of readings that staff send. */
@ApiTags('readings')
@Roles('administrator', 'analyst')
@Controller('uploads')
export class UploadsController {
  constructor(
    private readonly uploads: UploadsService,
    private readonly proposals: ProposalsService,
    private readonly previews: PreviewsService,
    private readonly runs: UploadRuns,
  ) {}

  /** Keeps a file, sent as it is; nothing of it is taken yet. */
  @Post()
  @ApiConsumes('application/octet-stream')
  @ApiBody({ schema: { type: 'string', format: 'binary' } })
  @ApiCreatedResponse({ type: UploadDto })
  receive(
    @Query() query: UploadQuery,
    @Req() request: Request,
    @CurrentUser() by: SignedIn,
  ): Promise<UploadDto> {
    return this.uploads.receive(query, request, by);
  }

  /** Lists the newest uploads. */
  @Get()
  @ApiOkResponse({ type: [UploadDto] })
  list(@Query() query: UploadsQuery): Promise<UploadDto[]> {
    return this.uploads.list(query);
  }

  /** One upload and how far its import is. */
  @Get(':id')
  @ApiOkResponse({ type: UploadDto })
  get(@Param('id', ParseIntPipe) id: number): Promise<UploadDto> {
    return this.uploads.get(id);
  }

  /** How the file seems to be laid out. */
  @Get(':id/proposal')
  @ApiOkResponse({ type: ProposalDto })
  proposal(@Param('id', ParseIntPipe) id: number, @Query() { sheet }: SheetQuery): Promise<ProposalDto> {
    return this.proposals.propose(id, sheet);
  }

  /** What importing the file by a mapping would give. */
  @Post(':id/preview')
  @HttpCode(200)
  @ApiOkResponse({ type: PreviewDto })
  preview(@Param('id', ParseIntPipe) id: number, @Body() { mapping }: MappingBody): Promise<PreviewDto> {
    return this.previews.preview(id, mapping);
  }

  /** Begins to import the file in the background. */
  @Post(':id/commit')
  @HttpCode(202)
  @ApiAcceptedResponse({ type: UploadDto })
  commit(
    @Param('id', ParseIntPipe) id: number,
    @Body() { mapping }: MappingBody,
    @CurrentUser() by: SignedIn,
  ): Promise<UploadDto> {
    return this.runs.commit(id, mapping, by);
  }

  /** Stops an import under way; what was taken is kept. */
  @Post(':id/cancel')
  @HttpCode(200)
  @ApiOkResponse({ type: UploadDto })
  cancel(@Param('id', ParseIntPipe) id: number, @CurrentUser() by: SignedIn): Promise<UploadDto> {
    return this.runs.cancel(id, by);
  }

  /** Takes away a file that was not imported. */
  @Delete(':id')
  @HttpCode(204)
  @ApiNoContentResponse()
  remove(@Param('id', ParseIntPipe) id: number): Promise<void> {
    return this.uploads.remove(id);
  }
}

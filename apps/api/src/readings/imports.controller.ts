import {
  Body,
  Controller,
  Get,
  HttpCode,
  Param,
  ParseIntPipe,
  Post,
  Query,
  type StreamableFile,
} from '@nestjs/common';
import { ApiOkResponse, ApiProduces, ApiTags } from '@nestjs/swagger';
import { CurrentUser, Roles } from '../auth/decorators';
import type { SignedIn } from '../auth/signed-in';
import { PageQuery } from '../common/paging';
import { ImportDto, ImportPage, ImportsQuery, RefusedRowPage, WithdrawInput } from './dto/import.dto';
import { ImportsService } from './imports.service';
import { RefusedTable } from './refused-table';
import { WithdrawalsService } from './withdrawals.service';

/** What was imported and what was refused, for staff. */
@ApiTags('readings')
@Roles('administrator', 'analyst', 'officer')
@Controller('imports')
export class ImportsController {
  constructor(
    private readonly imports: ImportsService,
    private readonly table: RefusedTable,
    private readonly withdrawals: WithdrawalsService,
  ) {}

  /** Lists imports, the newest first. */
  @Get()
  @ApiOkResponse({ type: ImportPage })
  list(@Query() query: ImportsQuery): Promise<ImportPage> {
    return this.imports.list(query);
  }

  /** One import. */
  @Get(':id')
  @ApiOkResponse({ type: ImportDto })
  get(@Param('id', ParseIntPipe) id: number): Promise<ImportDto> {
    return this.imports.get(id);
  }

  /** Lists an import's refused rows with their reasons. */
  @Get(':id/refused')
  @ApiOkResponse({ type: RefusedRowPage })
  refused(@Param('id', ParseIntPipe) id: number, @Query() query: PageQuery): Promise<RefusedRowPage> {
    return this.imports.refused(id, query);
  }

  /** All refused rows of an import as a table. */
  @Get(':id/refused.csv')
  @ApiProduces('text/csv')
  @ApiOkResponse({ schema: { type: 'string' } })
  download(@Param('id', ParseIntPipe) id: number): Promise<StreamableFile> {
    return this.table.download(id);
  }

  /** Takes an import back as a whole. */
  @Post(':id/withdraw')
  @HttpCode(200)
  @Roles('administrator', 'analyst')
  @ApiOkResponse({ type: ImportDto })
  withdraw(
    @Param('id', ParseIntPipe) id: number,
    @Body() { reason }: WithdrawInput,
    @CurrentUser() by: SignedIn,
  ): Promise<ImportDto> {
    return this.withdrawals.withdraw(id, reason, by);
  }
}

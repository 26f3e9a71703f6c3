import { Controller, Get, Param, ParseIntPipe, Query } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Roles } from '../auth/decorators';
import { PageQuery } from '../common/paging';
import { ImportPage, ImportsQuery, RefusedRowPage } from './dto/import.dto';
import { ImportsService } from './imports.service';

/** What was imported and what was refused, for staff. */
@ApiTags('readings')
@Roles('administrator', 'analyst', 'officer')
@Controller('imports')
export class ImportsController {
  constructor(private readonly imports: ImportsService) {}

  /** Lists imports, the newest first. */
  @Get()
  @ApiOkResponse({ type: ImportPage })
  list(@Query() query: ImportsQuery): Promise<ImportPage> {
    return this.imports.list(query);
  }

  /** Lists an import's refused rows with their reasons. */
  @Get(':id/refused')
  @ApiOkResponse({ type: RefusedRowPage })
  refused(@Param('id', ParseIntPipe) id: number, @Query() query: PageQuery): Promise<RefusedRowPage> {
    return this.imports.refused(id, query);
  }
}

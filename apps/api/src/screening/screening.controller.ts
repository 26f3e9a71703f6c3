import { Controller, Get, Param, ParseIntPipe, Query } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Roles } from '../auth/decorators';
import { CalendarService } from './calendar.service';
import { TowerCalendarDto } from './dto/calendar.dto';
import { FlaggedSpanPage } from './dto/flags.dto';
import { RawReadingsDto } from './dto/raw.dto';
import { ReadingDetailDto, ReadingQuery } from './dto/reading-detail.dto';
import { CalendarQuery, FlagsQuery, RawQuery } from './dto/seen-query.dto';
import { FlagsService } from './flags.service';
import { RawService } from './raw.service';
import { ReadingDetailService } from './reading-detail.service';

/** What screening saw in a tower's readings, for staff. */
@ApiTags('readings')
@Roles('administrator', 'analyst', 'officer')
@Controller('towers/:id')
export class ScreeningController {
  constructor(
    private readonly calendars: CalendarService,
    private readonly flags: FlagsService,
    private readonly raw: RawService,
    private readonly details: ReadingDetailService,
  ) {}

  /** Says how complete the readings of each day are, sensor by sensor; at most 400 days. */
  @Get('calendar')
  @ApiOkResponse({ type: TowerCalendarDto })
  calendar(@Param('id', ParseIntPipe) id: number, @Query() query: CalendarQuery): Promise<TowerCalendarDto> {
    return this.calendars.of(id, query);
  }

  /** Lists flagged spans, the newest first; at most 400 days. */
  @Get('flags')
  @ApiOkResponse({ type: FlaggedSpanPage })
  flagged(@Param('id', ParseIntPipe) id: number, @Query() query: FlagsQuery): Promise<FlaggedSpanPage> {
    return this.flags.of(id, query);
  }

  /** Shows readings as they came with their quality, at most 2,000 a sensor and 62 days. */
  @Get('raw')
  @ApiOkResponse({ type: RawReadingsDto })
  readings(@Param('id', ParseIntPipe) id: number, @Query() query: RawQuery): Promise<RawReadingsDto> {
    return this.raw.of(id, query);
  }

  /** Shows one reading with the file and row it came from, what was said of it and what it was before. */
  @Get('reading')
  @ApiOkResponse({ type: ReadingDetailDto })
  reading(@Param('id', ParseIntPipe) id: number, @Query() query: ReadingQuery): Promise<ReadingDetailDto> {
    return this.details.of(id, query);
  }
}

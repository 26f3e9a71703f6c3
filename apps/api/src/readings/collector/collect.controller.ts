import { Controller, HttpCode, Param, ParseIntPipe, Post } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Roles } from '../../auth/decorators';
import { SourceDto } from '../../towers/dto/source.dto';
import { ReadingsCollector } from './readings-collector';

/** Collecting a source before its turn. */
@ApiTags('towers')
@Controller('sources')
export class CollectController {
  constructor(private readonly collector: ReadingsCollector) {}

  /** Collects a source now; asked for while it is being collected, waits for that. */
  @Post(':id/collect')
  @HttpCode(200)
  @Roles('administrator', 'analyst')
  @ApiOkResponse({ type: SourceDto })
  collect(@Param('id', ParseIntPipe) id: number): Promise<SourceDto> {
    return this.collector.collectNow(id);
  }
}

import { Controller, Get, Param, ParseIntPipe, Query } from '@nestjs/common';
import { ApiOkResponse, ApiProperty, ApiTags } from '@nestjs/swagger';
import { Roles } from '../auth/decorators';
import { PipelineService } from './pipeline.service';
import { ProfileDto, ProfileSpan } from './dto/profile.dto';
import { ProfilesQuery } from './dto/profiles-query.dto';
import { ProfilesService } from './profiles.service';

/** How much of a tower's readings waits to be worked out. */
export class PipelineState {
  @ApiProperty({ description: 'Blocks that ended and wait; 0 when everything is worked out' })
  pending!: number;
}

const second = (iso: string | undefined): number | undefined =>
  iso === undefined ? undefined : Math.floor(Date.parse(iso) / 1000);

/** Profiles of a tower, for staff. */
@ApiTags('profiles')
@Roles('administrator', 'analyst', 'officer')
@Controller('towers/:id')
export class ProfilesController {
  constructor(
    private readonly profiles: ProfilesService,
    private readonly pipeline: PipelineService,
  ) {}

  /** Shows the newest profile. */
  @Get('profile')
  @ApiOkResponse({ type: ProfileDto })
  latest(@Param('id', ParseIntPipe) id: number): Promise<ProfileDto> {
    return this.profiles.latest(id);
  }

  /** Lists profiles in order of time. */
  @Get('profiles')
  @ApiOkResponse({ type: ProfileSpan })
  range(
    @Param('id', ParseIntPipe) id: number,
    @Query() { from, to, limit }: ProfilesQuery,
  ): Promise<ProfileSpan> {
    return this.profiles.range(id, second(from), second(to), limit);
  }

  /** Says how much waits to be worked out. */
  @Get('pipeline')
  @ApiOkResponse({ type: PipelineState })
  state(@Param('id', ParseIntPipe) id: number): Promise<PipelineState> {
    return this.pipeline.state(id);
  }
}

import {
  Body,
  Controller,
  Delete,
  Get,
  HttpCode,
  Param,
  ParseIntPipe,
  Patch,
  Post,
  Put,
  Query,
} from '@nestjs/common';
import { ApiCreatedResponse, ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { CurrentUser, Roles } from '../auth/decorators';
import type { SignedIn } from '../auth/signed-in';
import { PageQuery } from '../common/paging';
import { TowerChangePage, VersionDateInput } from './dto/tower-change.dto';
import { SensorInput, SensorPatch } from './dto/sensor-input.dto';
import { SensorDto, TowerDto } from './dto/tower.dto';
import { NeighboursDto } from './dto/neighbours.dto';
import { TowerInput, TowerPatch } from './dto/tower-input.dto';
import { NeighboursService } from './neighbours.service';
import { RemovalService } from './removal.service';
import { SensorVersionsService } from './sensor-versions.service';
import { SensorsService } from './sensors.service';
import { TowerChangesService } from './tower-changes.service';
import { TowersService } from './towers.service';

/** Towers and their sensors, for staff. */
@ApiTags('towers')
@Controller()
export class TowersController {
  constructor(
    private readonly towers: TowersService,
    private readonly sensors: SensorsService,
    private readonly versions: SensorVersionsService,
    private readonly removal: RemovalService,
    private readonly near: NeighboursService,
    private readonly record: TowerChangesService,
  ) {}

  /** Lists every tower with its sensors. */
  @Get('towers')
  @Roles('administrator', 'analyst', 'officer')
  @ApiOkResponse({ type: [TowerDto] })
  list(): Promise<TowerDto[]> {
    return this.towers.list();
  }

  /** Shows one tower. */
  @Get('towers/:id')
  @Roles('administrator', 'analyst', 'officer')
  @ApiOkResponse({ type: TowerDto })
  get(@Param('id', ParseIntPipe) id: number): Promise<TowerDto> {
    return this.towers.get(id);
  }

  /** Makes a tower. */
  @Post('towers')
  @Roles('administrator', 'analyst')
  @ApiCreatedResponse({ type: TowerDto })
  create(@Body() input: TowerInput, @CurrentUser() by: SignedIn): Promise<TowerDto> {
    return this.towers.create(input, by);
  }

  /** Changes a tower. */
  @Patch('towers/:id')
  @Roles('administrator', 'analyst')
  @ApiOkResponse({ type: TowerDto })
  change(
    @Param('id', ParseIntPipe) id: number,
    @Body() patch: TowerPatch,
    @CurrentUser() by: SignedIn,
  ): Promise<TowerDto> {
    return this.towers.change(id, patch, by);
  }

  /** Adds a sensor to a tower. */
  @Post('towers/:id/sensors')
  @Roles('administrator', 'analyst')
  @ApiCreatedResponse({ type: SensorDto })
  addSensor(
    @Param('id', ParseIntPipe) id: number,
    @Body() input: SensorInput,
    @CurrentUser() by: SignedIn,
  ): Promise<SensorDto> {
    return this.sensors.add(id, input, by);
  }

  /** Changes a sensor from an instant on. */
  @Patch('sensors/:id')
  @Roles('administrator', 'analyst')
  @ApiOkResponse({ type: SensorDto })
  changeSensor(
    @Param('id', ParseIntPipe) id: number,
    @Body() patch: SensorPatch,
    @CurrentUser() by: SignedIn,
  ): Promise<SensorDto> {
    return this.sensors.change(id, patch, by);
  }

  /** Takes a version of a sensor back: what held before it holds on. `from` is its instant, or "beginning". */
  @Delete('sensors/:id/versions/:from')
  @Roles('administrator', 'analyst')
  @ApiOkResponse({ type: SensorDto })
  removeVersion(
    @Param('id', ParseIntPipe) id: number,
    @Param('from') from: string,
    @CurrentUser() by: SignedIn,
  ): Promise<SensorDto> {
    return this.versions.remove(id, from, by);
  }

  /** Corrects from when a version of a sensor holds. */
  @Patch('sensors/:id/versions/:from')
  @Roles('administrator', 'analyst')
  @ApiOkResponse({ type: SensorDto })
  moveVersion(
    @Param('id', ParseIntPipe) id: number,
    @Param('from') from: string,
    @Body() input: VersionDateInput,
    @CurrentUser() by: SignedIn,
  ): Promise<SensorDto> {
    return this.versions.move(id, from, input.from, by);
  }

  /** Takes a sensor away that has no readings. */
  @Delete('sensors/:id')
  @HttpCode(204)
  @Roles('administrator', 'analyst')
  @ApiNoContentResponse()
  removeSensor(@Param('id', ParseIntPipe) id: number, @CurrentUser() by: SignedIn): Promise<void> {
    return this.removal.sensor(id, by);
  }

  /** Takes a tower away that has no readings and that no district asks. */
  @Delete('towers/:id')
  @HttpCode(204)
  @Roles('administrator', 'analyst')
  @ApiNoContentResponse()
  removeTower(@Param('id', ParseIntPipe) id: number, @CurrentUser() by: SignedIn): Promise<void> {
    return this.removal.tower(id, by);
  }

  /** Says whose readings are looked at when a tower's are screened. */
  @Get('towers/:id/neighbours')
  @Roles('administrator', 'analyst', 'officer')
  @ApiOkResponse({ type: NeighboursDto })
  neighbours(@Param('id', ParseIntPipe) id: number): Promise<NeighboursDto> {
    return this.near.of(id);
  }

  /** Sets whose readings are looked at when a tower's are screened; its record is screened anew. */
  @Put('towers/:id/neighbours')
  @Roles('administrator', 'analyst')
  @ApiOkResponse({ type: NeighboursDto })
  setNeighbours(
    @Param('id', ParseIntPipe) id: number,
    @Body() input: NeighboursDto,
    @CurrentUser() by: SignedIn,
  ): Promise<NeighboursDto> {
    return this.near.set(id, input, by);
  }

  /** Lists what was ever changed about a tower, the newest first. */
  @Get('towers/:id/changes')
  @Roles('administrator', 'analyst', 'officer')
  @ApiOkResponse({ type: TowerChangePage })
  changes(@Param('id', ParseIntPipe) id: number, @Query() query: PageQuery): Promise<TowerChangePage> {
    return this.record.list(id, query);
  }
}

import { Body, Controller, Get, Param, ParseIntPipe, Patch, Post } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { CurrentUser, Roles } from '../auth/decorators';
import type { SignedIn } from '../auth/signed-in';
import { SensorInput, SensorPatch } from './dto/sensor-input.dto';
import { SensorDto, TowerDto } from './dto/tower.dto';
import { TowerInput, TowerPatch } from './dto/tower-input.dto';
import { SensorsService } from './sensors.service';
import { TowersService } from './towers.service';

/** Towers and their sensors, for staff. */
@ApiTags('towers')
@Controller()
export class TowersController {
  constructor(
    private readonly towers: TowersService,
    private readonly sensors: SensorsService,
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
}

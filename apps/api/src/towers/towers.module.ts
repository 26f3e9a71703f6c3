import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { KeysController } from './keys.controller';
import { KeysService } from './keys.service';
import { IngestKey } from './models/ingest-key.model';
import { SensorVersion } from './models/sensor-version.model';
import { Sensor } from './models/sensor.model';
import { Source } from './models/source.model';
import { Tower } from './models/tower.model';
import { NeighboursService } from './neighbours.service';
import { RemovalService } from './removal.service';
import { SensorVersionsService } from './sensor-versions.service';
import { SensorsService } from './sensors.service';
import { SourcePositions } from './source-positions';
import { SourceTurns } from './source-turns';
import { SourcesController } from './sources.controller';
import { SourcesService } from './sources.service';
import { TowerChangesService } from './tower-changes.service';
import { TowerLayouts } from './tower-layouts';
import { TowersController } from './towers.controller';
import { TowersService } from './towers.service';

/** Towers, their sensors, sources and keys. */
@Module({
  imports: [SequelizeModule.forFeature([Tower, Sensor, SensorVersion, IngestKey, Source])],
  controllers: [TowersController, KeysController, SourcesController],
  providers: [
    TowersService,
    SensorsService,
    SensorVersionsService,
    RemovalService,
    NeighboursService,
    TowerChangesService,
    KeysService,
    SourcesService,
    SourcePositions,
    SourceTurns,
    TowerLayouts,
  ],
  exports: [
    TowersService,
    SensorsService,
    KeysService,
    SourcesService,
    SourcePositions,
    SourceTurns,
    TowerLayouts,
  ],
})
export class TowersModule {}

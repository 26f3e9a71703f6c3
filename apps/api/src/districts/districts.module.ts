import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { TowersModule } from '../towers/towers.module';
import { DistrictsController } from './districts.controller';
import { DistrictsService } from './districts.service';
import { DistrictTower } from './models/district-tower.model';
import { District } from './models/district.model';

/** Districts and which towers speak for them. */
@Module({
  imports: [SequelizeModule.forFeature([District, DistrictTower]), TowersModule],
  controllers: [DistrictsController],
  providers: [DistrictsService],
  exports: [DistrictsService],
})
export class DistrictsModule {}

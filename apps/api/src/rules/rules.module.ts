import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { DistrictsModule } from '../districts/districts.module';
import { ForecastsModule } from '../forecasts/forecasts.module';
import { TowersModule } from '../towers/towers.module';
import { EvidenceService } from './evaluation/evidence.service';
import { LiveEvaluation } from './evaluation/live-evaluation';
import { DistrictBatches } from './findings/district-batches';
import { DistrictFindingsService } from './findings/district-findings.service';
import { DistrictHistoryService } from './findings/district-history.service';
import { DistrictPlans } from './findings/district-plan';
import { DistrictRows } from './findings/district-rows';
import { DistrictStage } from './findings/district.stage';
import { TowerBlockRows } from './findings/tower-blocks';
import { Rule } from './models/rule.model';
import { RulesController } from './rules.controller';
import { RulesService } from './rules.service';

/** District findings, the versions of each district's rule, and what the rule in force says of the newest block. */
@Module({
  imports: [SequelizeModule.forFeature([Rule]), DistrictsModule, ForecastsModule, TowersModule],
  controllers: [RulesController],
  providers: [
    ...[RulesService, LiveEvaluation, EvidenceService],
    ...[DistrictPlans, TowerBlockRows, DistrictRows, DistrictBatches, DistrictStage, DistrictFindingsService],
    DistrictHistoryService,
  ],
  exports: [RulesService, LiveEvaluation, EvidenceService, DistrictFindingsService, DistrictHistoryService],
})
export class RulesModule {}

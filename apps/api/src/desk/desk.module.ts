import { Module } from '@nestjs/common';
import { DistrictsModule } from '../districts/districts.module';
import { NoticesModule } from '../notices/notices.module';
import { ProfilesModule } from '../profiles/profiles.module';
import { ProposalsModule } from '../proposals/proposals.module';
import { RulesModule } from '../rules/rules.module';
import { DeskController } from './desk.controller';
import { DeskService } from './desk.service';
import { HistoryService } from './history.service';
import { TowerNews } from './tower-news';

/** The read side for staff: the desk and each district's history. */
@Module({
  imports: [DistrictsModule, NoticesModule, ProfilesModule, ProposalsModule, RulesModule],
  controllers: [DeskController],
  providers: [DeskService, HistoryService, TowerNews],
})
export class DeskModule {}

import { Module } from '@nestjs/common';
import { DistrictsModule } from '../districts/districts.module';
import { NoticesModule } from '../notices/notices.module';
import { OfficeModule } from '../office/office.module';
import { ProfilesModule } from '../profiles/profiles.module';
import { RulesModule } from '../rules/rules.module';
import { PublicPages } from './public-pages';
import { PublicStatusController } from './public-status.controller';
import { PublicStatusService } from './public-status.service';

/** What holds right now, for everybody: as JSON and as pages. */
@Module({
  imports: [DistrictsModule, NoticesModule, OfficeModule, ProfilesModule, RulesModule],
  controllers: [PublicStatusController],
  providers: [PublicPages, PublicStatusService],
  exports: [PublicPages],
})
export class PublicStatusModule {}

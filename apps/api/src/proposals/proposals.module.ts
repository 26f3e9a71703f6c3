import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { NoticesModule } from '../notices/notices.module';
import { ProfilesModule } from '../profiles/profiles.module';
import { RulesModule } from '../rules/rules.module';
import { Proposal } from './models/proposal.model';
import { ProposalCards } from './proposal-cards';
import { ProposalDecisions } from './proposal-decisions';
import { ProposalIssuing } from './proposal-issuing';
import { ProposalKeeper } from './proposal-keeper';
import { ProposalNews } from './proposal-news';
import { ProposalRecord } from './proposal-record';
import { ProposalsController } from './proposals.controller';
import { ProposalsService } from './proposals.service';

/** Proposals: opened and lapsed by the rule in force, decided by people. */
@Module({
  imports: [SequelizeModule.forFeature([Proposal]), NoticesModule, ProfilesModule, RulesModule],
  controllers: [ProposalsController],
  providers: [
    ...[ProposalKeeper, ProposalNews, ProposalRecord, ProposalCards],
    ...[ProposalDecisions, ProposalIssuing, ProposalsService],
  ],
  exports: [ProposalsService],
})
export class ProposalsModule {}

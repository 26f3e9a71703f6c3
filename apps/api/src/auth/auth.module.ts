import { Module, type OnModuleInit } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import { SequelizeModule } from '@nestjs/sequelize';
import { JobsService } from '../scheduler/jobs.service';
import { UsersModule } from '../users/users.module';
import { AccessGuard } from './access.guard';
import { FirstAdministratorLink } from './accounts/first-administrator';
import { InvitationsService } from './accounts/invitations.service';
import { LinksService } from './accounts/links.service';
import { UsersController } from './accounts/users.controller';
import { AuthController } from './auth.controller';
import { AuthService } from './auth.service';
import { LocalStrategy } from './local.strategy';
import { LinkTokens } from './links/link-tokens';
import { ActivityController } from './record/activity.controller';
import { SessionRow } from './models/session.model';
import { Attempts } from './passwords/attempts';
import { PasswordHasher } from './passwords/password-hasher';
import { SessionService } from './sessions/session.service';
import { SignedInPeople } from './sessions/signed-in-people';
import { StaleSessions } from './sessions/stale-sessions';

/** Who is signed in and what they may do; every route is refused unless it is opened. */
@Module({
  imports: [UsersModule, SequelizeModule.forFeature([SessionRow])],
  controllers: [ActivityController, AuthController, UsersController],
  providers: [
    { provide: APP_GUARD, useClass: AccessGuard },
    Attempts,
    AuthService,
    LocalStrategy,
    FirstAdministratorLink,
    InvitationsService,
    LinksService,
    LinkTokens,
    PasswordHasher,
    SessionService,
    SignedInPeople,
    StaleSessions,
  ],
  exports: [AuthService, InvitationsService, LinksService, SessionService],
})
export class AuthModule implements OnModuleInit {
  constructor(
    private readonly jobs: JobsService,
    private readonly stale: StaleSessions,
  ) {}

  onModuleInit(): void {
    this.jobs.register('clear old sessions', 3600, () => this.stale.clear());
  }
}

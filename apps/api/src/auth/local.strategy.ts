import { Injectable } from '@nestjs/common';
import { PassportStrategy } from '@nestjs/passport';
import type { Request } from 'express';
import { Strategy } from 'passport-local';
import { AuthService } from './auth.service';
import { SessionService } from './sessions/session.service';
import type { SignedIn } from './signed-in';

/** Signing in with e-mail and password. */
@Injectable()
export class LocalStrategy extends PassportStrategy(Strategy) {
  constructor(
    private readonly auth: AuthService,
    sessions: SessionService,
  ) {
    super({ usernameField: 'email', passReqToCallback: true, session: false });
    sessions.use(this);
  }

  /** Who the request's e-mail and password belong to; false when they do not belong together. */
  async validate(request: Request, email: string, password: string): Promise<SignedIn | false> {
    return (await this.auth.check({ email, password }, request.ip ?? '')) ?? false;
  }

  /** Each application has a passport of its own (see `SessionService`), so the process's shared one stays empty. */
  getPassportInstance(): { use: () => void } {
    return { use: () => undefined };
  }
}

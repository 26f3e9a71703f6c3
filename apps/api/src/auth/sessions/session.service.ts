import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import type { NextFunction, Request, RequestHandler, Response } from 'express';
import session from 'express-session';
import { Authenticator, type Strategy } from 'passport';
import type { Sequelize } from 'sequelize';
import { Clock } from '../../common/clock';
import { Settings } from '../../config/settings';
import type { SignedIn } from '../signed-in';
import { refuseCrossSite } from './same-site';
import type { SessionOwner } from './session-data';
import { sessionStore } from './session-store';
import { SignedInPeople } from './signed-in-people';

const touchAfterS = 60;
/** Addresses that know no session: residents', the loggers' and the providers'. */
const withoutSession = /^\/(public|ingest|hooks)(\/|$)/;

/** Sessions: the steps before the routes, signing in and out. */
@Injectable()
export class SessionService {
  private readonly passport = new Authenticator();

  constructor(
    @InjectConnection() private readonly sequelize: Sequelize,
    private readonly settings: Settings,
    private readonly people: SignedInPeople,
    private readonly clock: Clock,
  ) {
    this.passport.serializeUser<SessionOwner>((user, done) =>
      this.people.owner(user.id).then((o) => done(null, o), done),
    );
    this.passport.deserializeUser<SessionOwner>((owner, done) =>
      this.people.find(owner).then((user) => done(null, user ?? false), done),
    );
  }

  /** Takes the way people show who they are into use. */
  use(strategy: Strategy): void {
    this.passport.use(strategy);
  }

  /** Who the request's e-mail and password belong to; undefined when they do not belong together. */
  authenticate(request: Request, response: Response): Promise<SignedIn | undefined> {
    return new Promise((resolve, reject) => {
      const answer = (error: unknown, user: SignedIn | false): void =>
        error ? reject(asError(error)) : resolve(user || undefined);
      const step = this.passport.authenticate('local', answer) as RequestHandler;
      void step(request, response, reject);
    });
  }

  /** The steps for addresses under /api, in order: session, time-outs, person, same-site check. */
  middleware(): RequestHandler[] {
    const overTls = this.settings.publicUrl.startsWith('https:');
    const cookieSession = session({
      name: 'lidwatch',
      secret: this.settings.secret,
      store: sessionStore(this.sequelize, this.settings),
      resave: false,
      saveUninitialized: false,
      proxy: overTls ? true : undefined,
      cookie: { httpOnly: true, sameSite: 'lax', secure: overTls, path: '/' },
    });
    const steps: RequestHandler[] = [
      cookieSession,
      (request, _, next) => this.endWhenOver(request, next),
      this.passport.session(),
      (request, _, next) => this.checkSite(request, next),
    ];
    return steps.map((step) => skipping(withoutSession, step));
  }

  /** Begins a session for somebody under a new id. */
  async begin(request: Request, user: SignedIn): Promise<void> {
    await new Promise<void>((resolve, reject) =>
      request.logIn(user, (error: unknown) => (error ? reject(asError(error)) : resolve())),
    );
    const now = this.clock.now();
    Object.assign(request.session, { signedInAt: now, seenAt: now });
    await saved(request);
  }

  /** Ends the session of a request; its id opens nothing any more. */
  async end(request: Request, response: Response): Promise<void> {
    await destroyed(request);
    response.clearCookie('lidwatch', { path: '/' });
  }

  private endWhenOver(request: Request, next: NextFunction): void {
    const { passport, signedInAt = 0, seenAt = 0 } = request.session;
    if (!passport?.user) return next();
    const now = this.clock.now();
    const idle = now - seenAt >= this.settings.sessionIdleMinutes * 60;
    if (idle || now - signedInAt >= this.settings.sessionMaxHours * 3600)
      return void request.session.regenerate(next);
    if (now - seenAt >= touchAfterS) request.session.seenAt = now;
    next();
  }

  private checkSite(request: Request, next: NextFunction): void {
    try {
      refuseCrossSite(request, this.settings.publicUrl);
      next();
    } catch (error) {
      next(error);
    }
  }
}

/** A step under /api that leaves some of its addresses alone. */
function skipping(paths: RegExp, step: RequestHandler): RequestHandler {
  return (request, response, next) => {
    const below = request.path.startsWith('/api/') ? request.path.slice('/api'.length) : undefined;
    if (below === undefined || paths.test(below)) next();
    else void step(request, response, next);
  };
}

function saved(request: Request): Promise<void> {
  return new Promise((resolve, reject) =>
    request.session.save((error: unknown) => (error ? reject(asError(error)) : resolve())),
  );
}

function destroyed(request: Request): Promise<void> {
  return new Promise((resolve, reject) =>
    request.session.destroy((error: unknown) => (error ? reject(asError(error)) : resolve())),
  );
}

function asError(error: unknown): Error {
  return error instanceof Error ? error : new Error(String(error));
}

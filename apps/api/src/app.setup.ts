import type { NestExpressApplication } from '@nestjs/platform-express';
import compression from 'compression';
import { SessionService } from './auth/sessions/session.service';
import { ProblemFilter } from './common/problem.filter';
import { validationPipe } from './common/validation';
import { Settings } from './config/settings';
import { serveApiDescription } from './http/api-description';
import { limitBodies } from './http/body-limits';
import { securityHeaders } from './http/security-headers';
import { PublicPages } from './public-status/public-pages';

/** Everything between the socket and the routes, the same for the service and its tests. Call it before `init`. */
export function configureApp(app: NestExpressApplication): void {
  const settings = app.get(Settings);
  app.disable('x-powered-by');
  app.set('trust proxy', settings.trustedProxies);
  app.setGlobalPrefix('api', { exclude: ['health/{*path}', 'feeds/{*path}'] });
  app.use(securityHeaders(settings.publicUrl));
  app.use(compression());
  app.use(app.get(PublicPages).handle);
  limitBodies(app);
  for (const step of app.get(SessionService).middleware()) app.use(step);
  app.useGlobalPipes(validationPipe());
  app.useGlobalFilters(new ProblemFilter());
  serveApiDescription(app);
}

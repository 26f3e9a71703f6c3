import type { NestExpressApplication } from '@nestjs/platform-express';
import { json, raw, urlencoded } from 'express';

const readingsLimit = '10mb';
const formLimit = '64kb';
const jsonLimit = '512kb';

/**
 * How much each address reads: readings come in large bodies of any type and are read as bytes (the limit holds for
 * what a compressed body inflates to); providers' call-backs and one-click leaving come as forms; everything else is
 * small JSON.
 */
export function limitBodies(app: NestExpressApplication): void {
  app.use('/api/ingest', raw({ type: () => true, limit: readingsLimit }));
  app.use(['/api/hooks', '/api/public'], urlencoded({ extended: false, limit: formLimit }));
  app.use('/api', json({ limit: jsonLimit }));
}

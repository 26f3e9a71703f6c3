import type { NestExpressApplication } from '@nestjs/platform-express';
import { json, urlencoded } from 'express';

const formLimit = '64kb';
const jsonLimit = '512kb';

/**
 * How much each address reads: providers' call-backs and one-click leaving come as forms, everything else is small JSON.
 * What sites push is left alone here; it is read once its key was found right. So are files that staff upload, whatever
 * kind they are sent as.
 */
export function limitBodies(app: NestExpressApplication): void {
  app.use(['/api/hooks', '/api/public'], urlencoded({ extended: false, limit: formLimit }));
  app.use(/^\/api(?!\/ingest\/|\/uploads\/?$)(?=\/|$)/i, json({ limit: jsonLimit }));
}

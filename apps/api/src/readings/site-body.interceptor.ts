import { Injectable, type CallHandler, type ExecutionContext, type NestInterceptor } from '@nestjs/common';
import { raw, type Request, type Response } from 'express';
import type { Observable } from 'rxjs';
import { Problem } from '../common/problem';
import type { Site } from '../towers/keys.service';
import { PushLimits } from './push-limits';

const MOST_MB = 10;
const readRaw = raw({ type: () => true, limit: `${MOST_MB}mb` });

/**
 * Reads what a site sent as bytes, unpacked, after its key was found right: whoever has none sends nothing into the
 * service's memory. The limit holds for the unpacked bytes, and unpacking stops there.
 */
@Injectable()
export class SiteBody implements NestInterceptor {
  constructor(private readonly limits: PushLimits) {}

  async intercept(context: ExecutionContext, next: CallHandler): Promise<Observable<unknown>> {
    const http = context.switchToHttp();
    const request = http.getRequest<Request & { site: Site }>();
    await read(request, http.getResponse<Response>());
    this.limits.count(request.site.keyId, Buffer.isBuffer(request.body) ? request.body.length : 0);
    return next.handle();
  }
}

const read = (request: Request, response: Response): Promise<void> =>
  new Promise((resolve, reject) => {
    readRaw(request, response, (error?: unknown) => {
      if (error === undefined) resolve();
      else reject(inPlainWords(error, request.headers['content-encoding'] ?? 'identity'));
    });
  });

/** What went wrong with a body, with the cure. */
function inPlainWords(error: unknown, encoding: string): unknown {
  const { type, code } = error as { type?: unknown; code?: unknown };
  if (type === 'entity.too.large') {
    const packed = encoding === 'identity' ? '' : ', unpacked';
    return new Problem(
      'too-large',
      `The body has more than ${MOST_MB} MB${packed}. Send it in smaller parts, such as a week each.`,
    );
  }
  if (type === 'encoding.unsupported')
    return new Problem('type-not-served', 'Send the body as it is, or packed with "Content-Encoding: gzip".');
  if (typeof code === 'string' && code.startsWith('Z_'))
    return new Problem(
      'bad-request',
      'The packed body is damaged or cut off. Pack it again, and send it again.',
    );
  return error;
}

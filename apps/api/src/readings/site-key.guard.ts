import { createParamDecorator, Injectable, type CanActivate, type ExecutionContext } from '@nestjs/common';
import type { Request, Response } from 'express';
import { Problem } from '../common/problem';
import { KeysService, type Site } from '../towers/keys.service';
import { PushLimits } from './push-limits';

type SiteRequest = Request & { site?: Site };

/**
 * Lets a request in by its site's bearer key, as long as the key has not sent too much; the key says which tower the
 * request is for. The body is read after it.
 */
@Injectable()
export class SiteKeyGuard implements CanActivate {
  constructor(
    private readonly keys: KeysService,
    private readonly limits: PushLimits,
  ) {}

  async canActivate(context: ExecutionContext): Promise<boolean> {
    const http = context.switchToHttp();
    const [request, response] = [http.getRequest<SiteRequest>(), http.getResponse<Response>()];
    request.site = await this.siteOf(request, response);
    this.limits.admit(request.site.keyId, response);
    return true;
  }

  private async siteOf(request: SiteRequest, response: Response): Promise<Site> {
    const key = /^Bearer\s+(\S+)$/i.exec(request.headers.authorization ?? '')?.[1];
    const site = key === undefined ? undefined : await this.keys.siteOf(key);
    if (site) return site;
    this.limits.countWrong(request.ip ?? '');
    response.setHeader('WWW-Authenticate', 'Bearer realm="readings"');
    if (key === undefined)
      throw new Problem('key-not-valid', 'Send the key of your site: "Authorization: Bearer <key>".');
    throw new Problem('key-not-valid', 'The key is unknown or revoked. Ask your administrator for one.');
  }
}

/** The site that sent the request; only behind `SiteKeyGuard`. */
export const SentBy = createParamDecorator(
  (_: unknown, context: ExecutionContext) => context.switchToHttp().getRequest<SiteRequest>().site,
);

import { createParamDecorator, Injectable, type CanActivate, type ExecutionContext } from '@nestjs/common';
import type { Request } from 'express';
import { Problem } from '../common/problem';
import { KeysService } from '../towers/keys.service';

type SiteRequest = Request & { siteTowerId?: number };

/** Lets a request in by its site's bearer key; the key says which tower the request is for. */
@Injectable()
export class SiteKeyGuard implements CanActivate {
  constructor(private readonly keys: KeysService) {}

  async canActivate(context: ExecutionContext): Promise<boolean> {
    const request = context.switchToHttp().getRequest<SiteRequest>();
    const key = /^Bearer\s+(\S+)$/i.exec(request.headers.authorization ?? '')?.[1];
    if (!key) throw new Problem('key-not-valid', 'Send the key of your site: "Authorization: Bearer <key>".');
    request.siteTowerId = await this.keys.towerOf(key);
    return true;
  }
}

/** The tower whose site sent the request; only behind `SiteKeyGuard`. */
export const SiteTower = createParamDecorator(
  (_: unknown, context: ExecutionContext) => context.switchToHttp().getRequest<SiteRequest>().siteTowerId,
);

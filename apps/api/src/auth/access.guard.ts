import { Injectable, type CanActivate, type ExecutionContext } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import type { Role } from '@lidwatch/contracts';
import type { Request } from 'express';
import { Problem } from '../common/problem';
import { publicKey, rolesKey } from './decorators';
import type { SignedIn } from './signed-in';

/** Refuses every route by default: 401 without a session, 403 with one whose role is not named by `@Roles()`. */
@Injectable()
export class AccessGuard implements CanActivate {
  constructor(private readonly reflector: Reflector) {}

  canActivate(context: ExecutionContext): boolean {
    const targets = [context.getHandler(), context.getClass()];
    if (this.reflector.getAllAndOverride<boolean>(publicKey, targets)) return true;
    const { user } = context.switchToHttp().getRequest<Request & { user?: SignedIn }>();
    if (!user) throw new Problem('sign-in-needed', 'Sign in to go on.');
    const roles = this.reflector.getAllAndOverride<Role[]>(rolesKey, targets) ?? [];
    if (roles.includes(user.role)) return true;
    throw new Problem('not-allowed', `The role ${user.role} may not do this.`);
  }
}

import { SetMetadata, applyDecorators, createParamDecorator, type ExecutionContext } from '@nestjs/common';
import { ApiCookieAuth } from '@nestjs/swagger';
import type { Role } from '@lidwatch/contracts';
import type { Request } from 'express';
import type { SignedIn } from './signed-in';

/** Where a route's `@Public()` is kept. */
export const publicKey = 'lidwatch:public';
/** Where a route's `@Roles()` is kept. */
export const rolesKey = 'lidwatch:roles';

/** Opens a route (or every route of a controller) to everybody, signed in or not. */
export const Public = () => SetMetadata(publicKey, true);

/** Opens a route (or every route of a controller) to people of these roles. A route without either is refused. */
export const Roles = (...roles: Role[]) => applyDecorators(SetMetadata(rolesKey, roles), ApiCookieAuth());

/** The signed-in person of the request; only on routes with `@Roles()`. */
export const CurrentUser = createParamDecorator(
  (_: unknown, context: ExecutionContext) =>
    context.switchToHttp().getRequest<Request & { user?: SignedIn }>().user,
);

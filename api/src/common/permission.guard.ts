import { type CanActivate, type ExecutionContext, Injectable } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { permissionsOf } from '@brimgate/rules';
import type { Request } from 'express';
import { ACCESS, type Access } from './allow.decorator';
import type { CurrentUser } from './current-user';
import { DomainError } from './domain-error';

export class RoleRefused extends DomainError {
  constructor() {
    super({ status: 403, code: 'role-refused', title: 'Your role at this firm does not include this' });
  }
}

/** Lets a person do what the role's permissions name; a route that names none is refused to everybody. */
@Injectable()
export class PermissionGuard implements CanActivate {
  constructor(private readonly reflector: Reflector) {}

  canActivate(context: ExecutionContext): boolean {
    const access = this.reflector.getAllAndOverride<Access | undefined>(ACCESS, [
      context.getHandler(),
      context.getClass(),
    ]);
    if (access === 'open' || access === 'signed-in') return true;
    const { user } = context.switchToHttp().getRequest<Request & { user?: CurrentUser }>();
    const held = user === undefined ? [] : permissionsOf[user.role];
    if (access?.some((permission) => held.includes(permission))) return true;
    throw new RoleRefused();
  }
}

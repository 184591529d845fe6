import { type ExecutionContext, Injectable } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { AuthGuard } from '@nestjs/passport';
import { ACCESS, type Access } from '../common/allow.decorator';
import { SessionExpired, SessionMissing } from './account.errors';

/** Asks for a session on every route that is not open. */
@Injectable()
export class SessionGuard extends AuthGuard('session') {
  constructor(private readonly reflector: Reflector) {
    super();
  }

  override async canActivate(context: ExecutionContext): Promise<boolean> {
    const access = this.reflector.getAllAndOverride<Access | undefined>(ACCESS, [
      context.getHandler(),
      context.getClass(),
    ]);
    if (access === 'open') return true;
    return (await super.canActivate(context)) as boolean;
  }

  override handleRequest<User>(fault: unknown, user: User | false, info: unknown): User {
    if (fault instanceof Error) throw fault;
    if (user) return user;
    throw info instanceof Error && info.name === 'TokenExpiredError' ? new SessionExpired() : new SessionMissing();
  }
}

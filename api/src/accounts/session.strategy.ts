import { Injectable } from '@nestjs/common';
import { PassportStrategy } from '@nestjs/passport';
import type { Request } from 'express';
import { Strategy } from 'passport-jwt';
import type { CurrentUser } from '../common/current-user';
import { SessionMissing } from './account.errors';
import { SESSION_COOKIE } from './session-cookie';
import { type SessionClaims, signingKey } from './session-tokens';
import { SessionsService } from './sessions.service';

const tokenInCookie = (request: Request): string | null => {
  const cookie: unknown = (request.cookies as Record<string, unknown> | undefined)?.[SESSION_COOKIE];
  return typeof cookie === 'string' ? cookie : null;
};

/** Reads the signed session id from the cookie and asks the session's row whether it still holds. */
@Injectable()
export class SessionStrategy extends PassportStrategy(Strategy, 'session') {
  constructor(private readonly sessions: SessionsService) {
    super({
      jwtFromRequest: tokenInCookie,
      secretOrKey: signingKey as unknown as Buffer,
      algorithms: ['HS256'],
    });
  }

  validate({ sid }: Partial<SessionClaims>): Promise<CurrentUser> {
    if (typeof sid !== 'string') throw new SessionMissing();
    return this.sessions.resume(sid);
  }
}

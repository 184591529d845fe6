import { createSecretKey } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';
import { env } from '../config/env';
import { SESSION_HOURS } from './sessions.service';

/** A key object: jsonwebtoken turns a string into a key again at each request, which costs a fifth of the time. */
export const signingKey = createSecretKey(Buffer.from(env.JWT_SECRET));

export type SessionClaims = { sid: string };

/** Signs what goes in the cookie: the session's token and nothing else. */
@Injectable()
export class SessionTokens {
  constructor(private readonly jwt: JwtService) {}

  sign(token: string): string {
    return this.jwt.sign({ sid: token } satisfies SessionClaims, {
      // The types know strings and buffers only; jsonwebtoken takes key objects.
      secret: signingKey as unknown as Buffer,
      algorithm: 'HS256',
      expiresIn: SESSION_HOURS * 3600,
    });
  }
}

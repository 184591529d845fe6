import { type CanActivate, type ExecutionContext, Injectable } from '@nestjs/common';
import type { Request } from 'express';
import { env } from '../config/env';
import { DomainError } from './domain-error';

export class OriginRefused extends DomainError {
  constructor() {
    super({ status: 403, code: 'origin-refused', title: 'This request does not come from the pages of Brimgate' });
  }
}

const LOOPBACK = ['127.0.0.1', 'localhost', '[::1]'];
const READS = new Set(['GET', 'HEAD', 'OPTIONS']);

/** The origins whose pages may write: the public address, and on loopback its other names. */
export function allowedOrigins(publicUrl: string): ReadonlySet<string> {
  const url = new URL(publicUrl);
  if (!LOOPBACK.includes(url.hostname)) return new Set([url.origin]);
  const port = url.port === '' ? '' : `:${url.port}`;
  return new Set(LOOPBACK.map((host) => `${url.protocol}//${host}${port}`));
}

/** Refuses writes whose Origin header is missing or not ours, so that another site cannot act with a person's cookie. */
@Injectable()
export class OriginGuard implements CanActivate {
  private readonly allowed = allowedOrigins(env.PUBLIC_URL);

  canActivate(context: ExecutionContext): boolean {
    const request = context.switchToHttp().getRequest<Request>();
    if (READS.has(request.method) || this.allowed.has(request.header('origin') ?? '')) return true;
    throw new OriginRefused();
  }
}

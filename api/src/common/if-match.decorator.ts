import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import type { Request } from 'express';
import { IfMatchMissing, IfMatchUnreadable } from './request-errors';

/** The version the person saw, from `If-Match: "3"`. */
export const IfMatch = createParamDecorator((_: unknown, context: ExecutionContext): number => {
  const header = context.switchToHttp().getRequest<Request>().header('if-match');
  if (header === undefined || header === '') throw new IfMatchMissing();
  const version = /^"(\d{1,9})"$/.exec(header.trim())?.[1];
  if (version === undefined) throw new IfMatchUnreadable();
  return Number(version);
});

import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import type { Request } from 'express';
import { IdempotencyKeyMissing } from './request-errors';

const UUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/i;

/** The UUID that makes an act happen once, from `Idempotency-Key`. */
export const IdempotencyKey = createParamDecorator((_: unknown, context: ExecutionContext): string => {
  const header = context.switchToHttp().getRequest<Request>().header('idempotency-key')?.trim();
  if (!header || !UUID.test(header)) throw new IdempotencyKeyMissing();
  return header.toLowerCase();
});

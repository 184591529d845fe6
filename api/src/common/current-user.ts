import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import type { Role } from '@brimgate/rules';
import type { Request } from 'express';

/** The signed-in person and the membership this session acts under. */
export interface CurrentUser {
  readonly personId: number;
  readonly personUuid: string;
  readonly name: string;
  readonly email: string;
  readonly licence: string | null;
  readonly membershipId: number;
  readonly role: Role;
  readonly firmId: number;
  readonly firmUuid: string;
  readonly firmName: string;
  /** The yards assigned; all of the firm's for an administrator. */
  readonly yardIds: readonly number[];
  readonly sessionId: number;
}

/** Hands the signed-in person to a handler; guards have seen to it that there is one. */
export const CurrentUser = createParamDecorator((_: unknown, context: ExecutionContext): CurrentUser => {
  const { user } = context.switchToHttp().getRequest<Request & { user?: CurrentUser }>();
  if (!user) throw new Error('This route is open: it has no signed-in person');
  return user;
});

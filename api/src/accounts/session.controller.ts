import { Body, Controller, Delete, Get, HttpCode, Ip, Post, Put, Res, UseGuards } from '@nestjs/common';
import { ThrottlerGuard } from '@nestjs/throttler';
import { MembershipChoice, type SessionView, SignInInput } from '@brimgate/rules';
import type { Response } from 'express';
import { Open, SignedIn } from '../common/allow.decorator';
import { CurrentUser } from '../common/current-user';
import { valid } from '../common/valid.pipe';
import { SESSION_COOKIE, sessionCookieOptions } from './session-cookie';
import { SignInService } from './sign-in.service';

@Controller('session')
export class SessionController {
  constructor(private readonly signIns: SignInService) {}

  /** Signs a person in. */
  @Post()
  @Open()
  @UseGuards(ThrottlerGuard)
  async create(
    @Body(valid(SignInInput)) input: SignInInput,
    @Ip() address: string,
    @Res({ passthrough: true }) response: Response,
  ): Promise<SessionView> {
    const { session, cookie } = await this.signIns.signIn(input, address);
    response.cookie(SESSION_COOKIE, cookie, sessionCookieOptions);
    return session;
  }

  @Get()
  @SignedIn()
  show(@CurrentUser() user: CurrentUser): Promise<SessionView> {
    return this.signIns.show(user);
  }

  /** Acts under another of the person's memberships from now on. */
  @Put('membership')
  @SignedIn()
  switchMembership(
    @Body(valid(MembershipChoice)) { membershipId }: MembershipChoice,
    @CurrentUser() user: CurrentUser,
  ): Promise<SessionView> {
    return this.signIns.switchMembership(membershipId, user);
  }

  /** Signs the person out: the cookie goes, and the session ends for whoever may hold a copy of it. */
  @Delete()
  @SignedIn()
  @HttpCode(204)
  async end(@CurrentUser() user: CurrentUser, @Res({ passthrough: true }) response: Response): Promise<void> {
    await this.signIns.signOut(user);
    response.clearCookie(SESSION_COOKIE, sessionCookieOptions);
  }
}

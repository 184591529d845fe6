import { RationContent, type RationView, type ScreeningView } from '@brimgate/rules';
import { Body, Controller, Get, Param, Post } from '@nestjs/common';
import { Allow } from '../common/allow.decorator';
import { CurrentUser } from '../common/current-user';
import { IfMatch } from '../common/if-match.decorator';
import { valid } from '../common/valid.pipe';
import { ScreeningsService } from './screenings.service';

@Controller()
export class ScreeningsController {
  constructor(private readonly screenings: ScreeningsService) {}

  /** Saves the ration if it changed, screens it and keeps the result. */
  @Post('rations/:rationId/screenings')
  @Allow('screen-rations')
  create(
    @Param('rationId') rationId: string,
    @Body(valid(RationContent)) content: RationContent,
    @IfMatch() version: number,
    @CurrentUser() user: CurrentUser,
  ): Promise<RationView> {
    return this.screenings.create({ rationId, content, version, user });
  }

  @Get('screenings/:screeningId')
  @Allow('read-rations')
  findOne(@Param('screeningId') screeningId: string, @CurrentUser() user: CurrentUser): Promise<ScreeningView> {
    return this.screenings.view({ user, screeningId });
  }
}

import { type AdvisoryPreview, type RationView, ReleaseInput, type ReleaseView, StopInput } from '@brimgate/rules';
import { Body, Controller, Get, HttpCode, Param, Post, Query } from '@nestjs/common';
import { Allow } from '../common/allow.decorator';
import { CurrentUser } from '../common/current-user';
import { IdempotencyKey } from '../common/idempotency-key.decorator';
import { IfMatch } from '../common/if-match.decorator';
import type { Page } from '../common/keyset';
import { valid } from '../common/valid.pipe';
import { ReleaseList, ReleaseListQuery } from './release-list.service';
import { ReleasesService } from './releases.service';
import { StopsService } from './stops.service';

@Controller()
export class ReleasesController {
  constructor(
    private readonly releases: ReleasesService,
    private readonly stops: StopsService,
    private readonly list: ReleaseList,
  ) {}

  @Get('rations/:rationId/advisory-preview')
  @Allow('release-rations')
  preview(@Param('rationId') rationId: string, @CurrentUser() user: CurrentUser): Promise<AdvisoryPreview> {
    return this.releases.preview({ rationId, user });
  }

  @Post('rations/:rationId/releases')
  @Allow('release-rations')
  release(
    @Param('rationId') rationId: string,
    @Body(valid(ReleaseInput)) input: ReleaseInput,
    @IfMatch() version: number,
    @IdempotencyKey() key: string,
    @CurrentUser() user: CurrentUser,
  ): Promise<RationView> {
    return this.releases.release({ rationId, input, version, key, user });
  }

  @Get('releases')
  @Allow('read-rations')
  findPage(
    @Query(valid(ReleaseListQuery)) query: ReleaseListQuery,
    @CurrentUser() user: CurrentUser,
  ): Promise<Page<ReleaseView>> {
    return this.list.page({ user, query });
  }

  @Get('releases/:releaseId')
  @Allow('read-rations')
  findOne(@Param('releaseId') releaseId: string, @CurrentUser() user: CurrentUser): Promise<ReleaseView> {
    return this.list.view({ user, releaseId });
  }

  @Post('releases/:releaseId/stop')
  @HttpCode(200)
  @Allow('stop-releases')
  stop(
    @Param('releaseId') releaseId: string,
    @Body(valid(StopInput)) input: StopInput,
    @IdempotencyKey() key: string,
    @CurrentUser() user: CurrentUser,
  ): Promise<ReleaseView> {
    return this.stops.stop({ releaseId, input, key, user });
  }
}

import { RationCreateInput, RationSaveInput, type RationListItem, type RationView } from '@brimgate/rules';
import { Body, Controller, Get, Param, Post, Put, Query } from '@nestjs/common';
import { Allow } from '../common/allow.decorator';
import { CurrentUser } from '../common/current-user';
import { IfMatch } from '../common/if-match.decorator';
import type { Page } from '../common/keyset';
import { valid } from '../common/valid.pipe';
import { RationListQuery } from './ration-list-query';
import { RationList } from './ration-list.service';
import { RationViews } from './ration-views.service';
import { RationsService } from './rations.service';

@Controller('rations')
export class RationsController {
  constructor(
    private readonly rations: RationsService,
    private readonly list: RationList,
    private readonly views: RationViews,
  ) {}

  @Get()
  @Allow('read-rations')
  findPage(
    @Query(valid(RationListQuery)) query: RationListQuery,
    @CurrentUser() user: CurrentUser,
  ): Promise<Page<RationListItem>> {
    return this.list.page({ user, query });
  }

  @Post()
  @Allow('edit-rations')
  create(
    @Body(valid(RationCreateInput)) input: RationCreateInput,
    @CurrentUser() user: CurrentUser,
  ): Promise<RationView> {
    return this.rations.create({ input, user });
  }

  @Get(':rationId')
  @Allow('read-rations')
  findOne(@Param('rationId') rationId: string, @CurrentUser() user: CurrentUser): Promise<RationView> {
    return this.views.view({ user, rationId });
  }

  /** Saves what changed; without a change nothing moves, not even the version. */
  @Put(':rationId')
  @Allow('edit-rations')
  save(
    @Param('rationId') rationId: string,
    @Body(valid(RationSaveInput)) input: RationSaveInput,
    @IfMatch() version: number,
    @CurrentUser() user: CurrentUser,
  ): Promise<RationView> {
    return this.rations.save({ rationId, input, version, user });
  }
}

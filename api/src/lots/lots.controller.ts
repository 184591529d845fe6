import { LotInput, type LotView } from '@brimgate/rules';
import { Body, Controller, Get, Param, Post, Put, Query } from '@nestjs/common';
import { Allow } from '../common/allow.decorator';
import { CurrentUser } from '../common/current-user';
import { IfMatch } from '../common/if-match.decorator';
import type { Page } from '../common/keyset';
import { valid } from '../common/valid.pipe';
import { LotList, LotListQuery } from './lot-list.service';
import { LotsService } from './lots.service';

@Controller('lots')
export class LotsController {
  constructor(
    private readonly lots: LotsService,
    private readonly list: LotList,
  ) {}

  @Get()
  @Allow('read-lots')
  findPage(@Query(valid(LotListQuery)) query: LotListQuery, @CurrentUser() user: CurrentUser): Promise<Page<LotView>> {
    return this.list.page({ user, query });
  }

  @Post()
  @Allow('edit-lots')
  create(@Body(valid(LotInput)) input: LotInput, @CurrentUser() user: CurrentUser): Promise<LotView> {
    return this.lots.create({ input, user });
  }

  @Get(':lotId')
  @Allow('read-lots')
  findOne(@Param('lotId') lotId: string, @CurrentUser() user: CurrentUser): Promise<LotView> {
    return this.list.view({ user, lotId });
  }

  @Put(':lotId')
  @Allow('edit-lots')
  save(
    @Param('lotId') lotId: string,
    @Body(valid(LotInput)) input: LotInput,
    @IfMatch() version: number,
    @CurrentUser() user: CurrentUser,
  ): Promise<LotView> {
    return this.lots.save({ lotId, input, version, user });
  }
}

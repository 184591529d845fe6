import type { AdvisoryListItem, AdvisoryView } from '@brimgate/rules';
import { Controller, Get, HttpCode, Param, Post, Query } from '@nestjs/common';
import { Allow } from '../common/allow.decorator';
import { CurrentUser } from '../common/current-user';
import { IdempotencyKey } from '../common/idempotency-key.decorator';
import type { Page } from '../common/keyset';
import { PageQuery } from '../common/page-query';
import { valid } from '../common/valid.pipe';
import { AdvisoriesService } from './advisories.service';

@Controller('advisories')
export class AdvisoriesController {
  constructor(private readonly advisories: AdvisoriesService) {}

  @Get()
  @Allow('read-advisories')
  findPage(
    @Query(valid(PageQuery)) query: PageQuery,
    @CurrentUser() user: CurrentUser,
  ): Promise<Page<AdvisoryListItem>> {
    return this.advisories.page({ user, query });
  }

  @Get(':advisoryId')
  @Allow('read-advisories')
  findOne(@Param('advisoryId') advisoryId: string, @CurrentUser() user: CurrentUser): Promise<AdvisoryView> {
    return this.advisories.view({ user, advisoryId });
  }

  @Post(':advisoryId/acknowledgement')
  @HttpCode(200)
  @Allow('acknowledge-advisories')
  acknowledge(
    @Param('advisoryId') advisoryId: string,
    @IdempotencyKey() key: string,
    @CurrentUser() user: CurrentUser,
  ): Promise<AdvisoryView> {
    return this.advisories.acknowledge({ user, advisoryId, key });
  }

  @Post(':advisoryId/deliveries/:deliveryId/retry')
  @HttpCode(200)
  @Allow('retry-deliveries')
  retry(
    @Param('advisoryId') advisoryId: string,
    @Param('deliveryId') deliveryId: string,
    @IdempotencyKey() key: string,
    @CurrentUser() user: CurrentUser,
  ): Promise<AdvisoryView> {
    return this.advisories.retry({ user, advisoryId, deliveryId, key });
  }
}

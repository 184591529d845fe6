import { Body, Controller, Get, Param, Post, Query } from '@nestjs/common';
import {
  Id,
  WaterAnalysisInput,
  type WaterAnalysisView,
  WaterSourceInput,
  type WaterSourceView,
} from '@brimgate/rules';
import * as v from 'valibot';
import { Allow } from '../common/allow.decorator';
import { CurrentUser } from '../common/current-user';
import { IdempotencyKey } from '../common/idempotency-key.decorator';
import { valid } from '../common/valid.pipe';
import { WaterService } from './water.service';

const WaterQuery = v.strictObject({ yardId: v.optional(Id) });
type WaterQuery = v.InferOutput<typeof WaterQuery>;

@Controller('water-sources')
export class WaterController {
  constructor(private readonly water: WaterService) {}

  @Get()
  @Allow('read-water')
  list(@Query(valid(WaterQuery)) { yardId }: WaterQuery, @CurrentUser() user: CurrentUser) {
    return this.water.list(yardId, user);
  }

  @Post()
  @Allow('edit-water')
  create(
    @Body(valid(WaterSourceInput)) input: WaterSourceInput,
    @CurrentUser() user: CurrentUser,
  ): Promise<WaterSourceView> {
    return this.water.create(input, user);
  }

  /** Enters a laboratory's result of this water. */
  @Post(':id/analyses')
  @Allow('edit-water')
  addAnalysis(
    @Param('id') sourceUuid: string,
    @Body(valid(WaterAnalysisInput)) input: WaterAnalysisInput,
    @IdempotencyKey() key: string,
    @CurrentUser() user: CurrentUser,
  ): Promise<WaterAnalysisView> {
    return this.water.addAnalysis({ sourceUuid, input, key }, user);
  }
}

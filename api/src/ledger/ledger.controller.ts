import { LedgerQuery, type LedgerView } from '@brimgate/rules';
import { Controller, Get, Query, StreamableFile } from '@nestjs/common';
import { Allow } from '../common/allow.decorator';
import { CurrentUser } from '../common/current-user';
import { valid } from '../common/valid.pipe';
import { LedgerExport } from '../exports/ledger-export.service';
import { LedgerService } from './ledger.service';

@Controller()
export class LedgerController {
  constructor(
    private readonly ledger: LedgerService,
    private readonly exports: LedgerExport,
  ) {}

  @Get('ledger')
  @Allow('read-ledger')
  view(@Query(valid(LedgerQuery)) query: LedgerQuery, @CurrentUser() user: CurrentUser): Promise<LedgerView> {
    return this.ledger.view({ user, query });
  }

  /** The same period as a file for the nutrient-management records. */
  @Get('ledger.csv')
  @Allow('read-ledger')
  csv(@Query(valid(LedgerQuery)) query: LedgerQuery, @CurrentUser() user: CurrentUser): Promise<StreamableFile> {
    return this.exports.csv({ user, query });
  }
}

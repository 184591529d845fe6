import { Module } from '@nestjs/common';
import { LedgerExport } from '../exports/ledger-export.service';
import { LedgerController } from './ledger.controller';
import { LedgerLots } from './ledger-lots.service';
import { LedgerService } from './ledger.service';

@Module({
  controllers: [LedgerController],
  providers: [LedgerService, LedgerLots, LedgerExport],
})
export class LedgerModule {}

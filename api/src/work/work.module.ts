import { Module } from '@nestjs/common';
import { DeskWork } from './desk-work.service';
import { LotWork } from './lot-work.service';
import { MailWork } from './mail-work.service';
import { RationWork } from './ration-work.service';
import { WorkController } from './work.controller';
import { WorkService } from './work.service';

@Module({
  controllers: [WorkController],
  providers: [WorkService, RationWork, DeskWork, MailWork, LotWork],
})
export class WorkModule {}

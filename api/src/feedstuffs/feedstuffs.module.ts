import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { AuditModule } from '../audit/audit.module';
import { FeedstuffFactsService } from './feedstuff-facts.service';
import { FeedstuffModel } from './feedstuff.model';
import { FeedstuffsController } from './feedstuffs.controller';
import { FeedstuffsService } from './feedstuffs.service';

@Module({
  imports: [AuditModule, SequelizeModule.forFeature([FeedstuffModel])],
  controllers: [FeedstuffsController],
  providers: [FeedstuffsService, FeedstuffFactsService],
  exports: [FeedstuffsService, FeedstuffFactsService],
})
export class FeedstuffsModule {}

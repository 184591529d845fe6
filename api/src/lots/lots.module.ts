import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { AuditModule } from '../audit/audit.module';
import { LotExcretions } from './lot-excretions.service';
import { LotList } from './lot-list.service';
import { LotModel } from './lot.model';
import { LotsController } from './lots.controller';
import { LotsService } from './lots.service';

@Module({
  imports: [SequelizeModule.forFeature([LotModel]), AuditModule],
  controllers: [LotsController],
  providers: [LotsService, LotList, LotExcretions],
  exports: [LotsService],
})
export class LotsModule {}

import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { YardModel } from '../yards/yard.model';
import { AuditController } from './audit.controller';
import { AuditEventModel } from './audit-event.model';
import { AuditEventsService } from './audit-events.service';
import { AuditService } from './audit.service';

@Module({
  imports: [SequelizeModule.forFeature([AuditEventModel, YardModel])],
  controllers: [AuditController],
  providers: [AuditService, AuditEventsService],
  exports: [AuditService],
})
export class AuditModule {}

import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { AuditModule } from '../audit/audit.module';
import { OutboxModule } from '../outbox/outbox.module';
import { AdvisoriesController } from './advisories.controller';
import { AdvisoriesService } from './advisories.service';
import { AdvisoryModel } from './advisory.model';
import { AdvisoryRecipients } from './advisory-recipients.service';
import { AdvisoryRenderer } from './advisory-renderer.service';
import { AdvisoryWriter } from './advisory-writer.service';

@Module({
  imports: [SequelizeModule.forFeature([AdvisoryModel]), AuditModule, OutboxModule],
  controllers: [AdvisoriesController],
  providers: [AdvisoriesService, AdvisoryRecipients, AdvisoryRenderer, AdvisoryWriter],
  exports: [AdvisoryWriter],
})
export class AdvisoriesModule {}

import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { AuditModule } from '../audit/audit.module';
import { FeedstuffsModule } from '../feedstuffs/feedstuffs.module';
import { WaterModule } from '../water/water.module';
import { RationDrafts } from './ration-drafts.service';
import { RationFacts } from './ration-facts.service';
import { RationList } from './ration-list.service';
import { RationLookup } from './ration-lookup.service';
import { RationModel } from './ration.model';
import { RationVersionModel } from './ration-version.model';
import { RationViews } from './ration-views.service';
import { RationsController } from './rations.controller';
import { RationsService } from './rations.service';

@Module({
  imports: [SequelizeModule.forFeature([RationModel, RationVersionModel]), FeedstuffsModule, WaterModule, AuditModule],
  controllers: [RationsController],
  providers: [RationsService, RationDrafts, RationFacts, RationList, RationLookup, RationViews],
  exports: [RationsService, RationDrafts, RationFacts, RationLookup, RationViews],
})
export class RationsModule {}

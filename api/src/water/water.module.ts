import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { AuditModule } from '../audit/audit.module';
import { YardsModule } from '../yards/yards.module';
import { WaterAnalysisModel } from './water-analysis.model';
import { WaterController } from './water.controller';
import { WaterFactsService } from './water-facts.service';
import { WaterService } from './water.service';
import { WaterSourceModel } from './water-source.model';

@Module({
  imports: [AuditModule, YardsModule, SequelizeModule.forFeature([WaterSourceModel, WaterAnalysisModel])],
  controllers: [WaterController],
  providers: [WaterService, WaterFactsService],
  exports: [WaterService, WaterFactsService],
})
export class WaterModule {}

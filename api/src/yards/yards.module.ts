import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { AuditModule } from '../audit/audit.module';
import { YardModel } from './yard.model';
import { YardsController } from './yards.controller';
import { YardsService } from './yards.service';

@Module({
  imports: [AuditModule, SequelizeModule.forFeature([YardModel])],
  controllers: [YardsController],
  providers: [YardsService],
  exports: [YardsService, SequelizeModule],
})
export class YardsModule {}

import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { AdvisoriesModule } from '../advisories/advisories.module';
import { AuditModule } from '../audit/audit.module';
import { RationsModule } from '../rations/rations.module';
import { ScreeningsModule } from '../screenings/screenings.module';
import { ReleaseList } from './release-list.service';
import { ReleaseMatters } from './release-matter.service';
import { ReleaseModel } from './release.model';
import { ReleasesController } from './releases.controller';
import { ReleasesService } from './releases.service';
import { StopsService } from './stops.service';

@Module({
  imports: [SequelizeModule.forFeature([ReleaseModel]), RationsModule, ScreeningsModule, AdvisoriesModule, AuditModule],
  controllers: [ReleasesController],
  providers: [ReleasesService, StopsService, ReleaseList, ReleaseMatters],
  exports: [ReleasesService],
})
export class ReleasesModule {}

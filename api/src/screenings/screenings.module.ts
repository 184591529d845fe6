import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { AuditModule } from '../audit/audit.module';
import { RationsModule } from '../rations/rations.module';
import { CurrentScreening } from './current-screening.service';
import { ScreeningRequestModel } from './screening-request.model';
import { ScreeningRequests } from './screening-requests.service';
import { ScreeningModel } from './screening.model';
import { ScreeningsController } from './screenings.controller';
import { ScreeningsService } from './screenings.service';

@Module({
  imports: [SequelizeModule.forFeature([ScreeningRequestModel, ScreeningModel]), RationsModule, AuditModule],
  controllers: [ScreeningsController],
  providers: [ScreeningsService, ScreeningRequests, CurrentScreening],
  exports: [CurrentScreening, ScreeningsService],
})
export class ScreeningsModule {}

import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { AccountsModule } from '../accounts/accounts.module';
import { AuditModule } from '../audit/audit.module';
import { RationsModule } from '../rations/rations.module';
import { ScreeningsModule } from '../screenings/screenings.module';
import { DecisionModel } from './decision.model';
import { DecisionsService } from './decisions.service';
import { ReviewDesk } from './review-desk.service';
import { ReviewLookup } from './review-lookup.service';
import { ReviewModel } from './review.model';
import { ReviewsController } from './reviews.controller';
import { SubmissionsService } from './submissions.service';

@Module({
  imports: [
    SequelizeModule.forFeature([ReviewModel, DecisionModel]),
    AccountsModule,
    RationsModule,
    ScreeningsModule,
    AuditModule,
  ],
  controllers: [ReviewsController],
  providers: [ReviewDesk, ReviewLookup, SubmissionsService, DecisionsService],
  exports: [SubmissionsService, DecisionsService],
})
export class ReviewsModule {}

import { Module } from '@nestjs/common';
import { APP_FILTER, APP_INTERCEPTOR } from '@nestjs/core';
import { ScheduleModule } from '@nestjs/schedule';
import { LoggerModule } from 'nestjs-pino';
import { AccountsModule } from './accounts/accounts.module';
import { AuditModule } from './audit/audit.module';
import { EtagInterceptor } from './common/etag.interceptor';
import { GracefulStop } from './common/graceful-stop';
import { loggingOptions } from './common/logging';
import { ProblemFilter } from './common/problem.filter';
import { DatabaseModule } from './database/database.module';
import { FeedstuffsModule } from './feedstuffs/feedstuffs.module';
import { FirmsModule } from './firms/firms.module';
import { HealthModule } from './health/health.module';
import { AdvisoriesModule } from './advisories/advisories.module';
import { LedgerModule } from './ledger/ledger.module';
import { LotsModule } from './lots/lots.module';
import { OutboxModule } from './outbox/outbox.module';
import { RationsModule } from './rations/rations.module';
import { ReleasesModule } from './releases/releases.module';
import { ReviewsModule } from './reviews/reviews.module';
import { ScreeningsModule } from './screenings/screenings.module';
import { WorkModule } from './work/work.module';
import { WaterModule } from './water/water.module';
import { YardsModule } from './yards/yards.module';

@Module({
  imports: [
    LoggerModule.forRoot(loggingOptions),
    ScheduleModule.forRoot(),
    DatabaseModule,
    AccountsModule,
    FirmsModule,
    YardsModule,
    FeedstuffsModule,
    WaterModule,
    AuditModule,
    WorkModule,
    ScreeningsModule,
    ReviewsModule,
    ReleasesModule,
    RationsModule,
    OutboxModule,
    LotsModule,
    LedgerModule,
    AdvisoriesModule,
    HealthModule,
  ],
  providers: [
    GracefulStop,
    { provide: APP_FILTER, useClass: ProblemFilter },
    { provide: APP_INTERCEPTOR, useClass: EtagInterceptor },
  ],
})
export class AppModule {}

import { Global, Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { env } from '../config/env';
import { IdempotencyService } from '../common/idempotency.service';
import { TransactionsService } from '../common/transactions.service';
import { connectionOptions } from './connection-options';
import { FirmScopeInstaller } from './firm-scope.installer';
import { Housekeeping } from './housekeeping';

@Global()
@Module({
  imports: [
    SequelizeModule.forRootAsync({
      useFactory: () => ({
        ...connectionOptions(env, { user: env.DATABASE_USER, password: env.DATABASE_PASSWORD }),
        autoLoadModels: true,
        synchronize: false,
        retryAttempts: 5,
        retryDelay: 1000,
      }),
    }),
  ],
  providers: [FirmScopeInstaller, TransactionsService, IdempotencyService, Housekeeping],
  exports: [TransactionsService, IdempotencyService],
})
export class DatabaseModule {}

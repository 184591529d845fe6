import { Module } from '@nestjs/common';
import { ThrottlerModule } from '@nestjs/throttler';
import { ThrottleStorage } from './throttle.storage';

@Module({ providers: [ThrottleStorage], exports: [ThrottleStorage] })
class ThrottleStorageModule {}

/** Sign-ins from one address, right or wrong: what a busy clinic or a suite of browser tests never reaches. */
const SIGN_INS = { name: 'sign-ins', ttl: 15 * 60_000, limit: 300 };

@Module({
  imports: [
    ThrottleStorageModule,
    ThrottlerModule.forRootAsync({
      imports: [ThrottleStorageModule],
      inject: [ThrottleStorage],
      useFactory: (storage: ThrottleStorage) => ({ throttlers: [SIGN_INS], storage }),
    }),
  ],
  exports: [ThrottlerModule, ThrottleStorageModule],
})
export class ThrottlingModule {}

import { AsyncLocalStorage } from 'node:async_hooks';
import { setTimeout as wait } from 'node:timers/promises';
import { Injectable, Logger } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { Transaction } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import { DEADLOCK, errorNumber, LOCK_WAIT_TIMEOUT, RECORD_CHANGED } from '../database/error-number';
import { DomainError } from './domain-error';

export class DatabaseBusy extends DomainError {
  constructor() {
    super({
      status: 503,
      code: 'database-busy',
      title: 'Too many people saved at once: try again in a moment',
      retryAfterSeconds: 1,
    });
  }
}

const TRIES = 4;
const FIRST_WAIT_MS = 15;
const RETRIED: ReadonlySet<number | undefined> = new Set([DEADLOCK, RECORD_CHANGED, LOCK_WAIT_TIMEOUT]);

/** Runs an act as one transaction, and the whole of it again when the database asks for that. */
@Injectable()
export class TransactionsService {
  private readonly logger = new Logger(TransactionsService.name);
  private readonly running = new AsyncLocalStorage<true>();

  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  /** `act` may run up to four times: everything it does outside the transaction must bear that. */
  async run<T>(act: (transaction: Transaction) => Promise<T>): Promise<T> {
    if (this.running.getStore()) throw new Error('A transaction inside a transaction: hand the outer one on instead');
    for (let attempt = 1; ; attempt += 1) {
      try {
        return await this.running.run(true, () => this.once(act));
      } catch (error) {
        const number = errorNumber(error);
        if (!RETRIED.has(number)) throw error;
        if (attempt === TRIES) throw new DatabaseBusy();
        this.logger.warn(`Transaction repeated after database fault ${number}, try ${attempt}`);
        await wait(FIRST_WAIT_MS * 2 ** attempt * Math.random());
      }
    }
  }

  private once<T>(act: (transaction: Transaction) => Promise<T>): Promise<T> {
    return this.sequelize.transaction({ isolationLevel: Transaction.ISOLATION_LEVELS.REPEATABLE_READ }, act);
  }
}

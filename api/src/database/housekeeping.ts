import { Injectable } from '@nestjs/common';
import { Interval } from '@nestjs/schedule';
import { InjectConnection } from '@nestjs/sequelize';
import { Sequelize } from 'sequelize-typescript';

// Every process may run this at any time: deleting what has expired a second time deletes nothing.
const EXPIRED = [
  'DELETE FROM idempotency_keys WHERE created_at < UTC_TIMESTAMP(3) - INTERVAL 7 DAY LIMIT 5000',
  'DELETE FROM sessions WHERE ends_at < UTC_TIMESTAMP(3) - INTERVAL 30 DAY LIMIT 5000',
  'DELETE FROM throttle_counts WHERE expires_at < UTC_TIMESTAMP(3) LIMIT 5000',
];

@Injectable()
export class Housekeeping {
  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  @Interval('housekeeping', 15 * 60_000)
  async removeExpired(): Promise<void> {
    for (const statement of EXPIRED) await this.sequelize.query(statement);
  }
}

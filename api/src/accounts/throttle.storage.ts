import { createHash } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import type { ThrottlerStorage } from '@nestjs/throttler';
import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';

type Count = { hits: number; millisecondsLeft: number };

/** Counts tries in the database, with its clock, so that all processes count together. */
@Injectable()
export class ThrottleStorage implements ThrottlerStorage {
  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  async increment(key: string, ttlMilliseconds: number, limit: number, _blockDuration: number, throttlerName: string) {
    const { hits, millisecondsLeft } = await this.count(`${throttlerName}:${key}`, ttlMilliseconds);
    const secondsLeft = Math.ceil(millisecondsLeft / 1000);
    const isBlocked = hits > limit;
    return { totalHits: hits, timeToExpire: secondsLeft, isBlocked, timeToBlockExpire: isBlocked ? secondsLeft : 0 };
  }

  /** Counts one more and says how many there are in the window that began with the first. */
  async count(key: string, windowMilliseconds: number): Promise<Count> {
    // MariaDB assigns from left to right: the hits are judged by the old expiry, before it is moved.
    // RETURNING gives this try's own count, also when others count at the same moment.
    const [row] = await this.sequelize.query<Count>(
      `/* count a try */ INSERT INTO throttle_counts (throttle_key, hits, expires_at)
       VALUES (:hash, 1, UTC_TIMESTAMP(3) + INTERVAL :window MICROSECOND)
       ON DUPLICATE KEY UPDATE
         hits = IF(expires_at < UTC_TIMESTAMP(3), 1, hits + 1),
         expires_at = IF(expires_at < UTC_TIMESTAMP(3), VALUES(expires_at), expires_at)
       RETURNING hits, GREATEST(0, TIMESTAMPDIFF(MICROSECOND, UTC_TIMESTAMP(3), expires_at) DIV 1000) AS millisecondsLeft`,
      { replacements: { hash: hashOf(key), window: windowMilliseconds * 1000 }, type: QueryTypes.SELECT },
    );
    return { hits: Number(row?.hits ?? 1), millisecondsLeft: Number(row?.millisecondsLeft ?? windowMilliseconds) };
  }

  /** Takes a try back: it was no failure. */
  async giveBack(key: string): Promise<void> {
    await this.sequelize.query('UPDATE throttle_counts SET hits = hits - 1 WHERE throttle_key = :hash AND hits > 0', {
      replacements: { hash: hashOf(key) },
    });
  }
}

// Keys hold addresses of people; the table needs only to tell them apart.
const hashOf = (key: string) => createHash('sha256').update(key).digest('hex');

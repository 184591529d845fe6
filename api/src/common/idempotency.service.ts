import { createHash } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { QueryTypes, type Transaction } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import { DUPLICATE_KEY, errorNumber, LOCK_WAIT_TIMEOUT } from '../database/error-number';
import type { CurrentUser } from './current-user';
import { IdempotencyInFlight, IdempotencyKeyReused } from './request-errors';
import { TransactionsService } from './transactions.service';

type Request = {
  user: Pick<CurrentUser, 'firmId' | 'personId'>;
  /** What is done and to what: `POST /api/rations/<uuid>/releases`. */
  route: string;
  key: string;
  body: unknown;
};

class KeyTaken extends Error {}

/** JSON with sorted names and without passwords: a fast hash of a password would not keep it. */
function comparable(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(comparable);
  if (typeof value !== 'object' || value === null) return value;
  const entries = Object.entries(value).filter(([name]) => name !== 'password');
  return Object.fromEntries(
    entries.sort(([a], [b]) => (a < b ? -1 : 1)).map(([name, part]) => [name, comparable(part)]),
  );
}

const hashOf = (body: unknown) =>
  createHash('sha256')
    .update(JSON.stringify(comparable(body ?? null)))
    .digest('hex');

/** Makes an act happen once for a key: its answer is stored in the same transaction and given again. */
@Injectable()
export class IdempotencyService {
  constructor(
    @InjectConnection() private readonly sequelize: Sequelize,
    private readonly transactions: TransactionsService,
  ) {}

  async once<T>(request: Request, act: (transaction: Transaction) => Promise<T>): Promise<T> {
    const bodyHash = hashOf(request.body);
    try {
      return await this.transactions.run(async (transaction) => {
        await this.claim(request, bodyHash, transaction);
        const answer = await act(transaction);
        await this.keep(request, answer, transaction);
        return answer;
      });
    } catch (error) {
      if (!(error instanceof KeyTaken)) throw error;
      return this.storedAnswer<T>(request, bodyHash);
    }
  }

  /** The row comes first and waits for no lock: a busy row means that the same request is under way. */
  private async claim({ user, route, key }: Request, bodyHash: string, transaction: Transaction): Promise<void> {
    try {
      await this.sequelize.query(
        `SET STATEMENT innodb_lock_wait_timeout = 0 FOR
         INSERT INTO idempotency_keys (firm_id, person_id, route, idempotency_key, body_hash, created_at)
         VALUES (:firmId, :personId, :route, :key, :bodyHash, UTC_TIMESTAMP(3))`,
        { replacements: { firmId: user.firmId, personId: user.personId, route, key, bodyHash }, transaction },
      );
    } catch (error) {
      const number = errorNumber(error);
      if (number === LOCK_WAIT_TIMEOUT) throw new IdempotencyInFlight();
      if (number === DUPLICATE_KEY) throw new KeyTaken();
      throw error;
    }
  }

  private async keep({ user, route, key }: Request, answer: unknown, transaction: Transaction): Promise<void> {
    await this.sequelize.query(
      `UPDATE idempotency_keys SET answer = :answer
       WHERE firm_id = :firmId AND person_id = :personId AND route = :route AND idempotency_key = :key`,
      {
        replacements: {
          answer: JSON.stringify(answer ?? null),
          firmId: user.firmId,
          personId: user.personId,
          route,
          key,
        },
        transaction,
      },
    );
  }

  private async storedAnswer<T>({ user, route, key }: Request, bodyHash: string): Promise<T> {
    const [row] = await this.sequelize.query<{ body_hash: string; answer: string }>(
      `SELECT body_hash, CAST(answer AS CHAR) AS answer FROM idempotency_keys
       WHERE firm_id = :firmId AND person_id = :personId AND route = :route AND idempotency_key = :key`,
      { replacements: { firmId: user.firmId, personId: user.personId, route, key }, type: QueryTypes.SELECT },
    );
    if (!row) throw new IdempotencyInFlight();
    if (row.body_hash !== bodyHash) throw new IdempotencyKeyReused();
    return (typeof row.answer === 'string' ? JSON.parse(row.answer) : row.answer) as T;
  }
}

import type { ScreeningRequest } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { QueryTypes, type Transaction } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';

type Stored = { firmId: number; request: ScreeningRequest; requestHash: string };

/** Keeps each request once, however often it is screened. */
@Injectable()
export class ScreeningRequests {
  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  /** One statement, so that two who store the same request at once both get the one row. */
  async store({ firmId, request, requestHash }: Stored, transaction: Transaction): Promise<number> {
    const [row] = await this.sequelize.query<{ id: number }>(
      `INSERT INTO screening_requests (firm_id, request_hash, request) VALUES (:firmId, :requestHash, :request)
       ON DUPLICATE KEY UPDATE id = id RETURNING id`,
      { replacements: { firmId, requestHash, request: JSON.stringify(request) }, type: QueryTypes.SELECT, transaction },
    );
    if (!row) throw new Error('The request was stored without an answer');
    return row.id;
  }
}

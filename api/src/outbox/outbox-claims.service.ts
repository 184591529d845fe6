import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { QueryTypes, Transaction } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';

/** Longer than every time-out of one delivery together. */
export const LEASE_SECONDS = 120;

export type Claim = {
  id: number;
  firmId: number;
  advisoryId: number;
  recipient: string;
  messageId: string;
  attempts: number;
  leaseToken: string;
};

type DueRow = {
  id: number;
  firm_id: number;
  advisory_id: number;
  recipient: string;
  message_id: string;
  attempts: number;
};

/**
 * Who sends which mail, decided by the database so that any number of processes may send.
 * These statements look across firms: the sender serves all of them and shows nobody anything.
 */
@Injectable()
export class OutboxClaims {
  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  /** Takes the mail that is due longest, or whose sender's lease ran out; the claim is committed before it is sent. */
  claimNext(): Promise<Claim | null> {
    const leaseToken = randomUUID();
    const isolationLevel = Transaction.ISOLATION_LEVELS.READ_COMMITTED;
    return this.sequelize.transaction({ isolationLevel }, async (transaction) => {
      // Sequelize drops its skipLocked option for MariaDB, so the statement is written out.
      const [row] = await this.sequelize.query<DueRow>(
        `SELECT id, firm_id, advisory_id, recipient, message_id, attempts FROM outbox_mails
         WHERE due_at <= UTC_TIMESTAMP(3) ORDER BY due_at, id LIMIT 1 FOR UPDATE SKIP LOCKED`,
        { type: QueryTypes.SELECT, transaction },
      );
      if (!row) return null;
      await this.sequelize.query(
        `UPDATE outbox_mails SET state = 'sending', attempts = attempts + 1, lease_token = :leaseToken,
           due_at = UTC_TIMESTAMP(3) + INTERVAL :leaseSeconds SECOND
         WHERE firm_id = :firmId AND id = :id`,
        {
          replacements: { leaseToken, leaseSeconds: LEASE_SECONDS, firmId: row.firm_id, id: row.id },
          type: QueryTypes.UPDATE,
          transaction,
        },
      );
      return {
        id: row.id,
        firmId: row.firm_id,
        advisoryId: row.advisory_id,
        recipient: row.recipient,
        messageId: row.message_id,
        attempts: row.attempts + 1,
        leaseToken,
      };
    });
  }

  markSent(claim: Claim): Promise<void> {
    return this.mark(claim, "state = 'sent', sent_at = UTC_TIMESTAMP(3), due_at = NULL, last_error = NULL", {});
  }

  markWaiting(claim: Claim, reason: string, waitMs: number): Promise<void> {
    const values =
      "state = 'waiting', due_at = UTC_TIMESTAMP(3) + INTERVAL :waitMicroseconds MICROSECOND, last_error = :reason";
    return this.mark(claim, values, { reason: reason.slice(0, 1000), waitMicroseconds: Math.round(waitMs * 1000) });
  }

  markParked(claim: Claim, reason: string): Promise<void> {
    const values = "state = 'parked', due_at = NULL, last_error = :reason";
    return this.mark(claim, values, { reason: reason.slice(0, 1000) });
  }

  /** Only the sender that holds the lease marks the row; one whose lease ran out changes nothing. */
  private async mark(claim: Claim, values: string, replacements: Record<string, string | number>): Promise<void> {
    await this.sequelize.query(
      `UPDATE outbox_mails SET ${values}, lease_token = NULL
       WHERE firm_id = :firmId AND id = :id AND lease_token = :leaseToken`,
      {
        replacements: { ...replacements, firmId: claim.firmId, id: claim.id, leaseToken: claim.leaseToken },
        type: QueryTypes.UPDATE,
      },
    );
  }
}

import { randomUUID } from 'node:crypto';
import type { DeliveryView } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import { env } from '../config/env';
import { oneLine } from './one-line';
import { OutboxMailModel } from './outbox-mail.model';

export type Recipient = { address: string; role: DeliveryView['role'] };

type Queued = { firmId: number; advisoryId: number; recipients: readonly Recipient[] };

const senderDomain = () => /@([^>\s]+)/.exec(env.SMTP_FROM)?.[1] ?? 'brimgate.invalid';

/** Where mail leaves from: rows written in the transaction that the mail reports. */
@Injectable()
export class Outbox {
  async queue({ firmId, advisoryId, recipients }: Queued, transaction: Transaction): Promise<void> {
    const now = new Date();
    const rows = recipients.map(({ address, role }) => ({
      firmId,
      uuid: randomUUID(),
      advisoryId,
      recipient: oneLine('address', address),
      role,
      messageId: `<${randomUUID()}@${senderDomain()}>`,
      state: 'queued',
      attempts: 0,
      lastError: null,
      dueAt: now,
      leaseToken: null,
      sentAt: null,
    }));
    await OutboxMailModel.bulkCreate(rows, { transaction });
  }
}

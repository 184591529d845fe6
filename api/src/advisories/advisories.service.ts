import type { AdvisoryListItem, AdvisoryView } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import { AuditService } from '../audit/audit.service';
import type { CurrentUser } from '../common/current-user';
import { IdempotencyService } from '../common/idempotency.service';
import { afterCursor, type Page, pageOf } from '../common/keyset';
import type { PageQuery } from '../common/page-query';
import { ofYards } from '../database/firm-scope';
import { OutboxMailModel } from '../outbox/outbox-mail.model';
import { RationModel } from '../rations/ration.model';
import { YardModel } from '../yards/yard.model';
import { AdvisoryNotFound, AlreadyAcknowledged, DeliveryNotFound, DeliveryNotParked } from './advisory.errors';
import { AdvisoryModel } from './advisory.model';
import { toAdvisoryListItem, toAdvisoryView } from './advisory.view';

type Sought = { user: CurrentUser; advisoryId: string };

const partsOf = ({ firmId }: CurrentUser) => [
  { model: RationModel, attributes: ['uuid', 'name'] },
  { model: YardModel, attributes: ['uuid', 'name'] },
  { model: OutboxMailModel, separate: true, where: { firmId }, order: [['id', 'ASC'] as [string, string]] },
];

/** Advisories as the yard and the firm read them. */
@Injectable()
export class AdvisoriesService {
  constructor(
    private readonly idempotency: IdempotencyService,
    private readonly audit: AuditService,
  ) {}

  async page({ user, query }: { user: CurrentUser; query: PageQuery }): Promise<Page<AdvisoryListItem>> {
    const rows = await AdvisoryModel.findAll({
      // The bodies are long and a list does not show them.
      attributes: { exclude: ['html', 'text'] },
      where: { ...ofYards(user), ...afterCursor(query.cursor, { column: 'writtenAt', direction: 'DESC' }) },
      include: partsOf(user),
      order: [
        ['writtenAt', 'DESC'],
        ['id', 'DESC'],
      ],
      limit: query.limit + 1,
    });
    return pageOf(rows, query.limit, {
      toItem: toAdvisoryListItem,
      position: (row) => ({ at: row.writtenAt.toISOString(), id: row.id }),
    });
  }

  async view({ user, advisoryId }: Sought, transaction?: Transaction): Promise<AdvisoryView> {
    const row = await AdvisoryModel.findOne({
      where: { ...ofYards(user), uuid: advisoryId },
      include: partsOf(user),
      transaction: transaction ?? null,
    });
    if (!row) throw new AdvisoryNotFound();
    return toAdvisoryView(row);
  }

  /** The yard says that it has read it. */
  acknowledge({ user, advisoryId, key }: Sought & { key: string }): Promise<AdvisoryView> {
    const route = `POST /api/advisories/${advisoryId}/acknowledgement`;
    return this.idempotency.once({ user, route, key, body: null }, async (transaction) => {
      const advisory = await this.lock({ user, advisoryId }, transaction);
      if (advisory.acknowledgedAt !== null) throw new AlreadyAcknowledged();
      await advisory.update(
        { acknowledgedById: user.personId, acknowledgedByName: user.name, acknowledgedAt: new Date() },
        { transaction },
      );
      await this.record(
        user,
        advisory,
        { act: 'advisory-acknowledged', sentence: 'Acknowledged the advisory' },
        transaction,
      );
      return this.view({ user, advisoryId }, transaction);
    });
  }

  /** Puts a mail that was given up back into the queue, under the Message-ID it had. */
  retry({ user, advisoryId, deliveryId, key }: Sought & { deliveryId: string; key: string }): Promise<AdvisoryView> {
    const route = `POST /api/advisories/${advisoryId}/deliveries/${deliveryId}/retry`;
    return this.idempotency.once({ user, route, key, body: null }, async (transaction) => {
      const advisory = await this.lock({ user, advisoryId }, transaction);
      const where = { firmId: user.firmId, advisoryId: advisory.id, uuid: deliveryId };
      const delivery = await OutboxMailModel.findOne({ where, lock: transaction.LOCK.UPDATE, transaction });
      if (!delivery) throw new DeliveryNotFound();
      if (delivery.state !== 'parked') throw new DeliveryNotParked();
      await delivery.update({ state: 'queued', attempts: 0, dueAt: new Date() }, { transaction });
      await this.record(
        user,
        advisory,
        { act: 'delivery-retried', sentence: `Sent the advisory again to ${delivery.recipient}` },
        transaction,
      );
      return this.view({ user, advisoryId }, transaction);
    });
  }

  private async lock({ user, advisoryId }: Sought, transaction: Transaction): Promise<AdvisoryModel> {
    const advisory = await AdvisoryModel.findOne({
      attributes: { exclude: ['html', 'text'] },
      where: { ...ofYards(user), uuid: advisoryId },
      lock: transaction.LOCK.UPDATE,
      transaction,
    });
    if (!advisory) throw new AdvisoryNotFound();
    return advisory;
  }

  private record(
    user: CurrentUser,
    advisory: AdvisoryModel,
    { act, sentence }: { act: string; sentence: string },
    transaction: Transaction,
  ): Promise<unknown> {
    return this.audit.record(transaction, {
      user,
      act,
      sentence: `${sentence}: ${advisory.subject}`,
      subject: { kind: 'advisory', id: advisory.uuid, name: advisory.subject },
      yardId: advisory.yardId,
    });
  }
}

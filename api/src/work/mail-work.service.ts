import type { WorkGroup } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import type { CurrentUser } from '../common/current-user';
import { AdvisoryModel } from '../advisories/advisory.model';
import { ofYards } from '../database/firm-scope';
import { OutboxMailModel } from '../outbox/outbox-mail.model';
import { YardModel } from '../yards/yard.model';
import { groupOf, ITEMS_SHOWN } from './group-of';
import { undeliveredAdvisoryItem, unreadAdvisoryItem } from './work-items';

const NEWEST_FIRST: [string, string][] = [
  ['writtenAt', 'DESC'],
  ['id', 'DESC'],
];

// The bodies are long and a work list does not show them.
const attributes = { exclude: ['html', 'text'] };

/** Advisories that have not reached somebody. */
@Injectable()
export class MailWork {
  async notDelivered(user: CurrentUser): Promise<WorkGroup> {
    const { firmId } = user;
    const rows = await AdvisoryModel.findAll({
      attributes,
      where: ofYards(user),
      include: [
        { model: YardModel, attributes: ['name'] },
        { model: OutboxMailModel, required: true, where: { firmId, state: ['parked', 'waiting'] } },
      ],
      order: NEWEST_FIRST,
    });
    return groupOf('mail-not-delivered', rows, undeliveredAdvisoryItem);
  }

  async toAcknowledge(user: CurrentUser): Promise<WorkGroup> {
    const { rows, count } = await AdvisoryModel.findAndCountAll({
      attributes,
      where: { ...ofYards(user), acknowledgedAt: null },
      include: [{ model: YardModel, attributes: ['name'] }],
      order: NEWEST_FIRST,
      limit: ITEMS_SHOWN,
    });
    return groupOf('to-acknowledge', rows, unreadAdvisoryItem, count);
  }
}

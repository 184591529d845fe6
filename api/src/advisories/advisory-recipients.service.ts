import type { Screening } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import { MembershipModel } from '../accounts/membership.model';
import { PersonModel } from '../accounts/person.model';
import type { Recipient } from '../outbox/outbox.service';
import { YardModel } from '../yards/yard.model';

const isSulfurOver = ({ findings }: Screening) =>
  findings.some(({ rule, status }) => rule === 'total-sulfur' && status === 'over');

/** Who gets an advisory: the yard, and its veterinarians when total sulfur is over the maximum of its class. */
@Injectable()
export class AdvisoryRecipients {
  async of(yard: YardModel, screening: Screening, transaction?: Transaction): Promise<Recipient[]> {
    const veterinarians = isSulfurOver(screening) ? await this.veterinariansOf(yard, transaction) : [];
    const recipients: Recipient[] = [{ address: yard.advisoryEmail, role: 'yard' }];
    for (const address of veterinarians) {
      if (!recipients.some((recipient) => recipient.address === address))
        recipients.push({ address, role: 'veterinarian' });
    }
    return recipients;
  }

  private async veterinariansOf({ firmId, id }: YardModel, transaction?: Transaction): Promise<string[]> {
    const memberships = await MembershipModel.findAll({
      where: { firmId, role: 'veterinarian', isActive: true },
      include: [
        { model: PersonModel, required: true, where: { isActive: true } },
        { model: YardModel, required: true, attributes: ['id'], where: { firmId, id } },
      ],
      order: [['id', 'ASC']],
      transaction: transaction ?? null,
    });
    return memberships.map((membership) => membership.person.email);
  }
}

import { randomUUID } from 'node:crypto';
import type { AdvisoryPreview } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import type { CurrentUser } from '../common/current-user';
import { env } from '../config/env';
import { Outbox } from '../outbox/outbox.service';
import type { RationModel } from '../rations/ration.model';
import type { DecisionModel } from '../reviews/decision.model';
import type { ScreeningModel } from '../screenings/screening.model';
import type { YardModel } from '../yards/yard.model';
import type { AdvisoryMatter } from './advisory-facts';
import { AdvisoryModel } from './advisory.model';
import { AdvisoryRecipients } from './advisory-recipients.service';
import { AdvisoryRenderer } from './advisory-renderer.service';

/** What an advisory reports; the screening comes with its request. */
export type Reported = {
  kind: AdvisoryMatter['kind'];
  user: CurrentUser;
  yard: YardModel;
  ration: RationModel;
  screening: ScreeningModel;
  decisions: readonly DecisionModel[];
  reason: string | null;
  actedAt: Date;
};

/** Renders advisories, for a look beforehand or to be frozen and sent: one path for both. */
@Injectable()
export class AdvisoryWriter {
  constructor(
    private readonly renderer: AdvisoryRenderer,
    private readonly recipients: AdvisoryRecipients,
    private readonly outbox: Outbox,
  ) {}

  async preview(reported: Reported): Promise<AdvisoryPreview> {
    const recipients = await this.recipients.of(reported.yard, reported.screening.screening);
    return {
      ...this.renderer.render(matterOf(reported, `${env.PUBLIC_URL}/advisories`)),
      recipients: recipients.map(({ address, role }) => ({ address, role })),
    };
  }

  /** Freezes the mail and puts one row a recipient into the outbox, in the transaction of what it reports. */
  async write(reported: Reported, releaseId: number, transaction: Transaction): Promise<AdvisoryModel> {
    const { kind, user, yard, ration, screening, actedAt } = reported;
    const uuid = randomUUID();
    const rendered = this.renderer.render(matterOf(reported, `${env.PUBLIC_URL}/advisories/${uuid}`));
    const advisory = await AdvisoryModel.create(
      {
        firmId: user.firmId,
        uuid,
        yardId: yard.id,
        rationId: ration.id,
        releaseId,
        versionNumber: screening.versionNumber,
        kind,
        ...rendered,
        writtenAt: actedAt,
        acknowledgedById: null,
        acknowledgedByName: null,
        acknowledgedAt: null,
      },
      { transaction },
    );
    const recipients = await this.recipients.of(yard, screening.screening, transaction);
    await this.outbox.queue({ firmId: user.firmId, advisoryId: advisory.id, recipients }, transaction);
    return advisory;
  }
}

function matterOf(
  { kind, user, yard, ration, screening, decisions, reason, actedAt }: Reported,
  link: string,
): AdvisoryMatter {
  return {
    kind,
    firmName: user.firmName,
    yard: { name: yard.name, timeZone: yard.timeZone },
    rationName: ration.name,
    versionNumber: screening.versionNumber,
    contentHash: screening.contentHash,
    request: screening.request.request,
    screening: screening.screening,
    actedBy: user.name,
    actedAt,
    reason,
    signatures: decisions.filter(({ decision }) => decision !== 'send-back'),
    link,
  };
}

import { Injectable, Logger } from '@nestjs/common';
import { AdvisoryModel } from '../advisories/advisory.model';
import { env } from '../config/env';
import { isPermanent, LAST_TRY, reasonOf, waitBeforeNextTryMs } from './delivery-failure';
import { MailTransport } from './mail-transport';
import { type Claim, OutboxClaims } from './outbox-claims.service';

/** Sends what is due, one mail at a time: claim, commit, send, mark. */
@Injectable()
export class OutboxSender {
  private readonly logger = new Logger(OutboxSender.name);

  constructor(
    private readonly claims: OutboxClaims,
    private readonly transport: MailTransport,
  ) {}

  /** Answers how many mails it took up; stops between two mails when told so. */
  async sendDue(isStopping: () => boolean = () => false): Promise<number> {
    let taken = 0;
    while (!isStopping()) {
      const claim = await this.claims.claimNext();
      if (claim === null) break;
      taken += 1;
      await this.deliver(claim);
    }
    return taken;
  }

  private async deliver(claim: Claim): Promise<void> {
    try {
      const advisory = await this.advisoryOf(claim);
      await this.transport.send({
        to: claim.recipient,
        messageId: claim.messageId,
        subject: advisory.subject,
        html: advisory.html,
        text: advisory.text,
      });
    } catch (error) {
      await this.markFailed(claim, error);
      return;
    }
    // Outside the try: when marking fails the mail is out, and the lease's end sends it again under the same Message-ID.
    await this.claims.markSent(claim);
  }

  private async markFailed(claim: Claim, error: unknown): Promise<void> {
    const reason = reasonOf(error);
    if (isPermanent(error)) {
      this.logger.warn(`Mail ${claim.messageId} parked: ${reason}`);
      return this.claims.markParked(claim, reason);
    }
    if (claim.attempts >= LAST_TRY) {
      this.logger.warn(`Mail ${claim.messageId} parked after ${claim.attempts} tries: ${reason}`);
      return this.claims.markParked(claim, `Gave up after ${claim.attempts} tries: ${reason}`);
    }
    return this.claims.markWaiting(claim, reason, waitBeforeNextTryMs(claim.attempts, env.OUTBOX_BACKOFF_MS));
  }

  private async advisoryOf({ firmId, advisoryId }: Claim): Promise<AdvisoryModel> {
    const advisory = await AdvisoryModel.findOne({
      attributes: ['id', 'subject', 'html', 'text'],
      where: { firmId, id: advisoryId },
    });
    if (!advisory) throw new Error(`Advisory ${advisoryId} is not there`);
    return advisory;
  }
}
